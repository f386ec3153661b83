package flowshy.study;

import flowshy.study.keys.KeyRow;
import flowshy.study.keys.Keys;
import flowshy.study.text.Nearest;
import flowshy.study.text.Position;
import flowshy.study.text.Printable;
import flowshy.study.text.Problem;
import flowshy.study.text.StudyException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** Writes a study to begin with; its comments are the meanings of the key table. */
public final class Starter {
    private static final Map<String, List<String>> SHAPES = new LinkedHashMap<>();
    private static final Map<String, List<String>> COVERS = new LinkedHashMap<>();
    /** Comments start in this column, where the line leaves room. */
    private static final int COMMENT = 44;

    static {
        SHAPES.put("cylinder", List.of("hair.length|720 um", "hair.diameter|88 um"));
        SHAPES.put("taper", List.of("hair.length|780 um", "hair.base-diameter|112 um", "hair.tip-diameter|58 um"));
        SHAPES.put(
                "club",
                List.of(
                        "hair.length|860 um",
                        "hair.stalk-diameter|46 um",
                        "hair.stalk-length|410 um",
                        "hair.shoulder-length|70 um",
                        "hair.head-diameter|124 um",
                        "hair.end|round"));
        SHAPES.put(
                "profile",
                List.of(
                        "hair.points|[[0 um, 104 um], [260 um, 92 um], [520 um, 74 um], [700 um, 60 um], [730 um, 0 um]]"));
        COVERS.put("open", List.of("cover|open"));
        COVERS.put(
                "sealed",
                List.of(
                        "cover|",
                        "cover.kind|sealed",
                        "cover.fill|{name: nitrogen, temperature: 20 degC, pressure: 1 bar}"));
    }

    private Starter() {}

    /**
     * A commented study that every command accepts.
     *
     * @param shape cylinder, taper, club or profile
     * @param cover open or sealed
     * @return YAML text ending in a line end
     * @throws StudyException if there is no such shape or cover
     */
    public static String study(String shape, String cover) {
        List<String> lines = new ArrayList<>();
        lines.add("# A study to begin with: put your own values in place of these, which are only an example.");
        lines.add("# Every number carries its unit. All keys, with defaults: flowshy check --keys");
        add(lines, "title", "My hair sensor");
        add(lines, "hair", "");
        add(lines, "hair.shape", shape);
        chosen(SHAPES, "--shape", shape).forEach(line -> add(lines, line));
        if (shape.equals("profile")) {
            lines.add("  # or, in place of points, a table beside this file, with the header  z [um], diameter [um]");
            lines.add("  # file: profile.csv");
        }
        add(lines, "hair.density|1.16 g/cm3");
        add(lines, "hair.youngs-modulus|2.9 GPa");
        add(lines, "suspension", "");
        add(lines, "suspension.resonance|{frequency: 350 Hz, in: vacuum}");
        add(lines, "suspension.quality|{value: 8, in: vacuum}");
        add(lines, "suspension.plate-inertia|8e-18 kg.m2");
        add(lines, "suspension.pivot-depth|2 um");
        add(lines, "suspension.attitude|upright");
        add(lines, "suspension.readout-noise|4e-9 rad/rtHz");
        add(lines, "medium|{name: air, temperature: 20 degC, pressure: 101.325 kPa, humidity: 50 %}");
        chosen(COVERS, "--cover", cover).forEach(line -> add(lines, line));
        add(lines, "band|{from: 30 Hz, to: 300 Hz}");
        add(lines, "motion|{smallest: 0.05 m/s2, full-scale: 20 m/s2}");
        add(lines, "surroundings", "");
        lines.add("  room air:");
        add(lines, "surroundings.NAME.like|still room");
        add(lines, "accept|{rejection: 20 dB}");
        add(lines, "calibration|{frequency: 100 Hz, cover: " + cover + "}");
        add(lines, "document|{project: first trial, revision: A}");
        return String.join("\n", lines) + "\n";
    }

    private static List<String> chosen(Map<String, List<String>> table, String option, String word) {
        if (!table.containsKey(word)) {
            throw new StudyException(new Problem(
                    Position.label(option),
                    "",
                    "unknown word " + Printable.of(word),
                    "one of " + String.join(", ", table.keySet()) + " is wanted here",
                    Nearest.among(word, table.keySet())));
        }
        return table.get(word);
    }

    private static void add(List<String> lines, String line) {
        int bar = line.indexOf('|');
        add(lines, line.substring(0, bar), line.substring(bar + 1));
    }

    private static void add(List<String> lines, String path, String value) {
        String name = path.substring(path.lastIndexOf('.') + 1);
        String indent = "  ".repeat(path.length() - path.replace(".", "").length());
        String text = indent + name + ":" + (value.isEmpty() ? "" : " " + value);
        KeyRow row = Keys.rows().stream()
                .filter(r -> r.path().equals(path))
                .findFirst()
                .orElseThrow(() -> new IllegalStateException("the starter writes an unknown key " + path));
        if (text.length() >= COMMENT) {
            lines.add(indent + "# " + row.meaning());
            lines.add(text);
        } else {
            lines.add(String.format(Locale.ROOT, "%-" + COMMENT + "s# %s", text, row.meaning()));
        }
    }
}
