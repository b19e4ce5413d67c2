package coilwright.cli;

import coilwright.problem.RankBy;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** Reads {@code --rank}. */
final class RankConverter implements ITypeConverter<RankBy> {

  @Override
  public RankBy convert(String word) {
    for (RankBy by : RankBy.values()) {
      if (by.id().equals(word)) {
        return by;
      }
    }
    throw new TypeConversionException("\"" + word + "\"; accepted: mass, margin, cost, robust");
  }
}
