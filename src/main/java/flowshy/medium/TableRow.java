package flowshy.medium;

import java.util.OptionalDouble;

/**
 * One line of a property table.
 *
 * @param grade nominal kinematic viscosity that names the oil of this row [m²/s], absent where the table has no such column
 * @param temperature [K]
 * @param density ρ [kg/m³]
 * @param viscosity dynamic viscosity μ [Pa·s]
 * @param soundSpeed c [m/s], absent where the table has no such column
 * @param secondVirial B of a gas [m³/mol], absent where the table has no such column
 * @param saturationPressure at which gas and liquid are in balance [Pa], absent above the critical temperature and where the
 *     table has no such column
 */
public record TableRow(
        OptionalDouble grade,
        double temperature,
        double density,
        double viscosity,
        OptionalDouble soundSpeed,
        OptionalDouble secondVirial,
        OptionalDouble saturationPressure) {}
