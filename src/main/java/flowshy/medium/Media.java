package flowshy.medium;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.ConcurrentHashMap;

/** Every known gas and liquid, and the media that users describe themselves. */
public final class Media {
    private static final int NEAREST = 3;

    /** Laws already built; a sweep asks one medium many times. */
    private static final Map<String, MediumLaw> BUILT = new ConcurrentHashMap<>();

    private Media() {}

    /**
     * The known media; reads the header of every table.
     *
     * @return by name
     */
    public static List<MediumEntry> entries() {
        return MediumShelf.headers().stream()
                .map(MediumEntry::of)
                .sorted(Comparator.comparing(MediumEntry::name))
                .toList();
    }

    /**
     * A medium at a state.
     *
     * @param query which medium, at which state
     * @return its properties with their sources and caveats
     * @throws UnknownMediumException if no medium has that name
     * @throws UnfitParameterException if a parameter is missing or too much
     * @throws MediumTableException if a table of the user names a formula in place of rows
     * @throws OutOfTableException if the state is not covered, or the medium boils, freezes or condenses there
     */
    public static Medium at(MediumQuery query) {
        if (query.given().isPresent()) {
            return given(query, query.given().get());
        }
        MediumLaw law = query.table().isPresent() ? own(query.table().get()) : find(query.name());
        Admission.parameters(law.header(), query);
        if (query.second().isEmpty()) {
            return law.at(query);
        }
        MediumQuery.SecondGas second = query.second().get();
        if (!(second.share() >= 0.0 && second.share() <= 1.0)) {
            throw new OutOfTableException(
                    MediumParameter.SHARE,
                    OutOfTableException.Why.OUTSIDE,
                    "a share of " + second.name() + " lies between 0 % and 100 %; " + Phrases.percent(second.share())
                            + " was asked for.");
        }
        return new GasMixture(pure(law, query.name()), pure(find(second.name()), second.name()))
                .at(query, second.share());
    }

    private static PureGas pure(MediumLaw law, String name) {
        if (law instanceof PureGas gas) {
            return gas;
        }
        throw new UnfitParameterException(
                MediumParameter.SHARE, false, name + " cannot be one of two mixed gases; pure gases and dry air can.");
    }

    private static Medium given(MediumQuery query, MediumQuery.GivenProperties given) {
        List<PropertySource> sources = new ArrayList<>(List.of(stated("density"), stated("viscosity")));
        if (given.soundSpeed().isPresent()) {
            sources.add(stated("sound speed"));
        }
        return new Medium(
                query.name(),
                Phase.UNSTATED,
                query.temperature(),
                query.pressure(),
                given.density(),
                given.viscosity(),
                given.soundSpeed(),
                OptionalDouble.empty(),
                sources,
                List.of());
    }

    private static PropertySource stated(String property) {
        return new PropertySource(property, "the study", PropertySource.Reading.GIVEN, OptionalDouble.empty());
    }

    private static MediumLaw find(String name) {
        String stem = MediumShelf.stem(name);
        MediumLaw built = BUILT.get(stem);
        if (built != null) {
            return built;
        }
        MediumLaw law = law(MediumShelf.find(stem).or(() -> byAlias(stem)).orElseThrow(() -> unknown(name)));
        BUILT.put(stem, law);
        return law;
    }

    private static MediumLaw own(MediumTable table) {
        if (table.header().law().isPresent()) {
            throw new MediumTableException(List.of(new TableProblem(
                    table.file(),
                    1,
                    1,
                    "the law '" + table.header().law().get() + "'",
                    "rows, in a table of your own")));
        }
        return law(table);
    }

    private static MediumLaw law(MediumTable table) {
        Optional<String> formula = table.header().law();
        if (formula.isPresent()) {
            return FormulaLaw.named(formula.get(), table.file()).build(table.header());
        }
        if (table.header().phase() == Phase.GAS) {
            return new PureGas(table);
        }
        return table.rows().get(0).grade().isPresent() ? new GradedLiquid(table) : new PlainLiquid(table);
    }

    private static Optional<MediumTable> byAlias(String stem) {
        return MediumShelf.headers().stream()
                .filter(header -> header.aliases().stream()
                        .anyMatch(alias -> MediumShelf.stem(alias).equals(stem)))
                .findFirst()
                .flatMap(header -> MediumShelf.find(MediumShelf.stem(header.medium())));
    }

    /** Slips over the longer length: of two names as many slips away the longer is nearer, or every short word would be near. */
    private static double remoteness(String typed, String known) {
        return (double) Spelling.distance(typed, known) / Math.max(typed.length(), known.length());
    }

    private static UnknownMediumException unknown(String name) {
        List<String> names = new ArrayList<>();
        for (MediumEntry entry : entries()) {
            names.add(entry.name());
            names.addAll(entry.aliases());
        }
        String stem = MediumShelf.stem(name);
        names.sort(Comparator.comparingDouble((String known) -> remoteness(stem, MediumShelf.stem(known)))
                .thenComparing(Comparator.naturalOrder()));
        return new UnknownMediumException(name, names.subList(0, NEAREST));
    }
}
