package flowshy.study;

import flowshy.medium.Medium;
import flowshy.stream.Source;
import flowshy.stream.SourceKind;
import flowshy.stream.Stated;
import flowshy.stream.record.MeasuredSpectrum;
import flowshy.stream.record.Quantity;
import flowshy.stream.record.Signal;
import flowshy.stream.sound.SoundWave;
import flowshy.stream.surroundings.Measured;
import flowshy.stream.surroundings.NamedSurroundings;
import flowshy.study.keys.Form;
import flowshy.study.keys.Keys;
import flowshy.study.keys.Presence;
import flowshy.study.text.Problems;
import flowshy.study.units.Dimension;
import flowshy.study.units.Swing;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Sources of flow that were measured: a stream, an oscillation or sound, as the unit of the values and a mean speed say. */
final class MeasuredSources {
    private final Form form;
    private final Problems problems;
    private final MeasuredReader reader;
    private final Medium outside;
    private final List<Form.Taken> taken = new ArrayList<>();

    MeasuredSources(Form form, Problems problems, FilesRead files, Medium outside) {
        this.form = form;
        this.problems = problems;
        this.reader = new MeasuredReader(form, problems, files);
        this.outside = outside;
    }

    /** What was read off a file in place of written keys. */
    List<Form.Taken> taken() {
        return List.copyOf(taken);
    }

    Optional<Source> build(String name, String path) {
        boolean record = form.word(path + ".kind").orElseThrow().equals("record");
        Quantity quantity = record
                ? Quantity.TIME_RECORD
                : Quantity.of(form.word(path + ".quantity").orElseThrow()).orElseThrow();
        Optional<MeasuredSpectrum> spectrum = reader.read(path, quantity);
        if (spectrum.isEmpty()) {
            return Optional.empty();
        }
        MeasuredReader.averaged(path, spectrum.get()).ifPresent(taken::add);
        return source(name, path, record ? SourceKind.RECORD : SourceKind.SPECTRUM, spectrum.get());
    }

    private Optional<Source> source(String name, String path, SourceKind kind, MeasuredSpectrum spectrum) {
        double direction = form.si(path + ".direction");
        if (spectrum.signal() == Signal.ACCELERATION) {
            return refuse(
                    path + ".unit", "an acceleration", "a velocity or a sound pressure; motion stands under motion");
        }
        if (spectrum.signal() == Signal.PRESSURE) {
            for (String key : List.of("mean-speed", "fetch")) {
                if (form.has(path + "." + key)) {
                    return refuse(path + "." + key, "given for a sound pressure", "only for a velocity");
                }
            }
            return wave(path).map(wave -> Measured.sound(name, kind, direction, spectrum, wave, outside));
        }
        if (form.has(path + ".distance")) {
            return refuse(path + ".distance", "given for a velocity", "only for a sound pressure");
        }
        Optional<Double> mean = meanSpeed(path, spectrum);
        if (mean.isEmpty() && form.has(path + ".fetch")) {
            return refuse(path + ".fetch", "given for an oscillation", "only beside mean-speed");
        }
        if (mean.isEmpty()) {
            return Optional.of(Measured.oscillation(name, kind, direction, spectrum, outside));
        }
        if (spectrum.density().isEmpty()) {
            return refuse(path + ".mean-speed", "given for rms lines", "a stream carries a density, or band levels");
        }
        Stated fetch = fetch(path);
        return SurroundingsBuilder.reaches(problems, form, path, mean.get(), fetch, outside)
                ? Optional.of(Measured.stream(name, kind, direction, mean.get(), spectrum, fetch, outside))
                : Optional.empty();
    }

    private Optional<Double> meanSpeed(String path, MeasuredSpectrum spectrum) {
        if (form.has(path + ".mean-speed")) {
            return Optional.of(form.si(path + ".mean-speed"));
        }
        Optional<Double> mean = Measured.meanSpeed(spectrum);
        mean.ifPresent(speed -> note(
                path,
                "mean-speed",
                new flowshy.study.units.Quantity(speed, Dimension.SPEED, "", Swing.NONE).si(),
                "mean of " + form.word(path + ".file").orElseThrow()));
        return mean;
    }

    private Stated fetch(String path) {
        if (form.has(path + ".fetch")) {
            return Stated.given("fetch", form.si(path + ".fetch"));
        }
        Presence usual = Keys.presence(path + ".fetch").orElseThrow();
        note(path, "fetch", usual.value(), usual.why());
        return NamedSurroundings.ofBareStream("fetch");
    }

    /** Velocity that goes with a sound pressure; empty, and told, where the medium's sound speed is not known. */
    Optional<SoundWave> wave(String path) {
        if (outside.soundSpeed().isEmpty()) {
            problems.add(
                    form.position(path),
                    path,
                    "the sound speed of " + outside.name() + " is not known",
                    "state medium.sound-speed");
            return Optional.empty();
        }
        double speed = outside.soundSpeed().getAsDouble();
        return Optional.of(
                form.has(path + ".distance")
                        ? new SoundWave(outside.density(), speed, form.si(path + ".distance"))
                        : SoundWave.plane(outside.density(), speed));
    }

    private void note(String path, String key, String value, String why) {
        taken.add(new Form.Taken(path + "." + key, value, why));
    }

    private Optional<Source> refuse(String key, String found, String accepted) {
        problems.add(form.position(key), key, found, accepted);
        return Optional.empty();
    }
}
