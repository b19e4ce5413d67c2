package coilwright.problem;

import java.util.regex.Pattern;

/** The kinds of fault that a schema of single values cannot see, by their messages. */
enum BeyondSchema {
  /** A mapping holds each key once, whoever reads it. */
  REPEATED_KEY(": repeated key;"),

  /** The editor reads the number or the truth value, not how it is spelt. */
  SPELLING_OF_A_PLAIN_VALUE(
      ": (True|0x|0o|\\.nan|\\.inf|[^ ]*, with an underscore|[^ ]*, with a leading zero)"),

  /** The editor sees nothing, as in an empty section. */
  NULL_FOR_A_SECTION("\\): (null|~); must be a (block|list of blocks)"),

  /** Of the range of a quantity, or of a number in quotes, the schema knows the sign only. */
  SIZE_OF_A_QUANTITY(
      ": [0-9.e+-]+ ?[^ ;]*(, too (large|small) a number; |; must be at (most|least) [0-9.]+ [^ ,]+$)"
          + "|: [0-9][^;]*; must be (above|at least) .* and (at most|below) "
          + "|: [0-9e]+; must be at most [0-9]+$"
          + "|, outside what a spring wire can have; "),

  /** Two values, or a value and a default. */
  VALUES_AGAINST_EACH_OTHER(
      "; must (not )?be (above|below|at most|at least) (rod|bore|min|max|the |min_inside|make)"
          + "|; must differ from|within 0.1 %|; must leave |; must be more than half |: zero on both sides;"
          + "|; must be at most .*where a table of this grade ends"
          + "| under stress_basis [a-z0-9-]+; | between loads of which |, at which the load line "),

  /** One entry in two units. */
  SAME_ENTRY_WRITTEN_OTHERWISE("\\[[0-9]+\\] .*; must stand once; it is "),

  /** Which grades there are. */
  NAMES_OF_GRADES(
      ", an unknown grade;|; must be new;|, an own grade that"
          + "|: all beside other ids|: excludes every grade"),

  /** What must be given because of what else is given, or of what the file is for. */
  PRESENCE_BY_OTHER_KEYS(
      ": missing; needed with|: given beside make|: a design block; |^design .*: missing;"
          + "|: the facts do not fix the load line;|: no (force|torque|angle) to go with it|; must be given; leaving it to"
          + "|: given beside (loop_planes|legs)| beside (one load|loop_planes)|with every length left open"
          + "|; must be left out, or go with make|; must be left out: it follows");

  private final Pattern words;

  BeyondSchema(String words) {
    this.words = Pattern.compile(words);
  }

  /** Whether a message is of this kind. */
  boolean says(String message) {
    return words.matcher(message).find();
  }
}
