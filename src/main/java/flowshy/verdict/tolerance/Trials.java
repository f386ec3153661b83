package flowshy.verdict.tolerance;

import flowshy.hair.Hair;
import flowshy.hair.LengthModel;
import flowshy.medium.Medium;
import flowshy.response.Device;
import flowshy.stream.cover.Cover;
import flowshy.torque.TorqueModel;
import flowshy.torque.Torques;
import flowshy.verdict.BandReading;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.design.DesignSpace;
import flowshy.verdict.design.NoDesignException;
import flowshy.verdict.figure.Evaluated;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.figure.FigureUnit;
import flowshy.verdict.figure.Found;
import flowshy.verdict.tolerance.sampling.Draw;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.atomic.AtomicReference;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * One device after another out of uncertain inputs: its rejection at each frequency, then its figures; and whether it meets each limit, all of
 * them, and can be made at all.
 */
final class Trials {
    private final DesignSpace space;
    private final double[] nominal;
    private final List<Uncertain> inputs;
    private final FlowModel flow;
    private final double[] omegas;
    private final List<Figure> figures;
    private final List<Condition> conditions;
    /** By figure: what the quick models of a trial miss for the nominal device, in dB added, else as a factor. */
    private final double[] held;

    private final AtomicReference<String> refusal = new AtomicReference<>("");

    Trials(
            DesignSpace space,
            double[] nominal,
            List<Uncertain> inputs,
            FlowModel flow,
            List<Double> frequencies,
            List<Figure> figures,
            List<Condition> conditions,
            double[] held) {
        this.space = space;
        this.nominal = nominal.clone();
        this.inputs = inputs;
        this.flow = flow;
        this.omegas = frequencies.stream()
                .mapToDouble(frequency -> 2.0 * FastMath.PI * frequency)
                .toArray();
        this.figures = figures;
        this.conditions = conditions;
        this.held = held.clone();
    }

    /** The same, so corrected that the nominal device has its own figures. */
    Trials corrected(double[] own) {
        double[] quick = at(new Target.Point(nominal)).from(omegas.length).values();
        double[] corrections = new double[own.length];
        for (int k = 0; k < own.length; k++) {
            boolean level = figures.get(k).unit() == FigureUnit.LEVEL;
            double neutral = level ? 0.0 : 1.0;
            double missed = level ? own[k] - quick[k] : own[k] / quick[k];
            corrections[k] = Double.isFinite(missed) && missed != 0.0 ? missed : neutral;
        }
        List<Double> frequencies = Arrays.stream(omegas)
                .map(omega -> omega / (2.0 * FastMath.PI))
                .boxed()
                .toList();
        return new Trials(space, nominal, inputs, flow, frequencies, figures, conditions, corrections);
    }

    /** Corrects nothing. */
    static double[] neutral(List<Figure> figures) {
        return figures.stream()
                .mapToDouble(figure -> figure.unit() == FigureUnit.LEVEL ? 0.0 : 1.0)
                .toArray();
    }

    /** Reason of a refused device: of several the first by the alphabet, so that no order of trials matters. */
    String refusal() {
        return refusal.get();
    }

    /** Values: rejection by frequency, then figures. Events: conditions, all of those asked, refused. */
    Draw at(double[] uniform) {
        Target.Point point = new Target.Point(nominal);
        for (int i = 0; i < inputs.size(); i++) {
            double deviation = inputs.get(i).shape().deviate(uniform[i]);
            inputs.get(i).targets().forEach(target -> target.move(point, deviation));
        }
        return at(point);
    }

    Draw at(Target.Point point) {
        double[] values = new double[omegas.length + figures.size()];
        boolean[] events = new boolean[conditions.size() + 2];
        try {
            BandsQuestion question = moved(space.at(point.numbers), point);
            Device device = question.device();
            rejections(device.with(device.hair().seenAs(LengthModel.STRIPS)), point.flow, values);
            Evaluated evaluated = new Evaluated(question);
            for (int k = 0; k < figures.size(); k++) {
                double quick = value(figures.get(k), evaluated, values, point.flow);
                values[omegas.length + k] =
                        figures.get(k).unit() == FigureUnit.LEVEL ? quick + held[k] : quick * held[k];
            }
            boolean all = true;
            for (int c = 0; c < conditions.size(); c++) {
                Condition condition = conditions.get(c);
                events[c] = condition.meets(values[omegas.length + figures.indexOf(condition.figure())]);
                all &= events[c] || !condition.asked();
            }
            events[conditions.size()] = all;
        } catch (NoDesignException e) {
            Arrays.fill(values, Double.NaN);
            events[conditions.size() + 1] = true;
            refusal.accumulateAndGet(e.getMessage(), (old, now) -> old.isEmpty() || now.compareTo(old) < 0 ? now : old);
        }
        return new Draw(values, events);
    }

