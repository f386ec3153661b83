package flowshy.medium;

import java.util.List;

/** No medium has the name that was asked for. */
public final class UnknownMediumException extends MediumException {
    private static final long serialVersionUID = 1L;

    private final transient List<String> nearest;

    /**
     * States the unknown name.
     *
     * @param name as asked for
     * @param nearest known names, the nearest first
     */
    public UnknownMediumException(String name, List<String> nearest) {
        super(
                MediumParameter.NAME,
                "'" + name + "' is not a known medium; the nearest names are " + String.join(", ", nearest)
                        + ". Or give density and viscosity, or a table of your own.");
        this.nearest = List.copyOf(nearest);
    }

    /**
     * Known names like the one asked for.
     *
     * @return names, the nearest first
     */
    public List<String> nearest() {
        return nearest;
    }
}
