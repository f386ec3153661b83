package flowshy.study.keys;

import flowshy.study.text.Position;
import flowshy.study.units.Quantity;
import java.util.Optional;

/**
 * One value of a study, checked.
 *
 * @param path of its key, groups written out: {@code medium.name}
 * @param written as written, or the default as a study would write it
 * @param quantity the number in SI, empty for words
 * @param position where it stands; for a default, its group
 * @param given false for a default
 */
public record Field(String path, String written, Optional<Quantity> quantity, Position position, boolean given) {}
