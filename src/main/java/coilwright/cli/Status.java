package coilwright.cli;

/** Exit statuses. */
final class Status {

  /** Something was found, or the checked spring holds. */
  static final int FOUND = 0;

  /** The program failed, or could not write its result. */
  static final int FAILED = 1;

  /** Wrong usage, or an unreadable or invalid file. */
  static final int REFUSED = 2;

  /** A valid problem that no spring meets, or a checked spring that fails. */
  static final int NOTHING = 3;

  private Status() {}
}
