package coilwright.cli;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;

/** Wrong usage, or a file that cannot be read or written: a message for the user and a status. */
final class Refusal extends RuntimeException {

  private static final long serialVersionUID = 1L;

  private final int status;

  private Refusal(int status, String message) {
    super(message);
    this.status = status;
  }

  /**
   * The user must change the command line or the file.
   *
   * @param message place, finding, remedy
   */
  static Refusal usage(String message) {
    return new Refusal(Status.REFUSED, message);
  }

  /**
   * The machine failed: a full disk, a device that does not write.
   *
   * @param message place, finding, remedy
   */
  static Refusal failure(String message) {
    return new Refusal(Status.FAILED, message);
  }

  /** The exit status. */
  int status() {
    return status;
  }

  /**
   * What the system says about a file, without the file's name.
   *
   * @param problem as thrown
   */
  static String reason(IOException problem) {
    if (problem instanceof AccessDeniedException) {
      return "permission denied";
    }
    if (problem instanceof NoSuchFileException) {
      return "no such file or folder";
    }
    if (problem instanceof FileSystemException file && file.getReason() != null) {
      return file.getReason();
    }
    return problem.getMessage();
  }
}
