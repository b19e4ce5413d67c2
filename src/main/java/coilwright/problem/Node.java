package coilwright.problem;

import java.util.List;

/** A part of a problem file as it stands there, before anything is known of its meaning. */
sealed interface Node permits Node.Scalar, Node.Sequence, Node.Mapping, Node.Refused {

  /** Where it begins. */
  Mark mark();

  /** What it is, for a message. */
  String shown();

  /** Whether nothing stands there. */
  boolean isEmpty();

  /**
   * A single value, as text whatever it looks like.
   *
   * @param mark where it begins
   * @param text the text, without quotes and without blanks around it
   */
  record Scalar(Mark mark, String text) implements Node {

    /** Drops blanks around the text. */
    public Scalar {
      text = text.strip();
    }

    /** Whether it is a word by which YAML or JSON writes that there is no value. */
    boolean isNull() {
      return text.equals("~") || text.equalsIgnoreCase("null");
    }

    @Override
    public String shown() {
      return isEmpty() ? "nothing" : ShownText.of(text);
    }

    @Override
    public boolean isEmpty() {
      return text.isEmpty();
    }
  }

  /**
   * A list.
   *
   * @param mark where it begins
   * @param items in file order
   */
  record Sequence(Mark mark, List<Node> items) implements Node {

    /** Copies the list. */
    public Sequence {
      items = List.copyOf(items);
    }

    @Override
    public String shown() {
      return "a list";
    }

    @Override
    public boolean isEmpty() {
      return false;
    }
  }

  /**
   * Keys with values.
   *
   * @param mark where it begins
   * @param entries in file order, no key twice
   */
  record Mapping(Mark mark, List<Entry> entries) implements Node {

    /** Copies the list. */
    public Mapping {
      entries = List.copyOf(entries);
    }

    @Override
    public String shown() {
      return "a block of keys";
    }

    @Override
    public boolean isEmpty() {
      return entries.isEmpty();
    }
  }

  /**
   * Something that a fault already refuses; nothing more is said about it.
   *
   * @param mark where it begins
   */
  record Refused(Mark mark) implements Node {

    @Override
    public String shown() {
      return "";
    }

    @Override
    public boolean isEmpty() {
      return false;
    }
  }

  /**
   * One key with its value.
   *
   * @param mark where the key begins
   * @param key the key
   * @param value its value
   */
  record Entry(Mark mark, String key, Node value) {}
}
