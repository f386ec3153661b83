package flowshy.verdict.fill;

import flowshy.medium.Media;
import flowshy.medium.Medium;
import flowshy.medium.OutOfTableException;
import flowshy.medium.PropertySource;
import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.response.ResponsePoint;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import flowshy.stream.cover.VentedCover;
import flowshy.verdict.Acceptance;
import flowshy.verdict.Band;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.DeviceFacts.Swing;
import flowshy.verdict.Reads;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The fill decision: one device, every fill, bare and sealed. Stiffness and structural damping are held from the study.
 *
 * @param device of the study
 * @param band band of use
 * @param acceptance limits asked
 * @param reference frequency at which sensitivity and noise are compared [Hz]
 * @param fills candidates, at the study's state
 * @param covers each fluid is tried under each; a cover that is not closed lets the fluid's own flow in
 */
public record FillQuestion(
        Device device, Band band, Acceptance acceptance, double reference, List<Fill> fills, List<Cover> covers) {
    /** Copies the list. */
    public FillQuestion {
        fills = List.copyOf(fills);
        covers = List.copyOf(covers);
    }

    /**
     * The question for the bare and the sealed device.
     *
     * @param device of the study
     * @param band band of use
     * @param acceptance limits asked
     * @param reference [Hz]
     * @param fills candidates
     */
    public FillQuestion(Device device, Band band, Acceptance acceptance, double reference, List<Fill> fills) {
        this(device, band, acceptance, reference, fills, List.of(Covers.OPEN, Covers.SEALED));
    }

    /**
     * Every fill under every cover.
     *
     * @return fluids that nothing speaks against first, by falling rejection, equal ones by rising noise
     */
    public List<FillRow> answer() {
        ResponsePoint base = new Response(device).at(reference);
        List<FillRow> rows = new ArrayList<>();
        for (Fill fill : fills) {
            for (Cover cover : covers) {
                rows.add(row(fill, cover, base));
            }
        }
        rows.sort(Comparator.comparing((FillRow row) -> !row.excluded().isEmpty())
                .thenComparing(row -> row.medium().isEmpty())
                .thenComparing(row -> Double.isNaN(row.rejection()) ? 1.0 : 0.0)
                .thenComparing(row -> -row.rejection())
                .thenComparing(row -> row.thermalNoise().orElse(1.0 / row.sensitivity())));
        return rows;
    }

    private FillRow row(Fill fill, Cover cover, ResponsePoint base) {
        Medium medium;
        try {
            medium = Media.at(fill.query());
        } catch (OutOfTableException e) {
            return refused(fill, cover, why(e));
        }
        if (cover instanceof VentedCover && medium.soundSpeed().isEmpty()) {
            return refused(
                    fill, cover, "sound speed not known: a vented cover breathes by the compliance of its cavity");
        }
        Device filled = new Device(device.hair(), device.suspension(), medium, cover, medium);
        BandsAnswer answer = new BandsQuestion(filled, band, acceptance).answer(List.of(reference));
        ResponsePoint point = answer.points().get(0);
        Reads reads = answer.bands().get(0).reads();
        Optional<Swing> swing = answer.facts().medium();
        List<String> excluded = new ArrayList<>();
        if (reads == Reads.NOTHING) {
            excluded.add("reads nothing: hair and fluid are of one density");
        }
        if (reads == Reads.UNDECIDED) {
            excluded.add("undecided: a model has ended");
        }
        if (device.suspension().isPresent() && swing.isEmpty()) {
            excluded.add("the suspension does not hold the hair upright");
        }
        if (swing.isPresent() && swing.get().decay().overdamped()) {
            excluded.add("overdamped");
        }
        boolean memory = medium.sources().stream()
                .filter(source ->
                        source.property().equals("density") || source.property().equals("viscosity"))
                .anyMatch(source -> source.reading() == PropertySource.Reading.MEMORY);
        double rejection = answer.least()
                .map(BandsAnswer.Extreme::rejection)
                .orElse(reads == Reads.NOTHING ? Double.NaN : Double.POSITIVE_INFINITY);
        return new FillRow(
                fill.name(),
                cover,
                Optional.of(medium),
                rejection,
                answer.least().map(BandsAnswer.Extreme::frequency).orElse(Double.NaN),
                swing.isPresent() ? OptionalDouble.of(swing.get().resonance()) : OptionalDouble.empty(),
                swing.isPresent() ? OptionalDouble.of(swing.get().decay().quality()) : OptionalDouble.empty(),
                sensitivity(point, base),
                point.thermalNoise(),
                excluded,
                memory);
    }

    private static double sensitivity(ResponsePoint point, ResponsePoint base) {
        if (point.motion().isPresent() && base.motion().isPresent()) {
            return point.motion().get().norm() / base.motion().get().norm();
        }
        return point.motionTorque().norm() / base.motionTorque().norm();
    }

    private static String why(OutOfTableException e) {
        String why = switch (e.why()) {
            case BOILS -> "boils";
            case FREEZES -> "freezes";
            case CONDENSES -> "condenses";
            case OUTSIDE -> "outside the range of its data";
        };
        return why + ": " + e.getMessage();
    }

    private static FillRow refused(Fill fill, Cover cover, String why) {
        return new FillRow(
                fill.name(),
                cover,
                Optional.empty(),
                Double.NaN,
                Double.NaN,
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                Double.NaN,
                OptionalDouble.empty(),
                List.of(why),
                false);
    }
}
