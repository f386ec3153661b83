package flowshy.verdict.size;

import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * What is to be sized.
 *
 * @param variables the numbers that may be chosen, one or more
 * @param maximize whether the objective is made largest; least, if not
 * @param constraints limits that must be kept, may be empty
 * @param trials what a choice of numbers gives, thread-safe
 */
public record SizingProblem(List<Variable> variables, boolean maximize, List<Constraint> constraints, Trials trials) {
    /** A shortfall that is counted as endless: no figure is further from its limit than a thousand times the scale. */
    private static final double ENDLESS = 1e3;

    /** Copies the lists. */
    public SizingProblem {
        variables = List.copyOf(variables);
        constraints = List.copyOf(constraints);
        if (variables.isEmpty()) {
            throw new IllegalArgumentException("nothing may be varied");
        }
    }

    /** What a choice of numbers gives. */
    @FunctionalInterface
    public interface Trials {
        /**
         * Tries a choice.
         *
         * @param values one a variable, in SI
         * @return the figures, or why there is no device
         */
        Trial at(List<Double> values);
    }

    /** Tries shares of the ranges. */
    Candidate at(double... shares) {
        List<Double> values = new ArrayList<>();
        for (int i = 0; i < shares.length; i++) {
            values.add(variables.get(i).at(shares[i]));
        }
        return at(values);
    }

    /** Tries values, each inside its range. */
    Candidate at(List<Double> values) {
        Trial trial = trials.at(values);
        List<Double> shortfalls = new ArrayList<>();
        for (int i = 0; i < constraints.size() && trial.there(); i++) {
            double shortfall = constraints.get(i).shortfall(trial.found().get(i));
            shortfalls.add(FastMath.min(FastMath.max(shortfall, -ENDLESS), ENDLESS));
        }
        return new Candidate(values, trial, maximize ? -trial.objective() : trial.objective(), shortfalls);
    }

    /** The same with one limit moved. */
    SizingProblem withLimit(int index, double limit) {
        List<Constraint> moved = new ArrayList<>(constraints);
        moved.set(index, constraints.get(index).at(limit));
        return new SizingProblem(variables, maximize, moved, trials);
    }

    /** The same with other trials. */
    SizingProblem by(Trials other) {
        return new SizingProblem(variables, maximize, constraints, other);
    }

    /** The same with every range cut to a reach, in shares of it, about a place. */
    SizingProblem near(List<Double> place, double reach) {
        List<Variable> cut = new ArrayList<>();
        for (int i = 0; i < variables.size(); i++) {
            cut.add(variables.get(i).near(place.get(i), reach));
        }
        return new SizingProblem(cut, maximize, constraints, trials);
    }

    /** Where values lie in their ranges. */
    double[] shares(List<Double> values) {
        double[] shares = new double[values.size()];
        for (int i = 0; i < shares.length; i++) {
            shares[i] = variables.get(i).share(values.get(i));
        }
        return shares;
    }
}
