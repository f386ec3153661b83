package flowshy.study;

import static flowshy.math.Figures.say;

import flowshy.hair.Hair;
import flowshy.math.Figures;
import flowshy.math.StepDensity;
import flowshy.math.ThirdOctave;
import flowshy.medium.Medium;
import flowshy.stream.Source;
import flowshy.stream.Stated;
import flowshy.stream.sound.SoundLevel;
import flowshy.stream.sound.SoundWave;
import flowshy.stream.surroundings.Duct;
import flowshy.stream.surroundings.Sound;
import flowshy.stream.surroundings.Stream;
import flowshy.stream.surroundings.Tone;
import flowshy.stream.wall.DuctFlow;
import flowshy.stream.wall.DuctSection;
import flowshy.stream.wall.PipeFriction;
import flowshy.stream.wall.PlateFriction;
import flowshy.study.keys.Form;
import flowshy.study.text.Problems;
import flowshy.study.units.Dimension;
import flowshy.study.units.Quantity;
import flowshy.study.units.Swing;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/** From the keys of the surroundings to sources of flow, one a name; refuses what no law covers. */
final class SurroundingsBuilder {
    private static final String GROUP = "surroundings";

    /** A frequency within this share of a third-octave's exact middle names it. */
    private static final double NEAR = 0.03;

    private final Form form;
    private final Problems problems;
    private final Medium outside;
    private final Hair hair;
    private final MeasuredSources measured;
    private final List<Form.Taken> taken = new ArrayList<>();

    SurroundingsBuilder(Form form, Problems problems, FilesRead files, Medium outside, Hair hair) {
        this.form = form;
        this.problems = problems;
        this.outside = outside;
        this.hair = hair;
        this.measured = new MeasuredSources(form, problems, files, outside);
    }

    /** What was computed or read off a file in place of written keys. */
    List<Form.Taken> taken() {
        List<Form.Taken> all = new ArrayList<>(taken);
        all.addAll(measured.taken());
        return all;
    }

    /** Every source, in the order of the text; those with a problem are left out. */
    List<Source> build() {
        List<Source> sources = new ArrayList<>();
        for (String name : form.names(GROUP)) {
            String path = GROUP + "." + name;
            if (!problems.touches(path)) {
                source(name, path).ifPresent(sources::add);
            }
        }
        return sources;
    }

    private Optional<Source> source(String name, String path) {
        return switch (form.word(path + ".kind").orElseThrow()) {
            case "stream" -> stream(name, path);
            case "duct" -> duct(name, path);
            case "tone" ->
                Optional.of(new Tone(
                        name,
                        form.si(path + ".direction"),
                        form.si(path + ".frequency"),
                        form.si(path + ".speed"),
                        outside));
            case "sound" -> sound(name, path);
            default -> measured.build(name, path);
        };
    }

    private Optional<Source> stream(String name, String path) {
        double speed = form.si(path + ".mean-speed");
        Stated fetch = stated(path, "fetch");
        if (!reaches(problems, form, path, speed, fetch, outside)) {
            return Optional.empty();
        }
        return Optional.of(new Stream(
                name,
                form.si(path + ".direction"),
                speed,
                stated(path, "turbulence"),
                stated(path, "length-scale"),
                fetch,
                outside));
    }

    /** Whether the wall law reaches as far as a stream needs it, also with twice an assumed fetch. */
    static boolean reaches(Problems problems, Form form, String path, double speed, Stated fetch, Medium outside) {
        double longest = (fetch.assumed() ? 2.0 : 1.0) * fetch.value();
        double reynolds = speed * longest / outside.kinematicViscosity();
        double most = PlateFriction.LOGARITHMIC.range().high();
        if (reynolds < most) {
            return true;
        }
        problems.add(
                form.position(path + ".fetch"),
                path + ".fetch",
                say("a Reynolds number of %.3g on the fetch", reynolds),
                say("less than %.3g, where the wall law ends", most));
        return false;
    }

    /** A number as given, or as taken with its source. */
    private Stated stated(String path, String key) {
        double value = form.si(path + "." + key);
        Optional<String> why = form.why(path + "." + key);
        return why.isPresent() ? Stated.assumed(key, value, why.get()) : Stated.given(key, value);
    }

