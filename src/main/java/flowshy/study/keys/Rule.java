package flowshy.study.keys;

import flowshy.study.text.Node;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Ways of stating one thing: only one of them may be taken.
 *
 * @param need whether one must be: always, never, or beside a certain key
 * @param beside that key; empty for always and never
 * @param ways each a list of keys that go together; the first must be there if any other is
 */
public record Rule(Need need, String beside, List<List<String>> ways) {
    /** When one of the ways must be taken. */
    public enum Need {
        /** in every study that has the group */
        ALWAYS,
        /** in no study */
        NEVER,
        /** if a certain key is there */
        BESIDE
    }

    /** Copies the lists. */
    public Rule {
        ways = ways.stream().map(List::copyOf).toList();
    }

    /** Ways written as keys with blanks between. */
    static Rule exactlyOne(String... ways) {
        return new Rule(Need.ALWAYS, "", split(ways));
    }

    static Rule atMostOne(String... ways) {
        return new Rule(Need.NEVER, "", split(ways));
    }

    static Rule oneBeside(String key, String... ways) {
        return new Rule(Need.BESIDE, key, split(ways));
    }

    private static List<List<String>> split(String... ways) {
        return Arrays.stream(ways).map(way -> List.of(way.split(" "))).toList();
    }

    private boolean needed(Node.Mapping mapping) {
        return need == Need.ALWAYS
                || (need == Need.BESIDE && mapping.entry(beside).isPresent());
    }

    /** Keys that a new entry pushes out: those of the ways that it does not belong to. */
    List<String> rivals(String key) {
        boolean mine = ways.stream().anyMatch(way -> way.contains(key));
        return mine
                ? ways.stream()
                        .filter(way -> !way.contains(key))
                        .flatMap(List::stream)
                        .toList()
                : List.of();
    }

    /** The rule where all its ways are known; without ways where a deciding word leaves out some of them. */
    Rule within(List<String> known) {
        boolean whole = known.containsAll(leads()) && (need != Need.BESIDE || known.contains(beside));
        return new Rule(need, beside, whole ? ways : List.of());
    }

    /** The ways of which something is written. */
    private List<List<String>> taken(Node.Mapping mapping) {
        return ways.stream()
                .filter(way -> way.stream().anyMatch(k -> mapping.entry(k).isPresent()))
                .toList();
    }

    /** Whether a key belongs to a way that was not taken, so that it has no default. */
    boolean excludes(String key, Node.Mapping mapping) {
        List<List<String>> taken = taken(mapping);
        return ways.stream().anyMatch(way -> way.contains(key))
                && taken.stream().noneMatch(way -> way.contains(key))
                && !taken.isEmpty();
    }

    void check(Reading reading, Node.Mapping mapping, String path) {
        List<List<String>> taken = taken(mapping);
        if (taken.isEmpty() && needed(mapping) && ways.size() == 1) {
            String lead = ways.get(0).get(0);
            String below = path.isEmpty() ? lead : path + "." + lead;
            reading.problem(mapping.position(), below, "missing", beside + " goes with it");
        } else if (taken.isEmpty() && needed(mapping)) {
            reading.problem(
                    mapping.position(),
                    path,
                    "one of " + String.join(", ", leads()) + " is missing",
                    "state one of them");
        } else if (taken.size() > 1) {
            String first = written(taken.get(0), mapping).key();
            Node.Entry second = written(taken.get(1), mapping);
            String below = path.isEmpty() ? second.key() : path + "." + second.key();
            reading.problem(second.position(), below, "stands beside " + first, "keep one of the two");
        } else if (taken.size() == 1 && mapping.entry(taken.get(0).get(0)).isEmpty()) {
            String lead = taken.get(0).get(0);
            Node.Entry other = written(taken.get(0), mapping);
            String below = path.isEmpty() ? lead : path + "." + lead;
            reading.problem(mapping.position(), below, "missing", other.key() + " goes with it");
        }
    }

    private static Node.Entry written(List<String> way, Node.Mapping mapping) {
        return way.stream().flatMap(k -> mapping.entry(k).stream()).findFirst().orElseThrow();
    }

    /** The first key of each way. */
    List<String> leads() {
        return ways.stream().map(way -> way.get(0)).toList();
    }

    /**
     * The rule as JSON Schema keywords, one map each.
     *
     * @param complete false where a missing key may come from a set of starting values
     */
    List<Object> schema(boolean complete) {
        if (ways.isEmpty()) {
            return List.of();
        }
        List<Object> all = new ArrayList<>();
        Map<String, Object> together = new LinkedHashMap<>();
        for (List<String> way : ways) {
            way.stream().skip(1).forEach(k -> together.put(k, List.of(way.get(0))));
        }
        if (!together.isEmpty()) {
            all.add(Map.of("dependentRequired", together));
        }
        for (int i = 0; i < ways.size(); i++) {
            for (int j = i + 1; j < ways.size(); j++) {
                for (String a : ways.get(i)) {
                    ways.get(j).forEach(b -> all.add(Map.of("not", Map.of("required", List.of(a, b)))));
                }
            }
        }
        List<Object> leads = List.copyOf(
                ways.stream().map(w -> Map.of("required", List.of(w.get(0)))).toList());
        if (!complete) {
            return all;
        }
        if (need == Need.ALWAYS) {
            all.add(Map.of("anyOf", leads));
        } else if (need == Need.BESIDE) {
            all.add(Map.of("dependentSchemas", Map.of(beside, Map.of("anyOf", leads))));
        }
        return all;
    }
}
