package coilwright.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowable;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;

/** {@code --out} writes a file whole or not at all, and never one that should be kept. */
class OutFileTest {

  private static final String KEPT = "kept";

  @TempDir private Path folder;
  private Path target;

  @BeforeEach
  void name() {
    target = folder.resolve("list.txt");
  }

  @AfterEach
  void nothingTemporaryIsLeft() throws IOException {
    try (Stream<Path> files = Files.walk(folder)) {
      assertThat(files.map(file -> file.getFileName().toString()))
          .noneMatch(name -> name.endsWith(".tmp"));
    }
  }

  @Test
  void writtenWithStatusZeroAndThree() throws IOException {
    assertWritten(Run.VALVE, Status.FOUND, "shortlist", "-");
    assertWritten(Run.CRAMPED, Status.NOTHING, "shortlist", "-", "--format=json");
    assertWritten(Run.DESIGN, Status.FOUND, "check", "-");
    assertWritten(Run.WEAK, Status.NOTHING, "check", "-", "--format=json");
    assertWritten("", Status.FOUND, "starter", "compression");
    assertWritten("", Status.FOUND, "materials");
    assertWritten("", Status.FOUND, "wires", "--format=json");
  }

  @Test
  void notWrittenWithStatusTwo() {
    out("nonsense", target).refused("standard input");
    Run.of("materials", "wood", "--out", target.toString()).refused("wood");
    assertThat(target).doesNotExist();
  }

  @Test
  void hasTheRightsOfAnyNewFile() throws IOException {
    Path ordinary = Files.createFile(folder.resolve("ordinary"));
    silent(out(Run.VALVE, target), Status.FOUND);
    assertThat(Files.getPosixFilePermissions(target))
        .isEqualTo(Files.getPosixFilePermissions(ordinary));
  }

  @Test
  void existingFileIsKeptUnlessForced() throws IOException {
    Files.writeString(target, KEPT);
    out(Run.VALVE, target).refused("list.txt: exists already; give another name, or --force");
    assertThat(target).hasContent(KEPT);
    silent(out(Run.VALVE, target, "--force"), Status.FOUND);
    assertThat(target).content().startsWith("Drip-header valve\n");
  }

  @Test
  void forcedFileIsKeptWhereNothingIsWritten() throws IOException {
    Files.writeString(target, KEPT);
    out("nonsense", target, "--force").refused("standard input");
    assertThat(target).hasContent(KEPT);
  }

  @Test
  void folderMustExist() {
    out(Run.VALVE, folder.resolve("none/list.txt")).refused("its folder does not exist; make");
    out(Run.VALVE, target.resolve("below.txt")).refused("its folder does not exist; make");
    assertThat(folder).isEmptyDirectory();
  }

  @Test
  void targetsThatAreNoPlainFile() throws IOException {
    out(Run.VALVE, folder, "--force").refused("is a folder, no plain file");
    out(Run.VALVE, Path.of("/dev/null"), "--force").refused("is a device or pipe, no plain file");
    out(Run.VALVE, Path.of("/dev/full"), "--force").refused("is a device or pipe, no plain file");
    Path plain = Files.writeString(folder.resolve("plain"), KEPT);
    out(Run.VALVE, Files.createSymbolicLink(folder.resolve("link"), plain), "--force")
        .refused("is a symbolic link, no plain file");
    Path dangling = Files.createSymbolicLink(target, folder.resolve("nowhere"));
    out(Run.VALVE, dangling, "--force").refused("is a symbolic link, no plain file");
    assertThat(plain).hasContent(KEPT);
    assertThat(folder.resolve("nowhere")).doesNotExist();
  }

  @Test
  void namesThatAreNoFile() {
    for (String name : new String[] {"", "-"}) {
      Run.of("wires", "--out=" + name).refused("--out: \"" + name + "\" is no file name; leave");
    }
    Run.of("wires", "--out", target + "/").refused("list.txt/: is a folder, no plain file");
    Run.of("wires", "--out", "a\0b").refused("a b: ");
    Run.of("wires", "--out", target + "\n\u001b[2J/x").refused("list.txt  [2J/x: its folder");
  }

  @Test
  void neverTheProblemFileItself() throws IOException {
    Path problem = Path.of(Run.file(folder, "valve.yaml", Run.VALVE));
    Path link = Files.createSymbolicLink(folder.resolve("link.yaml"), problem);
    Path hard = Files.createLink(folder.resolve("hard.yaml"), problem);
    Path dotted = folder.resolve(".").resolve(folder.relativize(problem));
    for (Path other : new Path[] {problem, link, hard, dotted}) {
      itself(problem, other);
      itself(other, problem);
    }
    assertThat(problem).hasContent(Run.VALVE);
    Run.reading(Run.VALVE, "shortlist", "-", "--out", "/dev/stdin", "--force")
        .refused("/dev/stdin");
  }

  @Test
  @EnabledOnOs(OS.LINUX)
  void placeThatCannotBeWrittenIsStatusOne() {
    Path nowhere = Path.of("/proc/list.txt");
    Run run = out(Run.VALVE, nowhere).fault(Status.FAILED);
    assertThat(run.err())
        .startsWith("/proc/list.txt: cannot be written (")
        .contains("; give --out");
  }

  @Test
  void nameThatTheFileSystemRefusesIsStatusOneAndLeavesNothing() {
    Run run = out(Run.VALVE, folder.resolve("x".repeat(300))).fault(Status.FAILED);
    assertThat(run.err()).contains("cannot be written (File name too long)");
    assertThat(folder).isEmptyDirectory();
  }

  @Test
  void targetThatAppearsMeanwhileIsKept() throws IOException {
    WholeFile free = new WholeFile(target, false);
    free.refuseIfBad();
    Files.writeString(target, KEPT);
    assertThat(catchThrowable(() -> free.write("new"))).isInstanceOf(Refusal.class);
    assertThat(target).hasContent(KEPT);
  }

  @Test
  void leftoversOfKilledRunsDoNotMatter() throws IOException {
    Path left = folder.resolve(".coilwright-" + ProcessHandle.current().pid() + "-1.tmp");
    Files.writeString(left, KEPT);
    silent(out(Run.VALVE, target), Status.FOUND);
    assertThat(left).hasContent(KEPT);
    Files.delete(left);
  }

  private void assertWritten(String input, int status, String... args) throws IOException {
    String[] all =
        Stream.concat(Stream.of(args), Stream.of("--out", target.toString()))
            .toArray(String[]::new);
    silent(Run.reading(input, all), status);
    assertThat(target).hasBinaryContent(Run.reading(input, args).bytes());
    Files.delete(target);
  }

  private static void silent(Run run, int status) {
    assertThat(run.err()).isEmpty();
    assertThat(run.bytes()).isEmpty();
    assertThat(run.status()).isEqualTo(status);
  }

  private static Run out(String problem, Path target, String... options) {
    String[] args = {"shortlist", "-", "--out", target.toString()};
    return Run.reading(
        problem, Stream.concat(Stream.of(args), Stream.of(options)).toArray(String[]::new));
  }

  private static void itself(Path problem, Path target) {
    Run.of("shortlist", problem.toString(), "--out", target.toString(), "--force")
        .refused("is the problem file itself; give --out another name");
  }
}
