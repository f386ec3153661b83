package flowshy.stream.cover;

import java.util.Optional;

/** The two covers that need no dimensions. */
public final class Covers {
    /** Nothing over the hair. */
    public static final Cover OPEN = new OpenCover();

    /** A full, closed cavity whose walls are far from the hair. */
    public static final Cover SEALED = new SealedCover(Optional.empty());

    private Covers() {}
}
