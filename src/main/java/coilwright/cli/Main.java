package coilwright.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;

/** The program's entry: runs the command line and exits with its status. */
public final class Main {

  /** Kinds of value that no option of ours takes; picocli need not load what reads them. */
  private static final String UNUSED_CONVERTERS = "java.sql.*,java.time.*";

  private Main() {}

  /**
   * Runs the program and exits with its status.
   *
   * @param args command line
   */
  public static void main(String[] args) {
    System.setProperty("picocli.converters.excludes", UNUSED_CONVERTERS);
    Terminal terminal =
        new Terminal(
            System.in,
            new FileOutputStream(FileDescriptor.out),
            new FileOutputStream(FileDescriptor.err));
    System.exit(Program.run(terminal, args));
  }
}
