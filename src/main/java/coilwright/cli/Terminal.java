package coilwright.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.Locale;

/**
 * The three streams of a run. Text goes out as UTF-8 whatever the locale, and a failure to write is
 * never swallowed.
 *
 * @param in standard input
 * @param out standard output
 * @param err standard error
 */
public record Terminal(InputStream in, OutputStream out, OutputStream err) {

  /**
   * Writes a result to standard output, whole. A reader that has seen enough and left is no
   * failure.
   *
   * @param text the result, free of control characters but the line feed
   * @throws IOException if it cannot be written
   */
  void print(String text) throws IOException {
    try {
      out.write(text.getBytes(StandardCharsets.UTF_8));
      out.flush();
    } catch (IOException e) {
      if (!isClosedPipe(e)) {
        throw e;
      }
    }
  }

  /** The system's words for it differ by platform and language, but every one names the pipe. */
  private static boolean isClosedPipe(IOException problem) {
    String message = problem.getMessage();
    return message != null && message.toLowerCase(Locale.ROOT).contains("pipe");
  }

  /** Writes a message to standard error; where even that fails, there is nobody left to tell. */
  void complain(String text) {
    try {
      err.write(PlainText.of(text).getBytes(StandardCharsets.UTF_8));
      err.flush();
    } catch (IOException e) {
      // The status still tells.
    }
  }
}
