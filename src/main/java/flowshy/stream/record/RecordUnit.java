package flowshy.stream.record;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/**
 * Unit of the measured values: what signal it is and how a number becomes SI.
 *
 * @param spelling as the list of accepted units writes it
 * @param signal what was measured
 * @param factor one such unit in the SI unit of the signal; for levels the reference
 * @param level whether numbers are decibels over the reference, 20 lg of rms over reference
 */
public record RecordUnit(String spelling, Signal signal, double factor, boolean level) {
    private static final double GRAVITY = 9.80665; // standard, exact by definition
    private static final double PEAK = FastMath.sqrt(0.5); // rms of a sinusoid of unit peak

    /** Units of the bare signals, the likeliest first. */
    private static final List<RecordUnit> SIGNALS = List.of(
            new RecordUnit("m/s", Signal.VELOCITY, 1.0, false),
            new RecordUnit("cm/s", Signal.VELOCITY, 1e-2, false),
            new RecordUnit("mm/s", Signal.VELOCITY, 1e-3, false),
            new RecordUnit("um/s", Signal.VELOCITY, 1e-6, false),
            new RecordUnit("Pa", Signal.PRESSURE, 1.0, false),
            new RecordUnit("mPa", Signal.PRESSURE, 1e-3, false),
            new RecordUnit("uPa", Signal.PRESSURE, 1e-6, false),
            new RecordUnit("m/s2", Signal.ACCELERATION, 1.0, false),
            new RecordUnit("mm/s2", Signal.ACCELERATION, 1e-3, false),
            new RecordUnit("g", Signal.ACCELERATION, GRAVITY, false));

    private static final List<RecordUnit> LEVELS = List.of(
            new RecordUnit("dB re 1 m/s", Signal.VELOCITY, 1.0, true),
            new RecordUnit("dB re 50 nm/s", Signal.VELOCITY, 50e-9, true),
            new RecordUnit("dB re 20 uPa", Signal.PRESSURE, 20e-6, true),
            new RecordUnit("dB re 1 uPa", Signal.PRESSURE, 1e-6, true));

    /**
     * Units that a quantity may have.
     *
     * @param quantity in what form the file holds the signal
     * @return the likeliest first
     */
    public static List<RecordUnit> accepted(Quantity quantity) {
        List<RecordUnit> units = new ArrayList<>();
        for (RecordUnit unit : SIGNALS) {
            String bare = unit.spelling();
            String written = bare.matches("\\w+") && quantity == Quantity.DENSITY ? bare + "2/Hz" : quantity.unit(bare);
            units.add(new RecordUnit(written, unit.signal(), unit.factor(), false));
            if (quantity == Quantity.RMS_LINES) {
                units.add(new RecordUnit(bare + " rms", unit.signal(), unit.factor(), false));
                units.add(new RecordUnit(bare + " peak", unit.signal(), PEAK * unit.factor(), false));
            }
        }
        if (quantity == Quantity.BAND_LEVELS) {
            units.addAll(LEVELS);
        }
        return units;
    }

    /**
     * The unit of a spelling: micro signs, superscripts, {@code √Hz}, {@code sqrt(Hz)} and {@code ^2} are read as the list writes them.
     *
     * @param written as the user wrote it
     * @param quantity in what form the file holds the signal
     * @return the unit
     * @throws DeclarationException if it is none of the list, with the reason where it could mean two things
     */
    static RecordUnit of(String written, Quantity quantity) {
        String plain = plain(written);
        Optional<RecordUnit> unit = accepted(quantity).stream()
                .filter(u -> plain(u.spelling()).equals(plain))
                .findFirst();
        return unit.orElseThrow(() -> new DeclarationException(
                "unit",
                "'" + written + "'" + doubt(plain, quantity),
                String.join(
                        ", ",
                        accepted(quantity).stream().map(RecordUnit::spelling).toList())));
    }

    private static String plain(String written) {
        return written.replace('µ', 'u')
                .replace('μ', 'u')
                .replace("²", "2")
                .replace("^2", "2")
                .replace("√", "rt")
                .replaceAll("sqrt\\(?Hz\\)?", "rtHz")
                .replace("Hz^0.5", "rtHz")
                .replaceAll("\\s+", "")
                .replaceAll("^\\((?<unit>\\w+)\\)2", "${unit}2");
    }

    /** Why a likely spelling is not taken. */
    private static String doubt(String plain, Quantity quantity) {
        String small = plain.toLowerCase(Locale.ROOT);
        if (small.startsWith("db")) {
            return ": a level needs its reference";
        }
        if (plain.equals("m2/s")) {
            return ": could be a viscosity";
        }
        if (quantity == Quantity.DENSITY && SIGNALS.stream().anyMatch(u -> plain.equals(u.spelling() + "/Hz"))) {
            return ": neither a density (a square per Hz) nor an amplitude density (per rtHz)";
        }
        if (quantity == Quantity.DENSITY && plain.endsWith("/rtHz")) {
            return ": that is an amplitude density";
        }
        if (quantity == Quantity.AMPLITUDE_DENSITY && plain.endsWith("2/Hz")) {
            return ": that is a density";
        }
        boolean spectral = quantity == Quantity.DENSITY || quantity == Quantity.AMPLITUDE_DENSITY;
        if (spectral && SIGNALS.stream().anyMatch(u -> plain.equals(plain(u.spelling())))) {
            return ": says nothing of the bandwidth";
        }
        return small.equals("v") || small.equals("mv") ? ": a voltage; apply the sensor's sensitivity first" : "";
    }

    /**
     * A number in SI.
     *
     * @param number as the file has it
     * @param quantity in what form
     * @return square of the signal's SI unit per Hz for both densities, rms for bands and lines, the signal for a record
     */
    double si(double number, Quantity quantity) {
        if (level) {
            return factor * FastMath.pow(10.0, number / 20.0);
        }
        return switch (quantity) {
            case DENSITY -> number * factor * factor;
            case AMPLITUDE_DENSITY -> number * factor * number * factor;
            default -> number * factor;
        };
    }
}
