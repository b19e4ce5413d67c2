package coilwright.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;

/** Standard output carries results as clean UTF-8, standard error the faults. */
class StreamsTest {

  private static final String TITLE = "Gew\u00e4chshaus \u6e29\u5ba4 \ud83c\udf31";
  private static final String CONTROLS = "\"a\\e[31mb\\x7Fc\\x9Bd\\x85e\\tf\\ng\"";

  @Test
  void sameBytesTwice() {
    for (String format : new String[] {"text", "json", "csv"}) {
      String[] args = {"shortlist", "-", "--all", "--format", format};
      assertThat(Run.reading(Run.VALVE, args).bytes())
          .isEqualTo(Run.reading(Run.VALVE, args).bytes());
    }
  }

  @Test
  void titleIsPassedThroughAsUtf8() {
    assertThat(titled(TITLE, "text").out()).startsWith(TITLE + "\n");
    assertThat(titled(TITLE, "json").json().path("problem").path("title").asText())
        .isEqualTo(TITLE);
  }

  @Test
  void ourOwnTextIsAscii() {
    assertThat(titled("plain", "text").out()).matches("[ -~\n]*");
    assertThat(Run.reading(Run.CRAMPED, "shortlist", "-").out()).matches("[ -~\n]*");
    assertThat(Run.reading(Run.DESIGN, "check", "-").out()).matches("[ -~\n]*");
    assertThat(Run.of("materials").out() + Run.of("wires").out()).matches("[ -~\n]*");
    assertThat(Run.of("starter", "compression").out()).matches("[ -~\n]*");
  }

  @Test
  void controlCharactersDoNotLeaveTheProgram() {
    Run text = titled(CONTROLS, "text");
    assertThat(text.out()).doesNotContainPattern("[\\p{Cc}&&[^\n]]").startsWith("a [31mb c d e f");
    Run json = titled(CONTROLS, "json");
    assertThat(json.out()).doesNotContainPattern("[\\p{Cc}&&[^\n]]");
    assertThat(json.json().path("problem").path("title").asText())
        .isEqualTo("a\u001b[31mb\u007fc\u009bd\u0085e\tf\ng");
  }

  @Test
  void controlCharactersInFaultsAndNames() {
    Run fault = Run.reading(Run.VALVE + "\"\\e[2J\\x9B\": 1\n", "shortlist", "-");
    assertThat(fault.refused("(line 11)").err()).doesNotContainPattern("[\\p{Cc}&&[^\n]]");
    Run name = Run.of("shortlist", "no\u001b[2J\nfile.yaml");
    assertThat(name.refused("no [2J file.yaml: no such file").err()).hasLineCount(1);
  }

  @Test
  void carriageReturnsAndMarkInTheFileChangeNothing() {
    Run run = Run.reading("\ufeff" + Run.VALVE.replace("\n", "\r\n"), "shortlist", "-");
    assertThat(run.found(Status.FOUND).bytes())
        .isEqualTo(Run.reading(Run.VALVE, "shortlist", "-").bytes());
  }

  @Test
  void outputThatCannotBeWrittenIsStatusOne() throws IOException {
    for (String[] args : new String[][] {{"wires"}, {"--help"}, {"--version"}, {"materials"}}) {
      try (OutputStream full = new FileOutputStream("/dev/full")) {
        assertThat(writingTo(full, args).err())
            .isEqualTo(
                "1 coilwright: standard output cannot be written (No space left on device); make"
                    + " room there, or give --out another place\n");
      }
    }
  }

  @Test
  void closedPipeEndsQuietly() {
    for (String words : new String[] {"Broken pipe", "Relais brise (pipe)"}) {
      assertThat(writingTo(failing(words), "wires").err()).isEqualTo("0 ");
      assertThat(writingTo(failing(words), "--help").err()).isEqualTo("0 ");
      assertThat(writingTo(failing(words), "shortlist", "-").err()).isEqualTo("3 ");
    }
  }

  @Test
  void faultsNobodyHearsStillHaveTheirStatus() {
    Terminal deaf =
        new Terminal(InputStream.nullInputStream(), failing("closed"), failing("closed"));
    assertThat(Program.run(deaf, "shortlist")).isEqualTo(Status.REFUSED);
    assertThat(Program.run(deaf, "wires")).isEqualTo(Status.FAILED);
  }

  @Test
  void internalFailureIsStatusOneInWords() {
    for (Throwable cause :
        new Throwable[] {new IllegalStateException("x"), new StackOverflowError("x")}) {
      ByteArrayOutputStream err = new ByteArrayOutputStream();
      Terminal broken = new Terminal(throwing(cause), OutputStream.nullOutputStream(), err);
      assertThat(Program.run(broken, "shortlist", "-")).isEqualTo(Status.FAILED);
      assertThat(err.toString(StandardCharsets.UTF_8))
          .isEqualTo(
              "coilwright: internal failure ("
                  + cause.getClass().getSimpleName()
                  + ": x); please report it, with the problem file\n");
    }
  }

  @Test
  void inputThatCannotBeReadIsStatusTwo() {
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    Terminal broken =
        new Terminal(throwing(new IOException("gone")), OutputStream.nullOutputStream(), err);
    assertThat(Program.run(broken, "check", "-")).isEqualTo(Status.REFUSED);
    assertThat(err.toString(StandardCharsets.UTF_8))
        .startsWith("standard input: cannot be read (gone); ");
  }

  private static Run titled(String title, String format) {
    String problem = Run.VALVE.replace("Drip-header valve", title);
    return Run.reading(problem, "shortlist", "-", "--format", format).found(Status.FOUND);
  }

  /** A run whose "err" is its status and what it said on standard error. */
  private static Run writingTo(OutputStream out, String... args) {
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    InputStream in = new ByteArrayInputStream(Run.CRAMPED.getBytes(StandardCharsets.UTF_8));
    int status = Program.run(new Terminal(in, out, err), args);
    return new Run(status, new byte[0], status + " " + err.toString(StandardCharsets.UTF_8));
  }

  private static OutputStream failing(String words) {
    return new OutputStream() {
      @Override
      public void write(int sign) throws IOException {
        throw new IOException(words);
      }
    };
  }

  private static InputStream throwing(Throwable cause) {
    return new InputStream() {
      @Override
      public int read() throws IOException {
        if (cause instanceof Error error) {
          throw error;
        }
        if (cause instanceof RuntimeException failure) {
          throw failure;
        }
        throw (IOException) cause;
      }
    };
  }
}
