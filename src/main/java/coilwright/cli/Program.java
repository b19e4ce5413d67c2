package coilwright.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import picocli.CommandLine;

/** The command line as a function: arguments in, status out. */
public final class Program {

  private Program() {}

  /**
   * Runs one command line. Nothing is thrown, whatever happens: a failure is a message and a
   * status.
   *
   * @param terminal where it reads and writes
   * @param args the arguments
   * @return the exit status: 0 found, 1 failed, 2 refused, 3 nothing found
   */
  public static int run(Terminal terminal, String... args) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    try {
      int status = commandLine(new Commands(terminal), out, err, args).execute(args);
      terminal.complain(err.toString());
      terminal.print(out.toString().replace("\r\n", "\n"));
      return status;
    } catch (IOException e) {
      terminal.complain(unwritten(e));
    } catch (RuntimeException | Error e) {
      terminal.complain(internal(e));
    }
    return Status.FAILED;
  }

  private static CommandLine commandLine(
      Commands commands, StringWriter out, StringWriter err, String... args) {
    CommandLine root = new CommandLine(new RootCommand());
    commands.addTo(root, args);
    return root.setOut(new PrintWriter(out))
        .setErr(new PrintWriter(err))
        .setColorScheme(CommandLine.Help.defaultColorScheme(CommandLine.Help.Ansi.OFF))
        .setUsageHelpAutoWidth(false)
        .setUsageHelpWidth(80)
        .setExpandAtFiles(false)
        .setAbbreviatedOptionsAllowed(false)
        .setParameterExceptionHandler(Program::wrongUsage)
        .setExecutionExceptionHandler(Program::failed);
  }

  private static int wrongUsage(CommandLine.ParameterException problem, String[] args) {
    String command = problem.getCommandLine().getCommandSpec().qualifiedName();
    problem
        .getCommandLine()
        .getErr()
        .print(
            command
                + ": "
                + PlainText.line(WrongUsage.words(problem, args))
                + "\nTry: "
                + command
                + " --help\n");
    return Status.REFUSED;
  }

  private static int failed(
      Exception problem, CommandLine commandLine, CommandLine.ParseResult parsed) {
    PrintWriter err = commandLine.getErr();
    if (problem instanceof Refusal refusal) {
      err.print(refusal.getMessage() + "\n");
      return refusal.status();
    }
    err.print(problem instanceof IOException e ? unwritten(e) : internal(problem));
    return Status.FAILED;
  }

  private static String unwritten(IOException problem) {
    return "coilwright: standard output cannot be written ("
        + Refusal.reason(problem)
        + "); make room there, or give --out another place\n";
  }

  private static String internal(Throwable problem) {
    return "coilwright: internal failure ("
        + problem.getClass().getSimpleName()
        + ": "
        + problem.getMessage()
        + "); please report it, with the problem file\n";
  }
}
