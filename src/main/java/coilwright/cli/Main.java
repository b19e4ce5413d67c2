package coilwright.cli;

/** The program. */
public final class Main {

  private Main() {}

  /**
   * Runs the program and exits with its status.
   *
   * @param args command line
   */
  public static void main(String[] args) {
    System.exit(0);
  }
}
