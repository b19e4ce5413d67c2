package coilwright.cli;

import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** Reads a whole number of springs: 1 to 999999. */
final class CountConverter implements ITypeConverter<Integer> {

  @Override
  public Integer convert(String word) {
    if (word.matches("[1-9][0-9]{0,5}")) {
      return Integer.valueOf(word);
    }
    throw new TypeConversionException(
        "\"" + word + "\"; accepted: a whole number from 1 to 999999");
  }
}