    private Optional<Source> duct(String name, String path) {
        DuctSection section = form.has(path + ".diameter")
                ? new DuctSection.Round(form.si(path + ".diameter"))
                : new DuctSection.Rectangular(form.si(path + ".width"), form.si(path + ".height"));
        double length = hair.profile().length();
        if (!(section.depth() > length)) {
            String key = form.has(path + ".diameter") ? ".diameter" : ".height";
            return refuse(
                    path + key,
                    "a duct that the hair does not fit in",
                    say("more than the hair's %.4g mm", 1e3 * length));
        }
        double speed =
                form.siIfAny(path + ".mean-speed").orElseGet(() -> form.si(path + ".volume-flow") / section.area());
        DuctFlow flow = new DuctFlow(section, speed, outside.kinematicViscosity());
        String rate = form.has(path + ".mean-speed") ? ".mean-speed" : ".volume-flow";
        double most = PipeFriction.PRANDTL.range().high();
        if (!(flow.reynolds() < most)) {
            return refuse(
                    path + rate,
                    say("a Reynolds number of %.3g in the duct", flow.reynolds()),
                    say("less than %.3g, where the law of its friction ends", most));
        }
        if (flow.intermittency() == 0.0 && form.has(path + ".length-scale") && !form.has(path + ".turbulence")) {
            return refuse(
                    path + ".length-scale",
                    say("a length scale of a laminar flow (Re = %.3g)", flow.reynolds()),
                    "turbulence beside it, if what the duct carries comes from upstream; else neither");
        }
        Source duct = Duct.of(
                name,
                form.si(path + ".direction"),
                flow,
                statedIfAny(path, "turbulence"),
                statedIfAny(path, "length-scale"));
        if (!form.has(path + ".mean-speed")) {
            note(path, "mean-speed", new Quantity(speed, Dimension.SPEED, "", Swing.NONE).si(), "from the volume flow");
        }
        for (Stated number : duct.assumed()) {
            if (!form.has(path + "." + number.key())) {
                boolean share = number.key().equals("turbulence");
                String value = share
                        ? say("%.3g %%", 100.0 * number.value())
                        : new Quantity(number.value(), Dimension.LENGTH, "", Swing.NONE).si();
                note(path, number.key(), value, number.source());
            }
        }
        return Optional.of(duct);
    }

    private Optional<Stated> statedIfAny(String path, String key) {
        return form.has(path + "." + key) ? Optional.of(stated(path, key)) : Optional.empty();
    }

    private Optional<Source> sound(String name, String path) {
        Optional<SoundWave> wave = measured.wave(path);
        Optional<StepDensity> pressure = form.has(path + ".levels") ? thirdOctaves(path) : oneLevel(path);
        if (wave.isEmpty() || pressure.isEmpty()) {
            return Optional.empty();
        }
        return Optional.of(new Sound(name, form.si(path + ".direction"), pressure.get(), wave.get(), outside));
    }

    private SoundLevel reference(String key) {
        SoundLevel reference = SoundLevel.usualIn(outside.phase(), outside.density());
        String phase = reference == SoundLevel.IN_GAS ? "a gas" : "a liquid";
        taken.add(new Form.Taken(key, reference.toString(), "usual for sound in " + phase));
        return reference;
    }

    private Optional<StepDensity> oneLevel(String path) {
        double from = form.si(path + ".from");
        double to = form.si(path + ".to");
        if (!(from < to)) {
            problems.add(
                    form.position(path + ".from"),
                    path + ".from",
                    "a band from " + form.word(path + ".from").orElseThrow() + " to "
                            + form.word(path + ".to").orElseThrow() + " is upside down",
                    "from lies below to");
            return Optional.empty();
        }
        return Optional.of(Sound.over(reference(path + ".level"), form.si(path + ".level"), from, to));
    }

    private Optional<StepDensity> thirdOctaves(String path) {
        List<StepDensity.Band> bands = new ArrayList<>();
        SoundLevel reference = reference(path + ".levels");
        int last = Integer.MIN_VALUE;
        for (int i = 0; form.has(path + ".levels[" + i + "].frequency"); i++) {
            String key = path + ".levels[" + i + "]";
            double frequency = form.si(key + ".frequency");
            ThirdOctave band = ThirdOctave.holding(frequency);
            if (!(FastMath.abs(frequency / band.middle() - 1.0) < NEAR)) {
                refuse(
                        key + ".frequency",
                        form.word(key + ".frequency").orElseThrow() + " is no mid-band frequency of a third-octave",
                        "the nearest is " + Figures.full(band.nominal()) + " Hz");
            } else if (band.index() <= last) {
                refuse(key + ".frequency", "a third-octave that does not rise", "each above the one before");
            } else {
                last = band.index();
                bands.add(Sound.band(reference, form.si(key + ".level"), band.low(), band.high()));
            }
        }
        return problems.touches(path) ? Optional.empty() : Optional.of(new StepDensity(bands, StepDensity.Inside.PINK));
    }

    private void note(String path, String key, String value, String why) {
        taken.add(new Form.Taken(path + "." + key, value, why));
    }

    private Optional<Source> refuse(String key, String found, String accepted) {
        problems.add(form.position(key), key, found, accepted);
        return Optional.empty();
    }
}
