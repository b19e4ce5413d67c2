package coilwright.cli;

import java.io.IOException;
import picocli.CommandLine.Option;

/** Where a result goes. */
final class ResultOptions {

  @Option(
      names = "--out",
      paramLabel = "FILE",
      description = "Write to this file, whole or not at all, instead of standard output.")
  private String out;

  @Option(names = "--force", description = "Let --out replace an existing file.")
  private boolean force;

  /** Refuses a target that could not or must not be written, before any work is done. */
  void refuseBadTarget() {
    if (out == null) {
      return;
    }
    if (out.isEmpty() || out.equals("-")) {
      throw Refusal.usage(
          "--out: \"" + out + "\" is no file name; leave --out out to write to standard output");
    }
    if (out.endsWith("/")) {
      throw Refusal.usage(PlainText.line(out) + ": is a folder, no plain file; add a file name");
    }
    target().refuseIfBad();
  }

  /**
   * The same, and refuses to overwrite the problem file.
   *
   * @param problem the problem file
   */
  void refuseBadTarget(ProblemFile problem) {
    if (out != null && problem.isAt(ProblemFile.pathOf(out))) {
      throw Refusal.usage(
          PlainText.line(out) + ": is the problem file itself; give --out another name");
    }
    refuseBadTarget();
  }

  /**
   * Writes a result.
   *
   * @param text the result, free of control characters but the line feed
   * @param terminal whose standard output is meant where no file is named
   * @throws IOException if standard output cannot be written
   */
  void deliver(String text, Terminal terminal) throws IOException {
    if (out == null) {
      terminal.print(text);
    } else {
      target().write(text);
    }
  }

  private WholeFile target() {
    return new WholeFile(ProblemFile.pathOf(out), force);
  }
}
