package coilwright.cli;

import picocli.CommandLine;

/** Makes the commands, handing each the terminal of the run. */
final class CommandFactory implements CommandLine.IFactory {

  private final Terminal terminal;

  CommandFactory(Terminal terminal) {
    this.terminal = terminal;
  }

  @Override
  public <K> K create(Class<K> type) throws Exception {
    Object command = command(type);
    return command == null ? CommandLine.defaultFactory().create(type) : type.cast(command);
  }

  private Object command(Class<?> type) {
    if (type == ShortlistCommand.class) {
      return new ShortlistCommand(terminal);
    }
    if (type == CheckCommand.class) {
      return new CheckCommand(terminal);
    }
    if (type == MaterialsCommand.class) {
      return new MaterialsCommand(terminal);
    }
    if (type == WiresCommand.class) {
      return new WiresCommand(terminal);
    }
    return type == StarterCommand.class ? new StarterCommand(terminal) : null;
  }
}
