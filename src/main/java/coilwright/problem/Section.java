package coilwright.problem;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;

/** A block of keys whose names have been checked; its values are read key by key. */
final class Section {

  private final Spot spot;
  private final Map<String, Node.Entry> entries = new HashMap<>();

  private final Set<String> meant;

  private Section(Spot spot, Node.Mapping mapping) {
    this.spot = spot;
    this.meant = UnknownKeys.report(mapping, spot);
    List<String> known = KeyTable.names(spot.kind(), spot.pattern());
    for (Node.Entry entry : mapping.entries()) {
      if (known.contains(entry.key())) {
        entries.put(entry.key(), entry);
      }
    }
  }

  /**
   * Opens a block of keys and reports every key that is not known there.
   *
   * @param node what stands in the file
   * @param spot its place
   * @return the section, or empty where the node is none
   */
  static Optional<Section> open(Node node, Spot spot) {
    if (node instanceof Node.Mapping mapping) {
      return Optional.of(new Section(spot, mapping));
    }
    spot.refuse(node, SectionReader.accepted(spot.kind(), spot.pattern()));
    return Optional.empty();
  }

  /** Where it stands. */
  Spot spot() {
    return spot;
  }

  /**
   * Whether a key is given.
   *
   * @param key the key
   * @return true if it is there and not an empty section
   */
  boolean has(ProblemKey<?> key) {
    Node.Entry entry = entries.get(key.name());
    return entry != null && !key.reader().omits(entry.value());
  }

  /**
   * Whether a key is missing: neither given nor, as far as can be told, given misspelt, which has
   * been reported then.
   *
   * @param key the key
   * @return true if it is
   */
  boolean lacks(ProblemKey<?> key) {
    return !has(key) && !meant.contains(key.name());
  }

  /**
   * Whether a key is, as far as can be told, given misspelt, which has been reported.
   *
   * @param key the key
   * @return true if it is
   */
  boolean misspells(ProblemKey<?> key) {
    return !has(key) && meant.contains(key.name());
  }

  /**
   * Reads a key that may be left out.
   *
   * @param <T> the kind of its value
   * @param key the key
   * @return the value; empty where it is left out or faulty
   */
  <T> Optional<T> read(ProblemKey<T> key) {
    return has(key)
        ? key.reader().read(entries.get(key.name()).value(), spot(key))
        : Optional.empty();
  }

  /**
   * Reads a key that must be given.
   *
   * @param <T> the kind of its value
   * @param key the key
   * @return the value; empty where it is missing or faulty, which is then reported
   */
  <T> Optional<T> require(ProblemKey<T> key) {
    if (lacks(key)) {
      spot(key).fault("missing", "must be " + key.reader().accepted(spot.kind()));
    } else if (!has(key)) {
      spot.faults().again();
    }
    return read(key);
  }

  /**
   * Reads a number that may be left out.
   *
   * @param key the key
   * @return the number; empty where it is left out or faulty
   */
  OptionalDouble number(ProblemKey<Double> key) {
    return read(key).map(OptionalDouble::of).orElse(OptionalDouble.empty());
  }

  /**
   * The place of a key: its own where it is given, else the section's.
   *
   * @param key the key
   * @return the place
   */
  Spot spot(ProblemKey<?> key) {
    Node.Entry entry = entries.get(key.name());
    return spot.key(entry == null ? spot.mark() : entry.mark(), key.name());
  }

  /**
   * The places of a list's items; the key's own place where one value stands alone.
   *
   * @param key the key of the list
   * @return one place an item; none where the key is left out
   */
  List<Spot> itemSpots(ProblemKey<?> key) {
    if (!has(key)) {
      return List.of();
    }
    List<Spot> spots = new ArrayList<>();
    if (entries.get(key.name()).value() instanceof Node.Sequence list) {
      list.items().forEach(item -> spots.add(spot(key).item(item.mark(), spots.size())));
    } else {
      spots.add(spot(key));
    }
    return spots;
  }

  /**
   * What stands at a key, for a message.
   *
   * @param key a key that is given
   * @return its text
   */
  String shown(ProblemKey<?> key) {
    return entries.get(key.name()).value().shown();
  }
}
