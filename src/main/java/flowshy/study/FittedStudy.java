package flowshy.study;

import static flowshy.math.Figures.say;

import flowshy.math.Figures;
import flowshy.response.Suspension;
import flowshy.study.text.Position;
import flowshy.study.text.Printable;
import flowshy.study.text.Problem;
import flowshy.study.text.Setting;
import flowshy.study.text.StudyEdit;
import flowshy.study.text.StudyException;
import flowshy.study.text.StudyText;
import flowshy.study.units.Dimension;
import flowshy.study.units.Quantity;
import flowshy.study.units.QuantityException;
import flowshy.verdict.fit.Estimate;
import flowshy.verdict.fit.FitAnswer;
import flowshy.verdict.fit.Freed;
import java.math.BigDecimal;
import java.math.MathContext;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The text of a study with fitted numbers in it: whatever else the user wrote stands as it stood. It has been read again, and found to mean
 * the fitted device and nothing else.
 *
 * @param text of the new file
 */
public record FittedStudy(String text) {
    private static final MathContext DIGITS = new MathContext(8);

    /** What is written is rounded to eight digits. */
    private static final double ROUNDING = 1e-7;

    private static final Pattern NUMBER_AND_UNIT = Pattern.compile("([+-]?[0-9.]+(?:[eE][+-]?[0-9]+)?)(\\s*)(.*)");
    private static final List<String> GROUP = List.of("suspension");

    /**
     * Writes the fitted numbers into a study.
     *
     * @param reader of the study as it stood
     * @param answer what was fitted
     * @param target where it will be written, which decides where the files are looked for that it names
     * @return the text
     * @throws StudyException if that text could not be made, or does not mean the fitted device
     */
    public static FittedStudy of(StudyReader reader, FitAnswer answer, Path target) {
        String name = "--write " + Printable.of(target.toString());
        Path folder = target.toAbsolutePath().normalize().getParent();
        if (target.toAbsolutePath().normalize().equals(reader.file())) {
            throw refused(name, "the study itself", "name a new file");
        }
        boolean beside = reader.study().origin().filesRead().stream()
                .anyMatch(file -> !Path.of(file.file()).isAbsolute());
        if (beside && !reader.folder().normalize().equals(folder)) {
            throw refused(
                    name, "another folder than the study's, which names files beside it", "write into that folder");
        }
        StudyEdit edit = new StudyEdit(reader.text());
        for (String setting : reader.settings()) {
            Setting read = Setting.read("--set", setting);
            String value = setting.substring(setting.indexOf('=') + 1).strip();
            if (!edit.set(read.path(), value)) {
                throw refused(
                        name,
                        "--set " + String.join(".", read.path()) + " has no place in the text",
                        "write it into the study first");
            }
        }
        Optional<Suspension> held = answer.device().suspension();
        held.ifPresent(suspension -> suspension(edit, suspension));
        for (Estimate estimate : answer.estimates()) {
            place(edit, estimate, name);
        }
        StudyReader again =
                StudyReader.of(StudyText.of(target.toString(), edit.text().getBytes(StandardCharsets.UTF_8)), folder);
        prove(reader, again, answer, name);
        return new FittedStudy(edit.text());
    }

    /** Both are written even if only one was free: what they were solved from may have changed. */
    private static void suspension(StudyEdit edit, Suspension held) {
        String stiffness = "stiffness: " + digits(held.stiffness()) + " N.m/rad";
        String damping = "damping: " + digits(held.damping()) + " N.m.s/rad";
        edit.replace(GROUP, List.of("stiffness", "resonance", "ring-down"), stiffness);
        edit.replace(GROUP, List.of("damping", "quality", "ring-down"), damping);
    }