    /** The medium around the hair with other properties; a correction for finite length is estimated, not solved anew. */
    private static BandsQuestion moved(BandsQuestion question, Target.Point point) {
        Device device = question.device();
        Medium around = moved(device.around(), point);
        Medium outside = device.around().equals(device.outside()) ? around : device.outside();
        LengthModel model =
                device.hair().lengthModel() == LengthModel.STRIPS ? LengthModel.STRIPS : LengthModel.ESTIMATE;
        Hair hair = device.hair().seenAs(model);
        return question.about(new Device(hair, device.suspension(), outside, device.cover(), around));
    }

    private static Medium moved(Medium medium, Target.Point point) {
        if (point.density == 1.0 && point.viscosity == 1.0) {
            return medium;
        }
        if (!(point.density > 0.0 && point.viscosity > 0.0)) {
            throw new NoDesignException("the medium's density or viscosity comes out below zero");
        }
        return medium.scaled(point.density, point.viscosity);
    }

    /** T_motion = T_carried − φ T_flow, whatever the model of the flow's torque. */
    private void rejections(Device device, double deviation, double[] values) {
        TorqueModel model = TorqueModel.of(device.hair(), device.around(), device.pivotDepth(), device.cover());
        for (int i = 0; i < omegas.length; i++) {
            values[i] = rejection(device.cover(), device.around(), model.at(omegas[i]), i, deviation);
        }
    }

    private double rejection(Cover cover, Medium around, Torques torques, int i, double deviation) {
        Complex share = cover.factor(torques.omega(), around).multiply(flow.factor(i));
        // never below nothing, however wide the spread
        double strength = FastMath.exp(deviation * flow.uncertainty(i));
        Complex plain = torques.flow();
        double real = strength * (plain.getReal() * share.getReal() - plain.getImaginary() * share.getImaginary());
        double imaginary = strength * (plain.getReal() * share.getImaginary() + plain.getImaginary() * share.getReal());
        double left = torques.carried() - real;
        return 10.0 * FastMath.log10((left * left + imaginary * imaginary) / (real * real + imaginary * imaginary));
    }

    private double value(Figure figure, Evaluated device, double[] rejections, double deviation) {
        if (figure == Figure.LEAST_REJECTION) {
            return omegas.length == 0 ? sealed(device.device()) : least(rejections);
        }
        Found found = figure.of(device);
        return figure == Figure.ERROR ? found.value() * louder(device, deviation) : found.value();
    }

    private static double sealed(Device device) {
        return BandReading.readsNothing(device) ? Double.NaN : Double.POSITIVE_INFINITY;
    }

    /** By how much the error grows with the flow's torque: as the rejection falls in the middle of the band. */
    private double louder(Evaluated evaluated, double deviation) {
        if (omegas.length == 0) {
            return 1.0;
        }
        Device device = evaluated.device().with(evaluated.device().hair().seenAs(LengthModel.STRIPS));
        int middle = omegas.length / 2;
        Torques torques = TorqueModel.of(device.hair(), device.around(), device.pivotDepth(), device.cover())
                .at(omegas[middle]);
        double still = rejection(device.cover(), device.around(), torques, middle, 0.0);
        double moved = rejection(device.cover(), device.around(), torques, middle, deviation);
        return FastMath.pow(10.0, (still - moved) / 20.0);
    }

    /** Least of evenly spaced values, by the parabola through it and its neighbours. */
    private double least(double[] values) {
        int at = 0;
        for (int i = 1; i < omegas.length; i++) {
            at = values[i] < values[at] ? i : at;
        }
        if (at == 0 || at == omegas.length - 1) {
            return values[at];
        }
        double slope = values[at + 1] - values[at - 1];
        double bend = values[at - 1] - 2.0 * values[at] + values[at + 1];
        return bend > 0.0 ? values[at] - slope * slope / (8.0 * bend) : values[at];
    }
}
