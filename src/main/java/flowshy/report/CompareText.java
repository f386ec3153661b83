package flowshy.report;

import static flowshy.math.Figures.say;

import flowshy.hair.Profile;
import flowshy.math.Caveat;
import flowshy.math.Figures;
import flowshy.report.CompareTable.Row;
import flowshy.response.Device;
import flowshy.study.Family;
import flowshy.study.Study;
import flowshy.study.Variant;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.Decision;
import flowshy.verdict.Limit;
import flowshy.verdict.compare.CompareQuestion;
import flowshy.verdict.compare.ComparedDevice;
import flowshy.verdict.compare.Scaled;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.figure.Found;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.hipparchus.util.FastMath;

/** Devices side by side for a terminal: who they are, what they meet, then one line a quantity and one column a device. */
public final class CompareText {
    /** Columns that fit a page beside the names of the quantities. */
    private static final int ABREAST = 4;

    private final TextPage page = new TextPage();
    private final List<Family> families;
    private final CompareQuestion question;
    private final List<ComparedDevice> devices;

    private CompareText(List<Family> families, CompareQuestion question, List<ComparedDevice> devices) {
        this.families = families;
        this.question = question;
        this.devices = devices;
    }

    /**
     * The printed comparison.
     *
     * @param families the studies with their variants
     * @param question what was asked
     * @param devices what was found, one a study or variant, same order
     * @return text with a line end after every line
     */
    public static String of(List<Family> families, CompareQuestion question, List<ComparedDevice> devices) {
        CompareText text = new CompareText(families, question, devices);
        text.head();
        text.decisions();
        text.sideBySide();
        text.missing();
        text.taken();
        text.caveats();
        text.page.line("");
        text.page.paragraph(Cautions.SHORT);
        return text.page.toString();
    }

    private void head() {
        Study first = families.get(0).study();
        page.line(
                "Flowshy " + Version.number() + "   compare   " + first.origin().file());
        if (!first.title().isEmpty()) {
            page.line(first.title());
        }
        first.origin().settings().forEach(setting -> page.line("with --set " + setting));
        page.heading("Devices");
        int index = 0;
        for (Family family : families) {
            for (Variant variant : family.all()) {
                device(index++, family, variant);
            }
        }
        held();
    }

    private void device(int index, Family family, Variant variant) {
        boolean base = variant.changes().isEmpty();
        String name = base ? (families.size() == 1 ? "the study as it stands" : variant.name()) : variant.name();
        ComparedDevice compared = devices.get(index);
        List<String> sentences = new ArrayList<>();
        compared.question().ifPresent(asked -> sentences.add(described(asked.device())));
        if (!base) {
            sentences.add("Stated: " + String.join("; ", variant.changes()));
        } else if (families.size() > 1 && !family.study().title().isEmpty()) {
            sentences.add(family.study().title());
        }
        compared.scaled().ifPresent(scaled -> sentences.add(scaled(scaled)));
        if (!compared.reason().isEmpty()) {
            sentences.add("No solution: " + compared.reason());
        }
        page.note(CompareTable.letter(index), name + " - " + String.join(". ", sentences) + ".");
    }

    private static String described(Device device) {
        Profile profile = device.hair().profile();
        return say(
                "%s, %.4g um long, %.4g um at the widest, cover %s, in %s",
                profile.shape(),
                1e6 * profile.length(),
                2e6 * profile.largestRadius(),
                device.cover().words(),
                device.around().name());
    }

    private static String scaled(Scaled scaled) {
        if (scaled.ratio() == 1.0) {
            return "Its " + scaled.figure().word() + " is A's as it stands";
        }
        return say(
                        "Made equal by %s: %s from %.4g to %.6g %s",
                        scaled.change(),
                        scaled.figure().word(),
                        scaled.figure().unit().show(scaled.before()),
                        scaled.figure().unit().show(scaled.after()),
                        scaled.figure().unit().shown())
                .strip();
    }

    private void held() {
        Map<String, List<String>> words = new LinkedHashMap<>();
        int index = 0;
        for (Family family : families) {
            for (Variant variant : family.all()) {
                String letter = CompareTable.letter(index++);
                if (family.study().device().suspension().isPresent()) {
                    words.computeIfAbsent(variant.hold().word(), word -> new ArrayList<>())
                            .add(letter);
                }
            }
        }
        String what = words.size() == 1
                ? words.keySet().iterator().next()
                : words.entrySet().stream()
                        .map(word -> word.getKey() + " (" + String.join(", ", word.getValue()) + ")")
                        .collect(Collectors.joining(", "));
        String held = words.isEmpty()
                ? ""
                : "Held of the suspension, as measured on its study's own hair: " + what
                        + ", and the structural damping. ";
        page.paragraph(held + CompareTable.frame(devices));
        if (devices.size() == 1) {
            page.paragraph("Nothing stands beside it: the study has no variants, and no other study is named.");
        }
    }

