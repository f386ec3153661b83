package flowshy.report.html;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Our ASCII sentences as print sets them: µm, m/s², ×10⁻⁵, a true minus sign. Words of the user inside them stay as they are. */
public final class Typography {
    private static final String SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹";
    private static final Pattern POWER = Pattern.compile("(?<=\\d)e([+-]?)0*(\\d+)\\b");
    private static final Pattern MINUS = Pattern.compile("(?<![\\w.:-])-(?=\\d)");
    private static final Pattern DEGREES = Pattern.compile("(?<=\\d) deg\\b");
    private static final Pattern CELSIUS = Pattern.compile("\\bdegC\\b");
    private static final Pattern MICRO = Pattern.compile("(?<![\\w.])u(?=(?:m|N|Pa|rad|s|g)\\b)");
    private static final Pattern NO_BREAK =
            Pattern.compile("(?<=\\d) (?=(?:[pnµmkMG]?(?:m|Hz|Pa|N|s|g|rad)|dB|%|°C)(?:\\b|$|(?<=%)|[/·²³]))");

    /** Longest first, so that a part is never taken for the whole. */
    private static final Map<Pattern, String> UNITS = units();

    private final Map<String, Pattern> words = new LinkedHashMap<>();

    /**
     * Typography around words of the user.
     *
     * @param words names and files that our sentences repeat
     */
    public Typography(List<String> words) {
        words.stream()
                .filter(word -> !word.isBlank())
                .distinct()
                .sorted(Comparator.comparingInt(String::length).reversed().thenComparing(Comparator.naturalOrder()))
                .forEach(word -> this.words.put(
                        word, Pattern.compile("(?<![\\p{L}\\p{N}])" + Pattern.quote(word) + "(?![\\p{L}\\p{N}])")));
    }

    /**
     * A sentence of ours, with the user's words in it isolated.
     *
     * @param html where to write
     * @param sentence plain text
     */
    public void sentence(Html html, String sentence) {
        int from = 0;
        for (Span span : spans(sentence)) {
            html.text(set(sentence.substring(from, span.from())));
            html.user(sentence.substring(span.from(), span.to()));
            from = span.to();
        }
        html.text(set(sentence.substring(from)));
    }

    /** A word of the user in a sentence. */
    private record Span(int from, int to) {}

    private List<Span> spans(String sentence) {
        List<Span> found = new ArrayList<>();
        for (Pattern word : words.values()) {
            Matcher matcher = word.matcher(sentence);
            while (matcher.find()) {
                Span span = new Span(matcher.start(), matcher.end());
                if (found.stream().noneMatch(other -> span.from() < other.to() && other.from() < span.to())) {
                    found.add(span);
                }
            }
        }
        found.sort(Comparator.comparingInt(Span::from));
        return found;
    }

    /**
     * A sentence of ours without words of the user.
     *
     * @param sentence ASCII units and numbers
     * @return as print sets them
     */
    public static String set(String sentence) {
        String text = unit(number(sentence));
        text = MICRO.matcher(text).replaceAll("µ");
        text = DEGREES.matcher(text).replaceAll("°");
        return NO_BREAK.matcher(text).replaceAll("\u00A0");
    }

    /**
     * Numbers in a text.
     *
     * @param text e.g. {@code -1.2e-05}
     * @return e.g. {@code −1.2×10⁻⁵}
     */
    static String number(String text) {
        Matcher power = POWER.matcher(text);
        StringBuilder set = new StringBuilder();
        while (power.find()) {
            StringBuilder exponent = new StringBuilder("×10");
            if (power.group(1).equals("-")) {
                exponent.append('⁻');
            }
            power.group(2).chars().forEach(digit -> exponent.append(SUPERSCRIPTS.charAt(digit - '0')));
            power.appendReplacement(set, exponent.toString());
        }
        return MINUS.matcher(power.appendTail(set)).replaceAll("−");
    }

    /**
     * A unit, alone or in a sentence.
     *
     * @param ascii e.g. {@code N.m.s/rad}
     * @return e.g. {@code N·m·s/rad}
     */
    public static String unit(String ascii) {
        if (ascii.equals("deg")) {
            return "°";
        }
        String text = CELSIUS.matcher(ascii).replaceAll("°C");
        for (Map.Entry<Pattern, String> unit : UNITS.entrySet()) {
            text = unit.getKey().matcher(text).replaceAll(unit.getValue());
        }
        return text;
    }

    /**
     * A unit as the columns write it.
     *
     * @param unit in either writing
     * @return e.g. {@code m/s2}
     */
    static String ascii(String unit) {
        return unit.replace('·', '.').replace("²", "2").replace("³", "3").replace("√", "rt");
    }

    private static Map<Pattern, String> units() {
        Map<String, String> units = new LinkedHashMap<>();
        units.put("m/s2/(m/s)", "(m/s²)/(m/s)");
        units.put("m/s2/rtHz", "m/s²/√Hz");
        units.put("rad/(m/s2)", "rad/(m/s²)");
        units.put("N.m.s/rad", "N·m·s/rad");
        units.put("N.m/rad", "N·m/rad");
        units.put("rad/rtHz", "rad/√Hz");
        units.put("kg.m2", "kg·m²");
        units.put("kg/m3", "kg/m³");
        units.put("g/cm3", "g/cm³");
        units.put("Pa.s", "Pa·s");
        units.put("m2/s", "m²/s");
        units.put("m/s2", "m/s²");
        units.put("N.m", "N·m");
        units.put("mm3", "mm³");
        units.put("mm2", "mm²");
        units.put("cm2", "cm²");
        units.put("m3", "m³");
        units.put("rtHz", "√Hz");
        Map<Pattern, String> patterns = new LinkedHashMap<>();
        units.forEach((ascii, set) -> patterns.put(
                Pattern.compile("(?<![A-Za-z])([pnumkM]?)" + Pattern.quote(ascii) + "(?![A-Za-z0-9])"), "$1" + set));
        return patterns;
    }
}
