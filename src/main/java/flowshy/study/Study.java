package flowshy.study;

import flowshy.hair.Hair;
import flowshy.response.Calibration;
import flowshy.response.Device;
import flowshy.stream.Source;
import flowshy.verdict.Acceptance;
import flowshy.verdict.Band;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.envelope.Envelope;
import flowshy.verdict.error.Motion;
import flowshy.verdict.lid.Candidate;
import flowshy.verdict.measured.MeasuredResponse;
import flowshy.verdict.tolerance.Tolerances;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * A study as understood: SI inside, checked, nothing left to ask.
 *
 * @param title as written, empty if there is none
 * @param origin file, digest and settings it came from
 * @param device hair, suspension, medium and cover
 * @param measuredOn hair that carried the suspension when it was measured: the device's own, or in a variant that of its base
 * @param band band of use
 * @param acceptance limits asked
 * @param calibration where the sensitivity is stated, if asked
 * @param candidates covers to choose from, in order of preference; empty if not stated
 * @param motion what is to be read
 * @param surroundings flows that are there, in the order written; empty if not stated
 * @param measurements measured responses to lay beside the model, in the order written
 * @param envelope states that the device must bear, empty if not stated
 * @param tolerances how surely its numbers are known
 * @param document entries of the document block, in the order of the key table
 * @param takenAs every default that was used
 * @param understood every value that was written, and every one of the surroundings in full, in the order of the key table
 */
public record Study(
        String title,
        Origin origin,
        Device device,
        Hair measuredOn,
        Band band,
        Acceptance acceptance,
        Optional<Calibration> calibration,
        List<Candidate> candidates,
        Motion motion,
        List<Source> surroundings,
        List<MeasuredResponse> measurements,
        Optional<Envelope> envelope,
        Tolerances tolerances,
        Map<String, String> document,
        List<TakenAs> takenAs,
        List<Understood> understood) {
    /** Copies the lists. */
    public Study {
        document = Collections.unmodifiableMap(new LinkedHashMap<>(document));
        candidates = List.copyOf(candidates);
        surroundings = List.copyOf(surroundings);
        measurements = List.copyOf(measurements);
        takenAs = List.copyOf(takenAs);
        understood = List.copyOf(understood);
    }

    /** The same study with more values understood. */
    Study alsoUnderstood(List<Understood> more) {
        if (more.isEmpty()) {
            return this;
        }
        List<Understood> all = new ArrayList<>(understood);
        all.addAll(more);
        return new Study(
                title,
                origin,
                device,
                measuredOn,
                band,
                acceptance,
                calibration,
                candidates,
                motion,
                surroundings,
                measurements,
                envelope,
                tolerances,
                document,
                takenAs,
                all);
    }

    /** The same study about another device, with what else may go with that; nothing is said of the states it must bear. */
    Study about(BandsQuestion other) {
        return new Study(
                title,
                origin,
                other.device(),
                measuredOn,
                other.band(),
                other.acceptance(),
                calibration,
                candidates,
                other.motion(),
                other.sources(),
                measurements,
                Optional.empty(),
                tolerances,
                document,
                takenAs,
                understood);
    }

    /**
     * The main question that the study asks.
     *
     * @return about its device, with its limits, motion and surroundings
     */
    public BandsQuestion question() {
        return new BandsQuestion(device, band, acceptance, motion, surroundings, reference(), envelope);
    }

    /**
     * Frequency at which sensitivities are compared.
     *
     * @return the calibration's, or the middle of the band on a logarithmic scale [Hz]
     */
    public double reference() {
        return calibration.map(Calibration::frequency).orElseGet(band::middle);
    }

    /**
     * Where a study came from.
     *
     * @param file name of the study file as given on the command line
     * @param text of the study file, without a byte order mark
     * @param sha256 digest of its bytes, 64 hexadecimal digits
     * @param filesRead every further file that was read, in order
     * @param settings KEY=VALUE words that overlaid the file, in order
     */
    public record Origin(String file, String text, String sha256, List<FileRead> filesRead, List<String> settings) {
        /** Copies the lists. */
        public Origin {
            filesRead = List.copyOf(filesRead);
            settings = List.copyOf(settings);
        }
    }

    /**
     * A further file that a study names.
     *
     * @param file as written in the study
     * @param sha256 digest of its bytes
     */
    public record FileRead(String file, String sha256) {}

    /**
     * A default that was used.
     *
     * @param key path of the key, e.g. {@code medium.temperature}
     * @param value as a study would write it, with its unit
     * @param why where the default comes from, one short clause
     */
    public record TakenAs(String key, String value, String why) {}

    /**
     * A value that was written, or that stands for a word of the surroundings.
     *
     * @param key path of the key
     * @param written as written, or as a study would write it
     * @param si in SI with its unit, e.g. {@code 8.0e-05 m}; the text itself where the value is not a quantity
     */
    public record Understood(String key, String written, String si) {}
}
