package flowshy.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import flowshy.hair.MeasuredProfile;
import flowshy.study.text.Problem;
import flowshy.study.text.StudyException;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** A profile in a table beside the study. */
class ProfileFileTest {
    private static final String STUDY = "hair: {shape: profile, file: p.csv, density: 1 g/cm3}\nmedium: air\n";

    @TempDir
    private Path folder;

    private Study read(String table) {
        try {
            Files.writeString(folder.resolve("p.csv"), table);
            return StudyReader.read(Files.writeString(folder.resolve("s.yaml"), STUDY), List.of());
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    private List<String> problems(String table) {
        try {
            read(table);
            return List.of();
        } catch (StudyException e) {
            return e.problems().stream().map(Problem::text).toList();
        }
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "z [um],diameter [um]\n0,90\n300,80\n600,0\n",
                "z [um]; diameter [um]\n0; 90\n300; 80\n600; 0\n",
                "z (um)\tdiameter (um)\n0\t90\n300\t80\n600\t0\n",
                "z/um,diameter/um\n0,90\n300,80\n600,0\n",
                "z_um,diameter_um\r\n0,90\r\n300,80\r\n600,0\r\n",
                "\uFEFF# measured\n\nz [mm], diameter [µm]\n# foot\n0, 90\n0.3, 80\n\n6e-1, 0\n",
                "note,diameter [um],z [um]\nfoot,90,0\n\"the, middle\",80,300\ntip,0,600\n",
                "\"z [um]\",\"diameter [um]\"\n0,90\n300,\"80\"\n600,0",
            })
    void everyUsualSpellingGivesTheSameProfile(String table) {
        assertThat(read(table).device().hair().profile())
                .isEqualTo(new MeasuredProfile(List.of(0.0, 300e-6, 600e-6), List.of(45e-6, 40e-6, 0.0)));
    }

    @Test
    void theFileIsRememberedWithItsDigest() throws IOException {
        Study study = read("z [um],diameter [um]\n0,90\n600,80\n");
        assertThat(study.origin().filesRead()).hasSize(1);
        assertThat(study.origin().filesRead().get(0).file()).isEqualTo("p.csv");
        String once = study.origin().filesRead().get(0).sha256();
        Study other = read("z [um],diameter [um]\n0,90\n600,81\n");
        assertThat(once)
                .hasSize(64)
                .isNotEqualTo(other.origin().filesRead().get(0).sha256());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "'z,diameter [um]\n0,90' | p.csv:1:1: 1 has no unit; a length is wanted here, with its unit: um, mm, m, nm, cm, in, mil; did you mean 1 um?",
                "'z [um],diameter [kg]\n0,90' | p.csv:1:8: 1 kg is a mass; a length is wanted here, with its unit: um, mm, m, nm, cm, in, mil",
                "'z [um],diametre [um]\n0,90' | p.csv:1:1: no column diameter; the header names its columns with units, e.g. diameter [um]; diametre looks like it",
                "'0,90\n1,90' | p.csv:1:1: no column diameter; the header names its columns with units, e.g. diameter [um]",
                "'z [um],diameter [um]\n0,90\n300,\n600,80' | p.csv:3:5: no diameter in this row; one number a column",
                "'z [um],diameter [um]\n0,90\n300\n600,80' | p.csv:3:4: no diameter in this row; one number a column",
                "'z [um],diameter [um]\n0,90\n300, thick\n600,80' | p.csv:3:6: thick um is not a number; a length is wanted here, with its unit: um, mm, m, nm, cm, in, mil",
                "'z [um],diameter [um]\n0,90\n300,NaN\n600,80' | p.csv:3:5: NaN um is not a finite number; a length is wanted here, with its unit: um, mm, m, nm, cm, in, mil",
                "'z [um];diameter [um]\n0;90\n300,5;80\n600;80' | p.csv:3:1: 300,5 um has a comma; write a point for decimals and nothing between thousands; did you mean 300.5 um?",
                "'z [um],diameter [um]\n1,90\n300,80' | p.csv:2:1: hair.file: the first height is not zero; z counts from the wall, 0 first",
                "'z [um],diameter [um]\n0,90\n300,80\n300,70' | p.csv:4:1: hair.file: the height does not rise; each z lies above the one before",
                "'z [um],diameter [um]\n0,90\n300,0\n600,70' | p.csv:3:5: hair.file: a diameter not above zero; only the tip may have diameter 0",
                "'z [um],diameter [um]\n0,90\n300,-5\n600,70' | p.csv:3:5: hair.file: a diameter not above zero; only the tip may have diameter 0",
                "'z [um],diameter [um]\n0,90\n300,0.009\n600,70' | p.csv:3:5: hair.file: thinner than 10 nm; 10 nm or more, or a tip of diameter 0",
                "'z [um],diameter [um]\n0,90\n1.1e6,70' | p.csv:3:1: hair.file: longer than 1 m; a hair of 1 m or less",
                "'z [um],diameter [um]\n0,9000\n600,70' | p.csv:2:3: hair.file: wider than the hair is long; a hair is at least as long as wide",
                "'z [um],diameter [um]\n0,0' | p.csv:2:1: hair.file: one height only; a profile has two heights or more",
                "'z [um],diameter [um]' | p.csv: no rows; a header with units, then numbers",
                "'' | p.csv: no rows; a header with units, then numbers",
            })
    void faultsAreToldWithLineAndColumn(String table, String problem) {
        assertThat(problems(table)).last().isEqualTo(problem);
    }

    @Test
    void everyFaultOfATableIsTold() {
        assertThat(problems("z [um],diameter [um]\n0,x\n300,\ny,70\n"))
                .extracting(p -> p.substring(0, p.indexOf(": ")))
                .containsExactly("p.csv:2:3", "p.csv:3:5", "p.csv:4:1");
    }

    @Test
    void tooManyRowsAndControlCharactersAreRefused() throws IOException {
        StringBuilder table = new StringBuilder("z [um],diameter [um]\n");
        for (int i = 0; i <= 10_000; i++) {
            table.append(i).append(",90\n");
        }
        assertThat(problems(table.toString()))
                .containsExactly("p.csv:10002:1: more than 10000 rows; shorten the table");
        assertThat(problems("z [um],diameter [um]\n0,9\u0000\n"))
                .containsExactly("p.csv:2:4: control character U+0000; plain text only");
        Files.write(folder.resolve("p.csv"), "z [µm],diameter [µm]\n".getBytes(StandardCharsets.ISO_8859_1));
        Path study = Files.writeString(folder.resolve("s.yaml"), STUDY);
        assertThat(catchThrowableOfType(StudyException.class, () -> StudyReader.read(study, List.of())))
                .hasMessage("p.csv:1:4: byte 4 (0xB5) is not UTF-8; save the file as UTF-8; 0xB5 is µ in Latin-1");
    }
}
