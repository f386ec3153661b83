package flowshy.study;

import flowshy.response.Hold;
import flowshy.study.keys.Form;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.envelope.Envelope;
import flowshy.verdict.envelope.Side;
import java.nio.file.Path;
import java.util.List;

/**
 * The states that a device must bear after it has been scaled: those of its study, so that it is judged as the device is that it is
 * compared with.
 *
 * @param study of the device before
 * @param hold what of its suspension stays
 * @param form of the study
 * @param folder in which its files lie
 */
record ScaledStates(Study study, Hold hold, Form form, Path folder) {
    /**
     * A scaled device under the states of its study.
     *
     * @param scaled about the scaled device, at one state
     * @param changed the form with the numbers that were scaled
     */
    BandsQuestion bear(BandsQuestion scaled, Form changed) {
        if (study.envelope().isEmpty()) {
            return scaled;
        }
        List<Side> sides = study.envelope().get().sides();
        NumberKeys numbers = new NumberKeys(form);
        List<NumberKey> keys =
                sides.stream().map(side -> numbers.key("", side.key())).toList();
        return scaled.within(new Envelope(VariedStudy.of(changed, folder, study.about(scaled), hold, keys), sides));
    }
}
