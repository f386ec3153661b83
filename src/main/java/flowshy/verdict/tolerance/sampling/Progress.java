package flowshy.verdict.tolerance.sampling;

/** Is told how far a run has come, by one thread, a few hundred trials apart. */
@FunctionalInterface
public interface Progress {
    /** Tells nobody. */
    Progress NONE = (done, most) -> {};

    /**
     * How far it has come.
     *
     * @param done trials done
     * @param most trials at most
     */
    void at(long done, long most);
}
