package coilwright.problem;

import java.util.List;

/**
 * What may stand at a key of a problem file, as far as one value shows it by itself: the structure
 * that a schema is written from. Each {@link ValueReader} has the form of what it accepts; a form
 * never refuses what its reader takes.
 */
public sealed interface Form {

  /**
   * Free text; a number or a truth value is text too.
   *
   * @param pattern the regular expression that the whole text matches; empty where any text will do
   */
  record Text(String pattern) implements Form {}

  /**
   * One word of several.
   *
   * @param words the words, one or more
   */
  record Word(List<String> words) implements Form {

    /** Copies the list. */
    public Word {
      words = List.copyOf(words);
    }
  }

  /**
   * A number without a unit.
   *
   * @param range its bounds
   * @param whole whether it is a whole number
   */
  record Number(Range range, boolean whole) implements Form {

    /** The regular expression of the number where it is written as text. */
    public String pattern() {
      return "^" + (whole ? NumberPattern.whole(range) : NumberPattern.of(range)) + "$";
    }
  }

  /**
   * A number with a unit.
   *
   * @param range its bounds, in the inner unit
   * @param units the symbols of the units, one or more
   */
  record Measure(Range range, List<String> units) implements Form {

    /** Copies the list. */
    public Measure {
      units = List.copyOf(units);
    }

    /** The regular expression of number and unit. */
    public String pattern() {
      return "^" + NumberPattern.of(range) + "[ \\t]*" + NumberPattern.anyOf(units) + "$";
    }
  }

  /**
   * One of several forms.
   *
   * @param forms the forms, two or more
   */
  record Either(List<Form> forms) implements Form {

    /** Copies the list. */
    public Either {
      forms = List.copyOf(forms);
    }
  }

  /**
   * A list that is not empty.
   *
   * @param item the form of its items
   * @param distinct whether an item that is written twice is refused
   */
  record Many(Form item, boolean distinct) implements Form {}

  /**
   * A block of keys.
   *
   * @param keys all keys that may stand in it
   * @param choices keys that stand instead of one another
   */
  record Block(List<Key> keys, List<Choice> choices) implements Form {

    /** Copies the lists. */
    public Block {
      keys = List.copyOf(keys);
      choices = List.copyOf(choices);
    }
  }

  /**
   * A key of a block.
   *
   * @param name the key
   * @param form the form of its value
   * @param needed whether it must be given
   * @param mayBeEmpty whether an empty value, or an empty block, counts as left out
   * @param help what it means
   * @param written how it is written, in words
   * @param omitted what holds where it is left out, in words; empty where it must be given
   * @param examples how it may be written
   */
  record Key(
      String name,
      Form form,
      boolean needed,
      boolean mayBeEmpty,
      String help,
      String written,
      String omitted,
      List<String> examples) {

    /** Copies the list. */
    public Key {
      examples = List.copyOf(examples);
    }
  }

  /**
   * Keys of one block that stand instead of one another.
   *
   * @param names the keys, two or more
   * @param needed whether one of them at least must be given
   * @param exclusive whether one of them at most may be given
   */
  record Choice(List<String> names, boolean needed, boolean exclusive) {

    /** Copies the list. */
    public Choice {
      names = List.copyOf(names);
    }
  }
}
