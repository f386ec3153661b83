package flowshy.medium;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The columns that a property table may have, each with the units it may be written in. */
enum TableColumn {
    GRADE("grade", "mm2_s 1e-6, m2_s 1"),
    TEMPERATURE("temperature", "degC 1 273.15, K 1"),
    DENSITY("density", "kg_m3 1, g_cm3 1e3"),
    VISCOSITY("viscosity", "Pa_s 1, mPa_s 1e-3, uPa_s 1e-6"),
    SOUND_SPEED("sound_speed", "m_s 1"),
    SECOND_VIRIAL("second_virial", "m3_mol 1, cm3_mol 1e-6"),
    SATURATION_PRESSURE("saturation_pressure", "Pa 1, kPa 1e3");

    private final String word;
    private final String units;

    TableColumn(String word, String units) {
        this.word = word;
        this.units = units;
    }

    /** The words of a header line and of a report for the property in this column. */
    String property() {
        return word.replace('_', ' ');
    }

    /** Whether the column holds a property, of which the header must tell the source; grade and temperature only name the row. */
    boolean isProperty() {
        return this != GRADE && this != TEMPERATURE;
    }

    /** A column heading with the unit it stands for, if there is one such. */
    static Optional<Heading> heading(String text) {
        for (TableColumn column : values()) {
            if (text.startsWith(column.word + "_")) {
                return new UnitList(column.units)
                        .find(text.substring(column.word.length() + 1))
                        .map(unit -> new Heading(column, unit));
            }
        }
        return Optional.empty();
    }

    /** The column that carries a property of the header, if there is one such. */
    static Optional<TableColumn> ofProperty(String property) {
        for (TableColumn column : values()) {
            if (column.isProperty() && column.property().equals(property)) {
                return Optional.of(column);
            }
        }
        return Optional.empty();
    }

    /** Every heading this column may carry. */
    List<String> headings() {
        return new UnitList(units)
                .units().stream().map(unit -> word + "_" + unit.name()).toList();
    }

    /** Every heading that any column may carry. */
    static List<String> allHeadings() {
        List<String> all = new ArrayList<>();
        for (TableColumn column : values()) {
            all.addAll(column.headings());
        }
        return all;
    }

    /** A column together with the unit of this file. */
    record Heading(TableColumn column, UnitList.Unit unit) {
        double toSi(BigDecimal value) {
            return unit.toSi(value);
        }
    }
}
