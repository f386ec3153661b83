package flowshy.medium;

import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;

/** Media that follow a formula instead of rows; the header of their file names the formula. */
enum FormulaLaw {
    /** air at a relative humidity */
    MOIST_AIR("moist air") {
        @Override
        MediumLaw build(TableHeader header) {
            return new MoistAir(header, new PureGas(shelved("dry-air")));
        }
    },
    /** glycerol with water at a mass fraction */
    GLYCEROL_WATER("glycerol-water") {
        @Override
        MediumLaw build(TableHeader header) {
            return new GlycerolWater(header, shelved("water"));
        }
    },
    /** sea water at a practical salinity */
    SEA_WATER("sea water") {
        @Override
        MediumLaw build(TableHeader header) {
            return new SeaWater(header, shelved("water"));
        }
    };

    private final String word;

    FormulaLaw(String word) {
        this.word = word;
    }

    /** The law, with the provenance of its header. */
    abstract MediumLaw build(TableHeader header);

    /** @throws MediumTableException if the word is no law */
    static FormulaLaw named(String word, String file) {
        return Arrays.stream(values())
                .filter(law -> law.word.equals(word))
                .findFirst()
                .orElseThrow(() -> new MediumTableException(
                        List.of(new TableProblem(file, 1, 1, "the law '" + word + "'", words()))));
    }

    private static String words() {
        return Arrays.stream(values()).map(law -> law.word).collect(Collectors.joining(", "));
    }

    private static MediumTable shelved(String stem) {
        return MediumShelf.find(stem).orElseThrow();
    }
}
