package flowshy.medium;

/** Gives a medium at a state. */
interface MediumLaw {
    /** What the medium is called, covers and needs. */
    TableHeader header();

    /**
     * The medium at the state of a query whose parameters fit the header.
     *
     * @throws OutOfTableException if the state is not covered
     */
    Medium at(MediumQuery query);
}
