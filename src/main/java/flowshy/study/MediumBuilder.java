package flowshy.study;

import flowshy.medium.Media;
import flowshy.medium.Medium;
import flowshy.medium.MediumException;
import flowshy.medium.MediumParameter;
import flowshy.medium.MediumQuery;
import flowshy.medium.SealedFill;
import flowshy.medium.UnfitParameterException;
import flowshy.medium.UnknownMediumException;
import flowshy.study.keys.Form;
import flowshy.study.keys.Keys;
import flowshy.study.keys.Presence;
import flowshy.study.text.Nearest;
import flowshy.study.text.Problem;
import flowshy.study.text.Problems;
import flowshy.study.text.StudyException;
import flowshy.study.units.Dimension;
import flowshy.study.units.Quantity;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/** From the keys of a medium to its properties; a refused state is told at the key that is at fault. */
final class MediumBuilder {
    /** Parameters that a medium may have beside temperature and pressure. */
    private static final List<MediumParameter> FURTHER = List.of(
            MediumParameter.HUMIDITY, MediumParameter.MASS_FRACTION, MediumParameter.SALINITY, MediumParameter.GRADE);

    private final Form form;
    private final Problems problems;
    private final FilesRead files;
    private final List<Form.Taken> taken = new ArrayList<>();

    MediumBuilder(Form form, Problems problems, FilesRead files) {
        this.form = form;
        this.problems = problems;
        this.files = files;
    }

    /** Defaults that were needed only because of the medium. */
    List<Form.Taken> taken() {
        return List.copyOf(taken);
    }

    /** Whether the group names no medium but vacuum. */
    boolean isVacuum(String path) {
        return form.word(path + ".name").filter("vacuum"::equals).isPresent();
    }

    /** The medium of a group, at its own state; empty if it has a problem. */
    Optional<Medium> build(String path) {
        return build(path, Media::at);
    }

    /** The fill of a closed cavity, filled at its own state and used at another temperature; empty if it has a problem. */
    Optional<Medium> sealed(String path, double temperature) {
        return build(path, query -> new SealedFill(query).at(temperature));
    }

    private Optional<Medium> build(String path, Function<MediumQuery, Medium> law) {
        if (problems.touches(path) || !form.has(path)) {
            return Optional.empty();
        }
        if (isVacuum(path)) {
            problems.add(
                    form.position(path + ".name"),
                    path + ".name",
                    "vacuum: without a medium there is no flow to read",
                    "name a gas or liquid; for a package at low pressure give the gas and its pressure");
            return Optional.empty();
        }
        MediumQuery query;
        try {
            query = query(path);
        } catch (StudyException e) {
            e.problems().forEach(problems::add);
            return Optional.empty();
        }
        try {
            return Optional.of(law.apply(query));
        } catch (UnfitParameterException e) {
            return e.missing() && usual(path, e.parameter()).isPresent()
                    ? withUsual(path, query, e.parameter(), law)
                    : refused(path, e);
        } catch (MediumException e) {
            return refused(path, e);
        }
    }

    private MediumQuery query(String path) {
        double temperature = form.si(path + ".temperature");
        if (form.has(path + ".density")) {
            double density = form.si(path + ".density");
            double viscosity =
                    form.siIfAny(path + ".viscosity").orElseGet(() -> density * form.si(path + ".kinematic-viscosity"));
            MediumQuery.GivenProperties given =
                    new MediumQuery.GivenProperties(density, viscosity, form.siIfAny(path + ".sound-speed"));
            return MediumQuery.of("medium of the study", given, temperature, MediumQuery.USUAL_PRESSURE);
        }
        if (form.has(path + ".file")) {
            return MediumQuery.of(files.medium(form, path + ".file"), temperature, form.si(path + ".pressure"));
        }
        MediumQuery query =
                MediumQuery.of(form.word(path + ".name").orElseThrow(), temperature, form.si(path + ".pressure"));
        for (MediumParameter parameter : FURTHER) {
            String key = path + "." + parameter.key();
            query = form.has(key) ? query.with(parameter, form.si(key)) : query;
        }
        return form.has(path + ".second")
                ? query.with(form.word(path + ".second").orElseThrow(), form.si(path + ".share"))
                : query;
    }

    private static Optional<Presence> usual(String path, MediumParameter parameter) {
        return Keys.presence(path + "." + parameter.key())
                .filter(presence -> presence.kind() == Presence.Kind.IF_NEEDED);
    }

    private Optional<Medium> withUsual(
            String path, MediumQuery query, MediumParameter parameter, Function<MediumQuery, Medium> law) {
        Presence usual = usual(path, parameter).orElseThrow();
        double value = Quantity.read(usual.value(), Dimension.SHARE).value();
        taken.add(new Form.Taken(path + "." + parameter.key(), usual.value(), usual.why()));
        try {
            return Optional.of(law.apply(query.with(parameter, value)));
        } catch (MediumException e) {
            return refused(path, e);
        }
    }

    private Optional<Medium> refused(String path, MediumException e) {
        String key = path + "." + e.parameter().key();
        String at = form.has(key) ? key : path;
        Optional<String> near = e instanceof UnknownMediumException unknown
                ? form.word(path + ".name").flatMap(name -> Nearest.among(name, unknown.nearest()))
                : Optional.empty();
        problems.add(new Problem(form.position(at), key, e.getMessage(), "", near));
        return Optional.empty();
    }
}
