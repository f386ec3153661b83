package flowshy.study.text;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class SettingTest {
    private static final Position DIAMETER = Position.label("--set hair.diameter");

    @Test
    void plainValuesAreTakenAsTheyAre() {
        Setting setting = Setting.read("--set", "hair.diameter=90 um");
        assertThat(setting.path()).containsExactly("hair", "diameter");
        assertThat(setting.value()).isEqualTo(new Node.Scalar("90 um", DIAMETER));
        Setting title = Setting.read("--set", "title=a: b = c # d");
        assertThat(((Node.Scalar) title.value()).text()).isEqualTo("a: b = c # d");
    }

    @Test
    void bracesAndQuotesAreYaml() {
        Setting setting = Setting.read("--set", "cover={kind: sealed, fill: {name: helium}}");
        Node.Mapping cover = (Node.Mapping) setting.value();
        assertThat(cover.entries()).extracting(Node.Entry::key).containsExactly("kind", "fill");
        assertThat(cover.entry("kind").orElseThrow().position()).hasToString("--set cover");
        Setting quoted = Setting.read("--set", "title='it''s'");
        assertThat(((Node.Scalar) quoted.value()).text()).isEqualTo("it's");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"", "=", "=5", "hair.diameter", "x={a: 1", "x={a: 1, a: 2}", "x='", "x=\u001B[2J", "x={a: *b}"})
    void refusesWhatIsNoSetting(String text) {
        assertThatThrownBy(() -> Setting.read("--set", text))
                .isInstanceOf(StudyException.class)
                .satisfies(e -> assertThat(e.getMessage()).startsWith("--set").doesNotContain("\u001B"));
    }
}
