package coilwright.cli;

import java.io.IOException;
import java.nio.file.Path;
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
    if (out != null) {
      WholeFile.at(target(), force).refuseIfBad();
    }
  }

  /** The same, and refuses to overwrite the problem file. */
  void refuseBadTarget(ProblemFile problem) {
    if (out != null && problem.isAt(target())) {
      throw Refusal.usage(out + ": is the problem file itself; give --out another name");
    }
    refuseBadTarget();
  }

  /** Writes a result. */
  void deliver(String text, Terminal terminal) throws IOException {
    if (out == null) {
      terminal.print(text);
    } else {
      WholeFile.at(target(), force).write(text);
    }
  }

  private Path target() {
    return ProblemFile.pathOf(out);
  }
}
