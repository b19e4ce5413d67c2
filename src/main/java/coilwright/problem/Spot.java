package coilwright.problem;

import coilwright.spring.Kind;
import coilwright.unit.Spelling;
import java.util.Collection;
import java.util.Optional;
import java.util.regex.Pattern;

/**
 * The place of a value: its path, where it stands in the file, and where faults about it go.
 *
 * @param mark where its key stands, or the value itself in a list
 * @param path such as "loads[1].length"; empty for the file as a whole
 * @param faults the collector
 * @param kind the kind of spring that the file is read as
 * @param alternative what every "must be" about this value ends with; may be empty
 */
record Spot(Mark mark, String path, Faults faults, Kind kind, String alternative) {

  private static final Pattern INDEX = Pattern.compile("\\[[0-9]+\\]");

  /**
   * A place without an alternative, where the kind of spring does not matter or is not known yet.
   *
   * @param mark where its key stands, or the value itself in a list
   * @param path its path
   * @param faults the collector
   */
  Spot(Mark mark, String path, Faults faults) {
    this(mark, path, faults, Kind.COMPRESSION, "");
  }

  /**
   * The same place in a file for a kind of spring.
   *
   * @param read the kind that the file is read as
   * @return the place
   */
  Spot of(Kind read) {
    return new Spot(mark, path, faults, read, alternative);
  }

  /**
   * The same place, where a word may stand instead of the value.
   *
   * @param word the word
   * @return the place, whose messages name the word too
   */
  Spot or(String word) {
    return new Spot(mark, path, faults, kind, ", or " + word);
  }

  /**
   * The place of one of its keys.
   *
   * @param at where the key stands
   * @param key the key
   * @return the place
   */
  Spot key(Mark at, String key) {
    String name = ShownText.of(key);
    return new Spot(at, path.isEmpty() ? name : path + "." + name, faults, kind, "");
  }

  /**
   * The place of one of its list items.
   *
   * @param at where the item stands
   * @param index from 0
   * @return the place
   */
  Spot item(Mark at, int index) {
    return new Spot(at, path + "[" + index + "]", faults, kind, "");
  }

  /** The path with its indices left out, as the table of keys has it: "loads[].length". */
  String pattern() {
    return INDEX.matcher(path).replaceAll("[]");
  }

  /**
   * Reports a fault here.
   *
   * @param found what was found
   * @param remedy what is accepted
   */
  void fault(String found, String remedy) {
    fault(found, remedy, Optional.empty());
  }

  /**
   * Reports a fault here that may be a misspelling.
   *
   * @param found what was found
   * @param remedy what is accepted
   * @param nearest the nearest known word
   */
  void fault(String found, String remedy, Optional<String> nearest) {
    String accepted = remedy.startsWith("must be ") ? remedy + alternative : remedy;
    faults.add(mark, new Fault(mark.line(), path, found, accepted, nearest));
  }

  /**
   * Reports a node of the wrong kind, unless it has been reported already.
   *
   * @param node what stands here
   * @param accepted what is accepted
   */
  void refuse(Node node, String accepted) {
    if (node instanceof Node.Refused) {
      faults.again();
    } else {
      fault(node.shown(), "must be " + accepted);
    }
  }

  /**
   * The nearest known word, unless there are too many faults to look for it.
   *
   * @param word as found
   * @param known the words accepted
   * @return the nearest, or empty
   */
  Optional<String> nearest(String word, Collection<String> known) {
    return faults.beyondHints() ? Optional.empty() : Spelling.nearest(word, known);
  }
}