    private void decisions() {
        page.heading("Decisions");
        for (int i = 0; i < devices.size(); i++) {
            ComparedDevice device = devices.get(i);
            String decision = device.answer()
                    .map(answer -> answer.verdict().decision().word() + misses(answer))
                    .orElse("not compared");
            page.row(CompareTable.letter(i) + "  " + cut(shortName(i)), decision);
        }
    }

    private String shortName(int index) {
        return question.contenders().get(index).changes().isEmpty() && families.size() == 1
                ? "as it stands"
                : question.contenders().get(index).name();
    }

    private static String cut(String name) {
        return name.codePointCount(0, name.length()) > 19
                ? name.substring(0, name.offsetByCodePoints(0, 18)) + "…"
                : name;
    }

    private static String misses(BandsAnswer answer) {
        List<String> misses = new ArrayList<>();
        for (Limit limit : answer.verdict().limits()) {
            if (limit.decision() == Decision.FAILS || limit.decision() == Decision.UNDECIDED) {
                misses.add(
                        limit.found().isPresent()
                                ? say(
                                        "%s %.4g, required %s %.4g %s",
                                        limit.name(),
                                        limit.found().getAsDouble(),
                                        limit.sense().words(),
                                        limit.required(),
                                        limit.unit())
                                : limit.name() + ": " + limit.reason());
            }
        }
        return misses.isEmpty() ? "" : ": " + String.join("; ", misses).strip();
    }

    private void sideBySide() {
        List<Row> rows = CompareTable.rows(devices);
        page.heading("Side by side");
        List<Integer> others = new ArrayList<>();
        for (int i = 1; i < devices.size(); i++) {
            others.add(i);
        }
        int from = 0;
        do {
            List<Integer> shown = new ArrayList<>(List.of(0));
            shown.addAll(others.subList(from, FastMath.min(others.size(), from + ABREAST - 1)));
            if (from > 0) {
                page.line("");
            }
            page.namedTable("", rows.stream().map(Row::name).toList(), CompareTable.columns(devices, shown), rows);
            from += ABREAST - 1;
        } while (from < others.size());
    }

    /** Why a dash stands where a number was looked for. */
    private void missing() {
        Map<String, Map<String, List<String>>> reasons = new LinkedHashMap<>();
        for (int i = 0; i < devices.size(); i++) {
            for (Figure figure : CompareTable.SHOWN) {
                Optional<Found> found = CompareTable.found(figure, devices.get(i));
                if (found.isPresent() && found.get().number().isEmpty()) {
                    reasons.computeIfAbsent(found.get().reason(), reason -> new LinkedHashMap<>())
                            .computeIfAbsent(figure.word(), word -> new ArrayList<>())
                            .add(CompareTable.letter(i));
                }
            }
        }
        reasons.forEach((reason, figures) -> {
            List<String> letters = figures.values().stream()
                    .flatMap(List::stream)
                    .distinct()
                    .sorted()
                    .toList();
            page.note(
                    "-",
                    String.join(", ", figures.keySet()) + " (" + String.join(", ", letters) + "): " + reason + ".");
        });
    }

    private void taken() {
        Map<String, List<String>> all = new LinkedHashMap<>();
        int index = 0;
        for (Family family : families) {
            for (Variant variant : family.all()) {
                String letter = CompareTable.letter(index++);
                variant.study()
                        .ifPresent(study -> study.takenAs()
                                .forEach(taken -> all.computeIfAbsent(
                                                taken.key() + "\n" + taken.value() + " (" + taken.why() + ")",
                                                line -> new ArrayList<>())
                                        .add(letter)));
            }
        }
        if (all.isEmpty()) {
            return;
        }
        page.heading("Taken as (not stated in the study)");
        all.forEach((line, letters) -> {
            String who = letters.size() == devices.size() ? "" : String.join(", ", letters) + ": ";
            String[] parts = line.split("\n", -1);
            page.row(parts[0], who + parts[1]);
        });
    }

    private void caveats() {
        Map<String, Caveat> first = new LinkedHashMap<>();
        Map<String, List<String>> letters = new LinkedHashMap<>();
        for (int i = 0; i < devices.size(); i++) {
            List<Caveat> caveats =
                    devices.get(i).answer().map(BandsAnswer::caveats).orElse(List.of());
            for (Caveat caveat : caveats) {
                if (caveat.weight() != Caveat.Weight.NOTE) {
                    // the same sentence with other figures is told once
                    String sort = caveat.weight().words() + Figures.blanked(caveat.text());
                    first.putIfAbsent(sort, caveat);
                    letters.computeIfAbsent(sort, key -> new ArrayList<>()).add(CompareTable.letter(i));
                }
            }
        }
        if (first.isEmpty()) {
            return;
        }
        page.heading("What weakens the numbers (with the figures of the first device named)");
        first.forEach((sort, caveat) -> page.note(
                String.join(", ", letters.get(sort)) + " [" + caveat.weight().words() + "]", caveat.text()));
    }
}
