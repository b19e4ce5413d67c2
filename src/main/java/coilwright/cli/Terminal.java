package coilwright.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;

/**
 * The three streams of a run. Text goes out as UTF-8 whatever the locale, and a failure to write is
 * never swallowed.
 *
 * @param in standard input
 * @param out standard output
 * @param err standard error
 */
public record Terminal(InputStream in, OutputStream out, OutputStream err) {

  /** Writes a result to standard output, whole. */
  void print(String text) throws IOException {
    out.write(text.getBytes(StandardCharsets.UTF_8));
    out.flush();
  }

  /** Writes a message to standard error; where even that fails, there is nobody left to tell. */
  void complain(String text) {
    try {
      err.write(text.getBytes(StandardCharsets.UTF_8));
      err.flush();
    } catch (IOException e) {
      // The status still tells.
    }
  }
}
