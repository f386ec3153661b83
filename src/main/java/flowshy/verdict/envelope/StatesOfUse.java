package flowshy.verdict.envelope;

import flowshy.medium.MediumQuery;
import flowshy.stream.cover.Cover;
import flowshy.verdict.design.DesignSpace;
import flowshy.verdict.lid.Candidate;

/** The device of a study in states that it must bear, under its own cover and in its own medium or in others. */
public interface StatesOfUse extends DesignSpace {
    /**
     * The same states under another cover: a fill of its own is closed in at the state where it was filled, which no state of the medium
     * outside moves; any other cover holds what is outside.
     *
     * @param candidate a cover of the study, or one sized for its hair
     * @return states of the device under it
     */
    StatesOfUse under(Candidate candidate);

    /**
     * The same states with a fluid in place of the medium outside. Under a closed cover it was filled in at the study's own state: a gas
     * keeps its density, a liquid its pressure. Otherwise it has temperature and pressure of each state, and the sources of flow are its
     * own, with the speeds that the study states.
     *
     * @param fluid at the study's own state
     * @param cover stands over the hair
     * @return states of the device in it; whatever the fluid does not bear makes no design
     */
    StatesOfUse filled(MediumQuery fluid, Cover cover);

    @Override
    StatesOfUse still();
}
