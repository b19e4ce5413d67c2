package coilwright.unit;

import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads a quantity: a decimal number, blanks or none, and a unit. */
public final class QuantityParser {

  private static final Pattern NUMBER_THEN_UNIT =
      Pattern.compile("([+-]?[0-9.,_]++(?:[eE][+-]?[0-9]++)?)[ \\t]*+(.*)", Pattern.DOTALL);

  private QuantityParser() {}

  /**
   * Reads a quantity of one of several kinds.
   *
   * @param text such as "18 N", without blanks around it
   * @param dimensions the kinds accepted, one or more
   * @return the quantity; or why it is refused
   */
  public static Parsed<Quantity> parse(String text, List<Dimension> dimensions) {
    Matcher parts = NUMBER_THEN_UNIT.matcher(text);
    if (!parts.matches()) {
      return Parsed.refused("");
    }
    Parsed<Double> number = DecimalNumber.parse(parts.group(1));
    if (number.value().isEmpty()) {
      return number.stillRefused();
    }
    return withUnit(number.value().get(), parts.group(2), dimensions);
  }

  /**
   * The kinds of quantity and their units in words: "a length in mm, um, cm, m, in or ft".
   *
   * @param dimensions the kinds, one or more
   * @return the words
   */
  public static String accepted(List<Dimension> dimensions) {
    return String.join(
        " or ",
        dimensions.stream()
            .map(kind -> kind.phrase() + " in " + Words.either(symbols(List.of(kind))))
            .toList());
  }

  private static Parsed<Quantity> withUnit(
      double number, String symbol, List<Dimension> dimensions) {
    if (symbol.isEmpty()) {
      return Parsed.refused("without a unit");
    }
    for (Dimension dimension : dimensions) {
      Optional<Unit> unit = dimension.unit(symbol);
      if (unit.isPresent()) {
        return inRange(new Quantity(number, unit.get(), dimension));
      }
    }
    return unitRefused(symbol, dimensions);
  }

  private static Parsed<Quantity> inRange(Quantity quantity) {
    double inner = quantity.inner();
    if (!(Math.abs(inner) < Double.POSITIVE_INFINITY)) {
      return Parsed.refused("too large a number");
    }
    return inner == 0 && quantity.number() != 0
        ? Parsed.refused("too small a number")
        : Parsed.of(quantity);
  }

  private static Parsed<Quantity> unitRefused(String symbol, List<Dimension> dimensions) {
    for (Dimension other : Dimension.values()) {
      if (other.unit(symbol).isPresent()) {
        return Parsed.misspelt(other.phrase(), longer(symbol, dimensions));
      }
    }
    return Parsed.misspelt("with an unknown unit", Spelling.nearest(symbol, symbols(dimensions)));
  }

  /** A unit that goes on where another kind's ends: lb is a mass, and lbf the force. */
  private static Optional<String> longer(String symbol, List<Dimension> dimensions) {
    return symbols(dimensions).stream()
        .filter(known -> symbol.length() > 1 && known.startsWith(symbol))
        .findFirst();
  }

  /**
   * The symbols of the units of several kinds of quantity.
   *
   * @param dimensions the kinds
   * @return the symbols, in order
   */
  public static List<String> symbols(List<Dimension> dimensions) {
    return dimensions.stream().flatMap(kind -> kind.units().stream()).map(Unit::symbol).toList();
  }
}
