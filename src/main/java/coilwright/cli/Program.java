package coilwright.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import picocli.CommandLine;

/** The command line as a function: arguments in, status out. */
public final class Program {

  private static final String BROKEN_PIPE = "Broken pipe";

  private Program() {}

  /**
   * Runs one command line.
   *
   * @param terminal where it reads and writes
   * @param args the arguments
   * @return the exit status: 0 found, 1 failed, 2 refused, 3 nothing found
   */
  public static int run(Terminal terminal, String... args) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    CommandLine commandLine = commandLine(terminal, out, err);
    int status = commandLine.execute(args);
    terminal.complain(err.toString());
    return out.toString().isEmpty() ? status : emit(terminal, out.toString(), status);
  }

  private static CommandLine commandLine(Terminal terminal, StringWriter out, StringWriter err) {
    return new CommandLine(new RootCommand(), new CommandFactory(terminal))
        .setOut(new PrintWriter(out))
        .setErr(new PrintWriter(err))
        .setColorScheme(CommandLine.Help.defaultColorScheme(CommandLine.Help.Ansi.OFF))
        .setUsageHelpAutoWidth(false)
        .setCaseInsensitiveEnumValuesAllowed(false)
        .setAbbreviatedOptionsAllowed(false)
        .setParameterExceptionHandler(Program::wrongUsage)
        .setExecutionExceptionHandler(Program::failed);
  }

  private static int wrongUsage(CommandLine.ParameterException problem, String[] args) {
    PrintWriter err = problem.getCommandLine().getErr();
    err.print("coilwright: " + problem.getMessage() + "\n");
    err.print("Try: " + problem.getCommandLine().getCommandSpec().qualifiedName() + " --help\n");
    return Status.REFUSED;
  }

  private static int failed(
      Exception problem, CommandLine commandLine, CommandLine.ParseResult parsed) {
    PrintWriter err = commandLine.getErr();
    if (problem instanceof Refusal refusal) {
      err.print(refusal.getMessage() + "\n");
      return refusal.status();
    }
    if (isClosedPipe(problem)) {
      return Status.FOUND;
    }
    if (problem instanceof IOException) {
      err.print("coilwright: cannot write standard output: " + problem.getMessage() + "\n");
      return Status.FAILED;
    }
    err.print(
        "coilwright: internal failure: "
            + problem.getClass().getSimpleName()
            + ": "
            + problem.getMessage()
            + "\nPlease report it together with the problem file.\n");
    return Status.FAILED;
  }

  /** What picocli itself prints: help and version. */
  private static int emit(Terminal terminal, String text, int status) {
    try {
      terminal.print(text);
      return status;
    } catch (IOException e) {
      if (isClosedPipe(e)) {
        return status;
      }
      terminal.complain("coilwright: cannot write standard output: " + e.getMessage() + "\n");
      return Status.FAILED;
    }
  }

  /** A reader that has seen enough and left is no failure. */
  static boolean isClosedPipe(Exception problem) {
    return problem instanceof IOException && BROKEN_PIPE.equals(problem.getMessage());
  }
}