    private static void place(StudyEdit edit, Estimate estimate, String name) {
        Freed freed = estimate.freed();
        String comment = freed.key() + " fitted: standard uncertainty " + Figures.of(estimate.uncertainty(), 2) + " "
                + freed.unit() + ", 95 % from " + Figures.of(estimate.low(), 5) + " to "
                + Figures.of(estimate.high(), 5) + "; was " + Figures.of(freed.start(), 5);
        List<String> path = List.of(freed.key().split("\\.", -1));
        switch (freed.kind()) {
            case STIFFNESS, DAMPING -> edit.comment(path, List.of(comment));
            case STUDY -> {
                String value = edit.written(path)
                        .flatMap(old -> alike(old, estimate))
                        .orElse(digits(estimate.value()) + " " + freed.unit());
                if (!freed.key().startsWith("suspension.resonance")
                        && !freed.key().startsWith("suspension.quality")) {
                    if (!edit.set(path, value)) {
                        throw refused(name, freed.key() + " has no place in the text", "write its group out first");
                    }
                    edit.comment(path, List.of(comment));
                }
            }
            case VOLTS, ANGLES ->
                edit.comment(
                        List.of("measurements", ""),
                        List.of("gain of the readout fitted: " + Figures.of(estimate.value(), 6) + " " + freed.unit()
                                + ", standard uncertainty " + Figures.of(estimate.uncertainty(), 2)));
        }
    }

    /** The value in the unit that the user wrote. */
    private static Optional<String> alike(String old, Estimate estimate) {
        Matcher parts = NUMBER_AND_UNIT.matcher(old.strip());
        if (!parts.matches()) {
            return Optional.empty();
        }
        return Arrays.stream(Dimension.values())
                .filter(dimension -> dimension.siUnit().equals(estimate.freed().unit()))
                .flatMap(dimension -> written(estimate.value(), parts.group(3), dimension).stream())
                .findFirst();
    }

    private static Optional<String> written(double value, String unit, Dimension dimension) {
        try {
            double zero = Quantity.read("0 " + unit, dimension).value();
            double one = Quantity.read("1 " + unit, dimension).value();
            return Optional.of(digits((value - zero) / (one - zero)) + " " + unit);
        } catch (QuantityException e) {
            return Optional.empty();
        }
    }

    private static String digits(double value) {
        return Figures.full(new BigDecimal(value).round(DIGITS).doubleValue());
    }

    /** The new text means the fitted device, and every key that was not fitted says what it said. */
    private static void prove(StudyReader before, StudyReader again, FitAnswer answer, String name) {
        Study old = before.study();
        Study now = again.study();
        Optional<Suspension> wanted = answer.device().suspension();
        Optional<Suspension> found = now.device().suspension();
        boolean held = wanted.isPresent() == found.isPresent()
                && (wanted.isEmpty()
                        || (near(wanted.get().stiffness(), found.get().stiffness())
                                && near(wanted.get().damping(), found.get().damping())));
        Map<String, String> rest = new LinkedHashMap<>();
        now.understood().forEach(entry -> rest.put(entry.key(), entry.si()));
        List<String> lost = new ArrayList<>();
        for (Study.Understood entry : old.understood()) {
            boolean changed = entry.key().startsWith("suspension.")
                    || answer.estimates().stream().anyMatch(e -> e.freed().key().equals(entry.key()));
            if (!changed && !entry.si().equals(rest.get(entry.key()))) {
                lost.add(entry.key());
            }
        }
        for (Estimate estimate : answer.estimates()) {
            boolean kept = estimate.freed().kind() != Freed.Kind.STUDY
                    || estimate.freed().key().startsWith("suspension.resonance")
                    || estimate.freed().key().startsWith("suspension.quality")
                    || near(
                            estimate.value(),
                            again.form().siIfAny(estimate.freed().key()).orElse(Double.NaN));
            if (!kept) {
                lost.add(estimate.freed().key());
            }
        }
        if (!held || !lost.isEmpty()) {
            String what = held ? String.join(", ", lost) : "the suspension";
            throw refused(
                    name,
                    say("the new text would not say the same of %s", what),
                    "write that part of the study plainly, key by key, and fit again");
        }
    }

    private static boolean near(double a, double b) {
        return a == b || Math.abs(a - b) <= ROUNDING * Math.max(Math.abs(a), Math.abs(b));
    }

    private static StudyException refused(String name, String found, String accepted) {
        return new StudyException(Problem.of(Position.label(name), "", found, accepted));
    }
}
