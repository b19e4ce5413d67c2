package coilwright.problem;

import coilwright.unit.Dimension;
import coilwright.unit.Quantity;
import java.util.List;

/** The readers that several keys share. */
final class Values {

  /** What is said of a property that no wire has. */
  static final String NOT_WIRE = "outside what a spring wire can have";

  /**
   * Tensile strengths [MPa]. This range and those of the moduli and the density leave room around
   * every metal that springs are wound of, from memory: they only catch a slip of the pen.
   */
  static final Range STRENGTH = Range.within(50, 6000);

  private Values() {}

  /**
   * A quantity.
   *
   * @param dimension its kind
   * @param range what makes sense, in the inner unit
   * @return reads the value in the inner unit
   */
  static ValueReader<Double> quantity(Dimension dimension, Range range) {
    return new QuantityReader(range, dimension).map(Quantity::inner);
  }

  /** A length above zero, in mm. */
  static ValueReader<Double> length() {
    return quantity(Dimension.LENGTH, Range.ABOVE_ZERO);
  }

  /** A tensile strength, in MPa. */
  static ValueReader<Double> strength() {
    return ofWire(Dimension.STRESS, STRENGTH);
  }

  /**
   * A property of the wire of an own grade, within what any spring wire has.
   *
   * @param dimension its kind
   * @param range what any spring wire has, in the inner unit
   * @return reads the value in the inner unit
   */
  static ValueReader<Double> ofWire(Dimension dimension, Range range) {
    return new QuantityReader(range, NOT_WIRE, dimension).map(Quantity::inner);
  }

  /** A share of tensile strength: above zero, and not above the strength itself. */
  static ValueReader<Double> shareOfStrength() {
    return quantity(Dimension.SHARE, new Range(0, false, 1, true));
  }

  /**
   * A plain number.
   *
   * @param range what makes sense
   * @return reads it
   */
  static ValueReader<Double> number(Range range) {
    return new NumberReader(range, false);
  }

  /** A whole number from one on. */
  static ValueReader<Integer> count() {
    return new NumberReader(Range.FROM_ONE, true).map(Double::intValue);
  }

  /** True or false. */
  static ValueReader<Boolean> flag() {
    return new WordReader<>(List.of(true, false), String::valueOf);
  }

  /**
   * A list of words of which none may stand twice.
   *
   * @param <T> what the words stand for
   * @param item reads one
   * @return reads the list
   */
  static <T> ValueReader<List<T>> list(ValueReader<T> item) {
    return new ListReader<>(item, value -> value);
  }
}
