package flowshy.study.keys;

import static org.assertj.core.api.Assertions.assertThat;

import flowshy.study.text.Node;
import flowshy.study.text.Problem;
import flowshy.study.text.Problems;
import flowshy.study.text.Setting;
import flowshy.study.text.StudyException;
import flowshy.study.text.StudyText;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Settings are laid over the text and then read like it. */
class OverlayTest {
    private static final String BASE = """
            hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}
            suspension: {resonance: 300 Hz, quality: {value: 3, in: air}}
            medium: air
            """;

    private static Node.Mapping tree(String text) {
        return StudyText.of("s.yaml", text.getBytes(StandardCharsets.UTF_8)).root();
    }

    private static Form read(Node.Mapping root) {
        Problems problems = new Problems();
        Form form = Keys.read(root, problems);
        problems.throwIfAny();
        return form;
    }

    private static Form set(String... settings) {
        Node.Mapping root = tree(BASE);
        for (String setting : settings) {
            root = Overlay.set(root, Setting.read("--set", setting));
        }
        return read(root);
    }

    private static List<String> problems(String... settings) {
        try {
            set(settings);
            return List.of();
        } catch (StudyException e) {
            return e.problems().stream().map(Problem::text).toList();
        }
    }

    @Test
    void replacesAValueAndRemembersWhereItCameFrom() {
        Form form = set("hair.diameter=90 um");
        assertThat(form.si("hair.diameter")).isEqualTo(90e-6);
        assertThat(form.position("hair.diameter")).hasToString("--set hair.diameter");
        assertThat(form.position("hair.length")).hasToString("s.yaml:1:16");
    }

    @Test
    void addsGroupsThatAreNotThere() {
        assertThat(set("band.from=30 Hz").si("band.from")).isEqualTo(30.0);
        Form sealed = set("cover={kind: sealed, fill: helium}");
        assertThat(sealed.word("cover.kind")).contains("sealed");
        assertThat(sealed.word("cover.fill.name")).contains("helium");
    }

    @Test
    void opensAGroupThatIsWrittenAsOneWord() {
        Form form = set("medium.temperature=40 degC", "suspension.resonance.in=water");
        assertThat(form.word("medium.name")).contains("air");
        assertThat(form.si("medium.temperature")).isEqualTo(313.15);
        assertThat(form.si("suspension.resonance.frequency")).isEqualTo(300.0);
        assertThat(form.word("suspension.resonance.in.name")).contains("water");
    }

    @Test
    void pushesOutWhatItContradicts() {
        Form stiff = set("suspension.stiffness=2 nN.m/rad");
        assertThat(stiff.has("suspension.resonance")).isFalse();
        assertThat(stiff.si("suspension.quality.value")).isEqualTo(3.0);
        Form damped = set("suspension.damping=1e-12 N.m.s/rad");
        assertThat(damped.has("suspension.quality")).isFalse();
        Form own = set("medium={density: 1 g/cm3, viscosity: 1 cP}");
        assertThat(own.has("medium.name")).isFalse();
        Form named = read(Overlay.set(
                tree(
                        "hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}\nmedium: {density: 1 g/cm3, viscosity: 1 cP}"),
                Setting.read("--set", "medium.name=water")));
        assertThat(named.has("medium.viscosity")).isFalse();
    }

    @Test
    void anotherShapeKeepsWhatItSharesAndDropsTheRest() {
        Form taper = set("hair.shape=taper", "hair.base-diameter=90 um", "hair.tip-diameter=40 um");
        assertThat(taper.si("hair.length")).isEqualTo(610e-6);
        assertThat(taper.has("hair.diameter")).isFalse();
        assertThat(problems("hair.shape=taper"))
                .containsExactly(
                        "s.yaml:1:7: hair.base-diameter: missing; diameter at the wall: length, 10 nm to 1 m",
                        "s.yaml:1:7: hair.tip-diameter: missing; diameter at the tip, zero for a point: length, zero or 10 nm to 1 m");
    }

    @Test
    void theLaterSettingWins() {
        assertThat(set("hair.diameter=90 um", "hair.diameter=91 um").si("hair.diameter"))
                .isEqualTo(91e-6);
    }

    @Test
    void isCheckedLikeTheFile() {
        assertThat(problems("hair.diameter=90"))
                .containsExactly(
                        "--set hair.diameter: 90 has no unit; a length is wanted here, with its unit: um, mm, m, nm, cm, in, mil; did you mean 90 um?");
        assertThat(problems("hair.diametre=90 um"))
                .singleElement()
                .asString()
                .startsWith("--set hair.diametre: unknown key;")
                .endsWith("did you mean hair.diameter?");
        assertThat(problems("hair.length.x=1"))
                .containsExactly(
                        "--set hair.length.x: hair.length: a group of keys; a length is wanted here, 100 nm to 1 m");
        assertThat(problems("cover={kind: sealed, lid: 1}"))
                .singleElement()
                .asString()
                .startsWith("--set cover: cover.lid: unknown key");
        assertThat(problems("variants=water")).singleElement().asString().startsWith("--set variants: water; names");
    }

    @Test
    void partsOfStudiesMergeGroupByGroup() {
        Node.Mapping over = tree("""
                hair: {shape: club, stalk-diameter: 40 um, stalk-length: 300 um, head-diameter: 99 um}
                medium: {temperature: 30 degC}
                suspension: {stiffness: 1 nN.m/rad}
                title: changed
                """);
        Form form = read(Overlay.merge(tree(BASE), over));
        assertThat(form.word("hair.shape")).contains("club");
        assertThat(form.si("hair.length")).isEqualTo(610e-6);
        assertThat(form.word("medium.name")).contains("air");
        assertThat(form.si("medium.temperature")).isEqualTo(303.15);
        assertThat(form.has("suspension.resonance")).isFalse();
        assertThat(form.si("suspension.quality.value")).isEqualTo(3.0);
        assertThat(form.word("title")).contains("changed");
    }

    /** What a part says itself is never pushed out by another word of it: the reader tells that the two do not go together. */
    @Test
    void aPartNeverPushesOutItsOwnWords() {
        Form moist = read(Overlay.merge(tree(BASE), tree("medium: {humidity: 20 %, name: air}")));
        assertThat(moist.si("medium.humidity")).isEqualTo(0.2);
        Form helium =
                read(Overlay.merge(laid("medium.humidity=70 %"), tree("medium: {name: helium, temperature: 30 degC}")));
        assertThat(helium.has("medium.humidity")).isFalse();
        Problems problems = new Problems();
        Keys.read(Overlay.merge(tree(BASE), tree("suspension: {stiffness: 1 nN.m/rad, resonance: 2 Hz}")), problems);
        assertThat(problems.count()).isEqualTo(1);
    }

    private static Node.Mapping laid(String setting) {
        return Overlay.set(tree(BASE), Setting.read("--set", setting));
    }

    @Test
    void absurdlyDeepPathsAreRefused() {
        assertThat(problems("a" + ".a".repeat(50_000) + "=1"))
                .singleElement()
                .asString()
                .contains("a key of 50001 words");
    }
}
