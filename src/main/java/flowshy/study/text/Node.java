package flowshy.study.text;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** A piece of a study as written: words, nothing converted, with its place. */
public sealed interface Node {
    /**
     * Where it starts.
     *
     * @return the place
     */
    Position position();

    /**
     * A single value.
     *
     * @param text its words, quotes and escapes removed; empty where nothing was written
     * @param position where it starts
     */
    record Scalar(String text, Position position) implements Node {}

    /**
     * A key with its value.
     *
     * @param key the key
     * @param position where the key starts
     * @param value what stands behind it
     */
    record Entry(String key, Position position, Node value) {}

    /**
     * Keys with values, each key once.
     *
     * @param entries in the order of the text
     * @param position where the first key or the brace starts
     */
    record Mapping(List<Entry> entries, Position position) implements Node {
        /** Copies the entries. */
        public Mapping {
            entries = List.copyOf(entries);
        }

        /**
         * The entry of a key.
         *
         * @param key the key
         * @return the entry, empty if the key is not there
         */
        public Optional<Entry> entry(String key) {
            return entries.stream().filter(e -> e.key().equals(key)).findFirst();
        }

        /**
         * The same with one entry added, or replaced where it stood.
         *
         * @param entry the new entry
         * @return another mapping
         */
        public Mapping with(Entry entry) {
            List<Entry> changed = new ArrayList<>(entries);
            Optional<Entry> old = entry(entry.key());
            if (old.isPresent()) {
                changed.set(entries.indexOf(old.get()), entry);
            } else {
                changed.add(entry);
            }
            return new Mapping(changed, position);
        }

        /**
         * The same without some keys.
         *
         * @param keys those to leave out
         * @return another mapping
         */
        public Mapping without(List<String> keys) {
            return new Mapping(
                    entries.stream().filter(e -> !keys.contains(e.key())).toList(), position);
        }
    }

    /**
     * A list.
     *
     * @param items in the order of the text
     * @param position where it starts
     */
    record Sequence(List<Node> items, Position position) implements Node {
        /** Copies the items. */
        public Sequence {
            items = List.copyOf(items);
        }
    }

    /**
     * Something whose fault has been told already; it only keeps its place so that nothing else is said about it.
     *
     * @param position where it starts
     */
    record Refused(Position position) implements Node {}
}
