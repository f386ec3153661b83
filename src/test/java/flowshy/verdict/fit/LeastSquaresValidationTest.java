package flowshy.verdict.fit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.hipparchus.linear.RealMatrix;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** The solver on NIST's Statistical Reference Datasets for non-linear regression, from both starts of each. */
class LeastSquaresValidationTest {
    /** Certified values have eleven digits; eight must be met. */
    private static final double EIGHT_DIGITS = 0.5e-8;

    /** The sets with their models; data and certified values lie in {@code strd-NAME.txt}. */
    enum Strd {
        MISRA1A("Misra1a", 14, 2, "b1*(1-exp(-b2*x))") {
            @Override
            double model(double[] b, double x) {
                return b[0] * (1.0 - FastMath.exp(-b[1] * x));
            }
        },
        LANCZOS3("Lanczos3", 24, 6, "b1*exp(-b2*x)+b3*exp(-b4*x)+b5*exp(-b6*x)") {
            @Override
            double model(double[] b, double x) {
                return b[0] * FastMath.exp(-b[1] * x) + b[2] * FastMath.exp(-b[3] * x) + b[4] * FastMath.exp(-b[5] * x);
            }
        },
        ROSZMAN1("Roszman1", 25, 4, "b1-b2*x-arctan(b3/(x-b4))/pi") {
            @Override
            double model(double[] b, double x) {
                return b[0] - b[1] * x - FastMath.atan(b[2] / (x - b[3])) / FastMath.PI;
            }
        },
        MGH17("MGH17", 33, 5, "b1+b2*exp(-x*b4)+b3*exp(-x*b5)") {
            @Override
            double model(double[] b, double x) {
                return b[0] + b[1] * FastMath.exp(-x * b[3]) + b[2] * FastMath.exp(-x * b[4]);
            }
        },
        THURBER("Thurber", 37, 7, "(b1+b2*x+b3*x^2+b4*x^3)/(1+b5*x+b6*x^2+b7*x^3)") {
            @Override
            double model(double[] b, double x) {
                return (b[0] + x * (b[1] + x * (b[2] + x * b[3]))) / (1.0 + x * (b[4] + x * (b[5] + x * b[6])));
            }
        },
        MGH09("MGH09", 11, 4, "b1*(x^2+x*b2)/(x^2+x*b3+b4)") {
            @Override
            double model(double[] b, double x) {
                return b[0] * (x * x + x * b[1]) / (x * x + x * b[2] + b[3]);
            }
        },
        ECKERLE4("Eckerle4", 35, 3, "(b1/b2)*exp(-0.5*((x-b3)/b2)^2)") {
            @Override
            double model(double[] b, double x) {
                double z = (x - b[2]) / b[1];
                return b[0] / b[1] * FastMath.exp(-0.5 * z * z);
            }
        },
        RAT42("Rat42", 9, 3, "b1/(1+exp(b2-b3*x))") {
            @Override
            double model(double[] b, double x) {
                return b[0] / (1.0 + FastMath.exp(b[1] - b[2] * x));
            }
        },
        RAT43("Rat43", 15, 4, "b1/((1+exp(b2-b3*x))^(1/b4))") {
            @Override
            double model(double[] b, double x) {
                return b[0] / FastMath.pow(1.0 + FastMath.exp(b[1] - b[2] * x), 1.0 / b[3]);
            }
        },
        BOXBOD("BoxBOD", 6, 2, "b1*(1-exp(-b2*x))") {
            @Override
            double model(double[] b, double x) {
                return b[0] * (1.0 - FastMath.exp(-b[1] * x));
            }
        };

        final String name;
        final int rows;
        final int parameters;
        final String formula;

        Strd(String name, int rows, int parameters, String formula) {
            this.name = name;
            this.rows = rows;
            this.parameters = parameters;
            this.formula = formula;
        }

        abstract double model(double[] b, double x);
    }

    /** One file as read: parameters as start 1, start 2, certified value, certified standard deviation. */
    private record Reference(double rss, List<double[]> parameters, List<double[]> rows) {
        static Reference of(Strd set) throws IOException {
            double rss = Double.NaN;
            List<double[]> parameters = new ArrayList<>();
            List<double[]> rows = new ArrayList<>();
            try (InputStream in = Reference.class.getResourceAsStream("strd-" + set.name + ".txt")) {
                assertThat(in).isNotNull();
                for (String line : new String(in.readAllBytes(), StandardCharsets.UTF_8)
                        .lines()
                        .toList()) {
                    String[] words = line.split(" ", -1);
                    if (line.startsWith("#")) {
                        continue;
                    }
                    if (words[0].equals("model")) {
                        assertThat(words[1]).isEqualTo(set.formula);
                    } else if (words[0].equals("rss")) {
                        rss = Double.parseDouble(words[1]);
                    } else if (words[0].startsWith("b")) {
                        parameters.add(numbers(words, 1));
                    } else {
                        rows.add(numbers(words, 0));
                    }
                }
            }
            assertThat(rss).isFinite();
            assertThat(parameters).hasSize(set.parameters);
            assertThat(rows).hasSize(set.rows);
            return new Reference(rss, parameters, rows);
        }

        private static double[] numbers(String[] words, int from) {
            return Arrays.stream(words)
                    .skip(from)
                    .mapToDouble(Double::parseDouble)
                    .toArray();
        }

        double[] column(int which) {
            return parameters.stream().mapToDouble(p -> p[which]).toArray();
        }
    }

    @ParameterizedTest
    @EnumSource
    void reproducesCertifiedValuesFromBothStarts(Strd set) throws IOException {
        Reference reference = Reference.of(set);
        for (int start : new int[] {0, 1}) {
            double[] from = reference.column(start);
            double[] scale = Arrays.stream(from).map(FastMath::abs).toArray();
            double[] free = new double[from.length];
            Arrays.fill(free, Double.NEGATIVE_INFINITY);
            LeastSquares problem = new LeastSquares(
                    b -> reference.rows().stream()
                            .mapToDouble(row -> row[1] - set.model(b, row[0]))
                            .toArray(),
                    scale,
                    free);
            double[] found = problem.minimum(from);
            double rss = reference.rows().stream()
                    .mapToDouble(row -> FastMath.pow(row[1] - set.model(found, row[0]), 2))
                    .sum();
            assertThat(rss / reference.rss())
                    .as("%s residual sum from start %d", set, start + 1)
                    .isCloseTo(1.0, within(EIGHT_DIGITS));
            RealMatrix cofactor = problem.cofactor(found);
            double variance = rss / (set.rows - set.parameters);
            for (int i = 0; i < set.parameters; i++) {
                double[] certified = reference.parameters().get(i);
                assertThat(found[i] / certified[2])
                        .as("%s b%d from start %d", set, i + 1, start + 1)
                        .isCloseTo(1.0, within(EIGHT_DIGITS));
                assertThat(FastMath.sqrt(variance * cofactor.getEntry(i, i)) / certified[3])
                        .as("%s sd of b%d from start %d", set, i + 1, start + 1)
                        .isCloseTo(1.0, within(1e-7));
            }
        }
    }

    @Test
    void allThreeLevelsAreThere() {
        assertThat(Stream.of(Strd.values()).map(set -> set.name))
                .contains("Misra1a", "Lanczos3", "Roszman1", "MGH17", "Thurber", "MGH09", "Rat43");
    }
}
