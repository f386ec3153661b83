package flowshy.verdict.fill;

import flowshy.math.Figures;
import flowshy.medium.Media;
import flowshy.medium.MediumEntry;
import flowshy.medium.MediumParameter;
import flowshy.medium.MediumQuery;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/**
 * One candidate fill.
 *
 * @param name as printed
 * @param query the medium, at the state of the study
 */
public record Fill(String name, MediumQuery query) {
    /** Values tried where a medium needs one more: the usual trade grades and concentrations (common practice, no source). */
    private static final Map<MediumParameter, List<Double>> USUAL = Map.of(
            MediumParameter.HUMIDITY, List.of(0.5),
            MediumParameter.MASS_FRACTION, List.of(0.2, 0.5, 0.8),
            MediumParameter.SALINITY, List.of(35.0),
            MediumParameter.GRADE, List.of(0.65e-6, 1e-6, 5e-6, 10e-6, 20e-6, 32e-6, 50e-6, 100e-6, 350e-6, 1000e-6));

    /**
     * Every known medium at a state, with the usual values of what it needs beside.
     *
     * @param temperature [K]
     * @param pressure [Pa]
     * @return in the order of the media list
     */
    public static List<Fill> known(double temperature, double pressure) {
        List<Fill> fills = new ArrayList<>();
        for (MediumEntry entry : Media.entries()) {
            MediumQuery plain = MediumQuery.of(entry.name(), temperature, pressure);
            if (entry.parameters().isEmpty()) {
                fills.add(new Fill(entry.name(), plain));
                continue;
            }
            // every medium needs one parameter at most
            var accepted = entry.parameters().get(0);
            for (double value : USUAL.getOrDefault(accepted.parameter(), List.of())) {
                if (accepted.range().contains(value)) {
                    fills.add(new Fill(
                            entry.name() + " " + words(accepted.parameter(), value),
                            plain.with(accepted.parameter(), value)));
                }
            }
        }
        return fills;
    }

    private static String words(MediumParameter parameter, double value) {
        return switch (parameter) {
            case HUMIDITY -> Figures.full(100.0 * value) + " % humidity";
            case MASS_FRACTION -> Figures.full(100.0 * value) + " %";
            case GRADE -> Figures.full(1e6 * value) + " cSt";
            default -> Figures.full(value);
        };
    }
}
