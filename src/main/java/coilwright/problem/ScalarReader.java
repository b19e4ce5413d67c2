package coilwright.problem;

import java.util.Optional;

/**
 * Reads single values from their text.
 *
 * @param <T> the kind of value
 */
abstract class ScalarReader<T> implements ValueReader<T> {

  @Override
  public final Optional<T> read(Node node, Spot spot) {
    if (node instanceof Node.Scalar scalar && !scalar.isEmpty() && !scalar.isNull()) {
      return parse(scalar.text(), spot);
    }
    spot.refuse(node, accepted());
    return Optional.empty();
  }

  /**
   * Reads a text that is not empty.
   *
   * @param text without blanks around it
   * @param spot its place, which takes faults
   * @return the value, or empty where it is faulty
   */
  abstract Optional<T> parse(String text, Spot spot);

  /**
   * Reports a text that is not accepted.
   *
   * @param text as typed
   * @param why what is wrong with it; may be empty
   * @param nearest the nearest known word
   * @param spot its place
   * @return empty
   */
  final Optional<T> refuse(String text, String why, Optional<String> nearest, Spot spot) {
    String found = ShownText.of(text) + (why.isEmpty() ? "" : ", " + why);
    spot.fault(found, "must be " + accepted(), nearest);
    return Optional.empty();
  }
}
