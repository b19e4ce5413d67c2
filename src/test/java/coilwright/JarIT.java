package coilwright;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.cli.Program;
import coilwright.cli.ShellFiles;
import coilwright.cli.Terminal;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.net.URL;
import java.net.URLClassLoader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import java.util.jar.JarFile;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What only the packaged jar in a process of its own can show: locale, pipes, disks, README. */
class JarIT {

  private static final String PREFIX = "java -jar target/coilwright.jar";
  private static final Path JAR = Path.of("target/coilwright.jar").toAbsolutePath();
  private static final Path EXAMPLE = Path.of("problems/check-valve.yaml").toAbsolutePath();
  private static final String SMALL_HEAP = "java -Xmx256m -jar " + JAR;

  @TempDir private Path folder;

  @Test
  void commandsOfTheReadmeRun() throws Exception {
    List<String> commands = readme();
    assertThat(commands).as("lines of README.md that begin with %s", PREFIX).isNotEmpty();
    Files.createDirectory(folder.resolve("target"));
    Files.copy(JAR, folder.resolve("target/coilwright.jar"));
    copyProblems();
    StringBuilder script = new StringBuilder("set -o pipefail\n");
    for (String command : commands) {
      script.append(command).append("\necho \"status $?\" >&2\n");
    }
    Ran ran = bash(script.toString(), Map.of());
    assertThat(ran.err().lines()).hasSameSizeAs(commands);
    assertThat(ran.err().lines()).allSatisfy(line -> assertThat(line).matches("status [03]"));
    assertThat(ran.out()).isNotEmpty();
  }

  @Test
  void underAnyLocaleTheBytesAreTheSame() throws Exception {
    Path problem = titled("Gew\u00e4chshaus \u6e29\u5ba4");
    Ran ran = bash(SMALL_HEAP + " shortlist " + problem, Map.of("LC_ALL", "C"));
    ByteArrayOutputStream here = new ByteArrayOutputStream();
    Terminal terminal =
        new Terminal(InputStream.nullInputStream(), here, OutputStream.nullOutputStream());
    assertThat(Program.run(terminal, "shortlist", problem.toString())).isZero();
    assertThat(ran.err()).isEmpty();
    assertThat(ran.status()).isZero();
    assertThat(ran.out())
        .startsWith("Gew\u00e4chshaus \u6e29\u5ba4\n")
        .isEqualTo(here.toString(StandardCharsets.UTF_8));
  }

  @Test
  void startScriptGivesTheSameAnswerWithItsArchiveAndWithoutAndIsCompleted() throws Exception {
    Path copy = Files.createDirectory(folder.resolve("moved"));
    Path script = JAR.resolveSibling("coilwright");
    Files.copy(JAR, copy.resolve("coilwright.jar"));
    Files.copy(script, copy.resolve("coilwright"));
    Files.createSymbolicLink(folder.resolve("linked"), copy.resolve("coilwright"));
    Ran ran =
        bash(
            "for start in '"
                + SMALL_HEAP
                + "' "
                + script
                + " ./linked; do"
                + " $start shortlist "
                + EXAMPLE
                + " | sha256sum; done | uniq | wc -l; "
                + completing("shortlist", "--rank", "ma")
                + completing("wires", "metr"),
            Map.of());
    assertThat(ran).isEqualTo(new Ran(0, "1\nmass margin\nmetric\n", ""));
  }

  /** What bash does when the tab key is pressed behind these words; its options need a terminal. */
  private static String completing(String... words) {
    return ". "
        + JAR.resolveSibling("completion/coilwright")
        + "; COMP_WORDS=(coilwright "
        + String.join(" ", words)
        + "); COMP_CWORD="
        + words.length
        + "; COMP_LINE=\"${COMP_WORDS[*]}\"; _complete_coilwright 2>/dev/null;"
        + " echo \"${COMPREPLY[*]}\"; ";
  }

  @Test
  void completionAndManualPagesStandBesideTheJar() {
    ShellFiles.all()
        .forEach((name, text) -> assertThat(JAR.resolveSibling(name)).content().isEqualTo(text));
  }

  @Test
  void nameThatTheLocaleCannotExpressIsRefusedInWords() throws Exception {
    Ran ran =
        bash("java -jar " + JAR + " shortlist $'gew\\xc3\\xa4chs.yaml'", Map.of("LC_ALL", "C"));
    assertThat(ran.status()).isEqualTo(2);
    assertThat(ran.out()).isEmpty();
    assertThat(ran.err()).contains("locale", "set LC_ALL=C.UTF-8").hasLineCount(1);
  }

