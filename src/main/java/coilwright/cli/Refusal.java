package coilwright.cli;

/** Wrong usage, or a file that cannot be read or written: a message for the user and a status. */
final class Refusal extends RuntimeException {

  private static final long serialVersionUID = 1L;

  private final int status;

  private Refusal(int status, String message) {
    super(message);
    this.status = status;
  }

  /** The user must change the command line or the file. */
  static Refusal usage(String message) {
    return new Refusal(Status.REFUSED, message);
  }

  /** The machine failed: a full disk, a device that does not write. */
  static Refusal failure(String message) {
    return new Refusal(Status.FAILED, message);
  }

  int status() {
    return status;
  }
}
