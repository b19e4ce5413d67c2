package coilwright.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;

/** The program's entry: runs the command line and exits with its status. */
public final class Main {

  private Main() {}

  /**
   * Runs the program and exits with its status.
   *
   * @param args command line
   */
  public static void main(String[] args) {
    Terminal terminal =
        new Terminal(
            System.in,
            new FileOutputStream(FileDescriptor.out),
            new FileOutputStream(FileDescriptor.err));
    System.exit(Program.run(terminal, args));
  }
}
