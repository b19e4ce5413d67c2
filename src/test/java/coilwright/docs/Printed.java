package coilwright.docs;

import coilwright.cli.Program;
import coilwright.cli.Terminal;
import java.io.ByteArrayOutputStream;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;

/**
 * What one command line prints, run inside this virtual machine from the repository's root.
 *
 * @param status exit status
 * @param out standard output
 * @param err standard error
 */
record Printed(int status, String out, String err) {

  /** Runs a command line without input. */
  static Printed by(String... args) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    int status = Program.run(new Terminal(InputStream.nullInputStream(), out, err), args);
    return new Printed(
        status, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
  }

  /** Runs the rest of a shell line; only blanks part its words. */
  static Printed byLine(String words) {
    return by(words.trim().split(" +"));
  }
}
