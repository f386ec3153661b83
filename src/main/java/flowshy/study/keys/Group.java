package flowshy.study.keys;

import flowshy.study.text.Node;
import flowshy.study.text.Position;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Keys that belong together.
 *
 * @param name what it is, for lists and references: {@code medium}
 * @param keys in the order in which they are read and listed
 * @param shorthand the key that a single word stands for, if that is allowed
 * @param listing the key that a list stands for, if that is allowed
 * @param rules which keys shut each other out
 * @param selector the word that decides on further keys, if there is one
 * @param starts sets of starting values, if it has any
 * @param ofTheWord keys that belong to what the shorthand's word names, and go with it when it changes
 */
record Group(
        String name,
        List<Key> keys,
        Optional<String> shorthand,
        Optional<String> listing,
        List<Rule> rules,
        Optional<Selector> selector,
        Optional<Starts> starts,
        List<String> ofTheWord)
        implements Value {
    Group {
        keys = List.copyOf(keys);
        rules = List.copyOf(rules);
        ofTheWord = List.copyOf(ofTheWord);
    }

    static Group of(String name, List<Key> keys, Rule... rules) {
        return new Group(
                name,
                keys,
                Optional.empty(),
                Optional.empty(),
                List.of(rules),
                Optional.empty(),
                Optional.empty(),
                List.of());
    }

    Group shortFor(String key) {
        return new Group(name, keys, Optional.of(key), listing, rules, selector, starts, ofTheWord);
    }

    Group listFor(String key) {
        return new Group(name, keys, shorthand, Optional.of(key), rules, selector, starts, ofTheWord);
    }

    Group selectedBy(Key key, Map<String, List<Key>> further) {
        return new Group(
                name, keys, shorthand, listing, rules, Optional.of(new Selector(key, further)), starts, ofTheWord);
    }

    Group startingFrom(Starts sets) {
        return new Group(name, keys, shorthand, listing, rules, selector, Optional.of(sets), ofTheWord);
    }

    Group withKeysOfTheWord(String... names) {
        return new Group(name, keys, shorthand, listing, rules, selector, starts, List.of(names));
    }

    /** Every key of the group where the deciding word is known: deciding key, its own keys, common keys. */
    List<Key> keys(String word) {
        List<Key> all = new ArrayList<>();
        selector.ifPresent(s -> {
            all.add(s.key());
            all.addAll(s.of(word));
        });
        all.addAll(keys);
        return all;
    }

    /** The key of that name, wherever in the group. */
    Optional<Key> key(String wanted) {
        List<Key> all = new ArrayList<>(keys(""));
        selector.ifPresent(s -> s.keys().values().forEach(all::addAll));
        return all.stream().filter(k -> k.name().equals(wanted)).findFirst();
    }

    @Override
    public String kind() {
        String list = listing.map(k -> "list of " + k + ", or a group of keys").orElse("group of keys");
        return shorthand
                .map(k -> listing.isPresent() ? k + ", " + list : k + ", or a group of keys")
                .orElse(list);
    }

    @Override
    public Optional<Value> below(String wanted) {
        return key(wanted).map(Key::value);
    }

    @Override
    public Map<String, Object> schema() {
        return GroupSchema.of(this);
    }

    @Override
    public void read(Reading reading, Node node, String path) {
        if (node instanceof Node.Refused) {
            return;
        }
        Optional<Node.Mapping> mapping = mapping(node);
        if (mapping.isPresent()) {
            new GroupReading(this, reading, mapping.get(), path).read();
        } else {
            String usual = selector.flatMap(Selector::usual).orElse("");
            String names = String.join(", ", built(keys(usual)));
            String one = shorthand.map(k -> "a single " + k + " or ").orElse("");
            String list = listing.map(k -> "a list of " + k + " or ").orElse("");
            reading.unfit(node, path, one + list + "a group of keys is wanted here: " + names);
        }
    }

    /** The node as a group; a single word or a list stands for one key where that is allowed. */
    Optional<Node.Mapping> mapping(Node node) {
        if (node instanceof Node.Mapping mapping) {
            return Optional.of(mapping);
        }
        if (node instanceof Node.Scalar scalar && !scalar.text().isBlank() && shorthand.isPresent()) {
            Position at = scalar.position();
            return Optional.of(new Node.Mapping(List.of(new Node.Entry(shorthand.get(), at, scalar)), at));
        }
        if (node instanceof Node.Sequence list && listing.isPresent()) {
            Position at = list.position();
            return Optional.of(new Node.Mapping(List.of(new Node.Entry(listing.get(), at, list)), at));
        }
        return Optional.empty();
    }

    static List<String> built(List<Key> keys) {
        return keys.stream().filter(Key::built).map(Key::name).toList();
    }
}
