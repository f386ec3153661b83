package flowshy.report;

/** The cautions that stand under every answer. */
public final class Cautions {
    /** For a terminal. */
    public static final String SHORT =
            "An estimate for design, to be confirmed by test. Where a wrong reading can hurt someone, follow local"
                    + " codes and licensed practice.";

    private Cautions() {}
}