  @Test
  void closedPipeEndsQuietly() throws Exception {
    String many = SMALL_HEAP + " shortlist " + titled("Many") + " --all --format json";
    Ran ran = bash(many + " | head -1; exit ${PIPESTATUS[0]}", Map.of());
    assertThat(ran).isEqualTo(new Ran(0, "{\n", ""));
  }

  @Test
  void fullDeviceIsStatusOne() throws Exception {
    Ran ran = bash("java -jar " + JAR + " materials > /dev/full", Map.of());
    assertThat(ran.status()).isEqualTo(1);
    assertThat(ran.err()).startsWith("coilwright: standard output cannot be written (");
    assertThat(ran.err()).hasLineCount(1);
  }

  /** A limit on the size of files stops a write half way, as a full disk does. */
  @Test
  void fileThatCannotBeFinishedIsStatusOneAndLeavesNothing() throws Exception {
    Path out = Files.createDirectory(folder.resolve("out"));
    String big = " shortlist " + titled("Big") + " --all --format json --out out/big.json";
    Ran ran = bash("ulimit -f 64; java -XX:-UsePerfData -jar " + JAR + big, Map.of());
    assertThat(ran.err()).startsWith("out/big.json: cannot be written (").hasLineCount(1);
    assertThat(ran.status()).isEqualTo(1);
    assertThat(ran.out()).isEmpty();
    assertThat(out).isEmptyDirectory();
  }

  @Test
  void jarNeedsNothingElse() throws Exception {
    URL[] jar = {JAR.toUri().toURL()};
    try (URLClassLoader alone = new URLClassLoader(jar, ClassLoader.getPlatformClassLoader())) {
      Class<?> terminal = alone.loadClass("coilwright.cli.Terminal");
      ByteArrayOutputStream out = new ByteArrayOutputStream();
      Object streams =
          terminal
              .getConstructor(InputStream.class, OutputStream.class, OutputStream.class)
              .newInstance(InputStream.nullInputStream(), out, out);
      Object status =
          alone
              .loadClass("coilwright.cli.Program")
              .getMethod("run", terminal, String[].class)
              .invoke(null, streams, new String[] {"shortlist", EXAMPLE.toString()});
      assertThat(status).as(out.toString(StandardCharsets.UTF_8)).isEqualTo(0);
    }
  }

  @Test
  void jarNamesItsMainClassAndVersionAndKeepsLicences() throws IOException {
    try (JarFile jar = new JarFile(JAR.toFile())) {
      assertThat(jar.getManifest().getMainAttributes().getValue("Main-Class"))
          .isEqualTo("coilwright.cli.Main");
      assertThat(jar.getManifest().getMainAttributes().getValue("Implementation-Version"))
          .matches("[0-9]+\\.[0-9]+\\.[0-9]+");
      assertThat(jar.getEntry("META-INF/LICENSE")).isNotNull();
      assertThat(jar.getEntry("META-INF/NOTICE.txt")).isNotNull();
    }
  }

  /** The command lines in the README's code blocks. */
  private static List<String> readme() throws IOException {
    List<String> commands = new ArrayList<>();
    boolean inBlock = false;
    for (String line : Files.readAllLines(Path.of("README.md"))) {
      if (line.strip().startsWith("```")) {
        inBlock = !inBlock;
      } else if (inBlock && line.strip().startsWith(PREFIX)) {
        commands.add(line.strip());
      }
    }
    return commands;
  }

  private void copyProblems() throws IOException {
    Path from = EXAMPLE.getParent();
    Path problems = folder.resolve("problems");
    try (var files = Files.walk(from)) {
      for (Path file : files.toList()) {
        Files.copy(file, problems.resolve(from.relativize(file).toString()));
      }
    }
  }

  /** The example with another title and fewer materials. */
  private Path titled(String title) throws IOException {
    String text =
        Files.readString(EXAMPLE)
            .replaceFirst("(?m)^title: .*$", "title: " + title)
            .replaceFirst("(?m)^  materials: .*$", "  materials: [music-wire]");
    return Files.writeString(folder.resolve("titled.yaml"), text);
  }

  private Ran bash(String script, Map<String, String> environment) throws Exception {
    Path out = Files.createTempFile("coilwright", ".out");
    Path err = Files.createTempFile("coilwright", ".err");
    ProcessBuilder builder = new ProcessBuilder("bash", "-c", script);
    builder.directory(folder.toFile()).redirectOutput(out.toFile()).redirectError(err.toFile());
    builder.environment().putAll(environment);
    Process process = builder.start();
    process.getOutputStream().close();
    assertThat(process.waitFor(120, TimeUnit.SECONDS)).isTrue();
    Ran ran = new Ran(process.exitValue(), Files.readString(out), Files.readString(err));
    Files.delete(out);
    Files.delete(err);
    return ran;
  }

  /** A process that has ended. */
  private record Ran(int status, String out, String err) {}
}
