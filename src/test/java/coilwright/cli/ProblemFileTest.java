package coilwright.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A problem file that cannot be read or is wrong is status 2, with every fault in words. */
class ProblemFileTest {

  @TempDir private Path folder;

  @Test
  void filesThatCannotBeRead() {
    Run.of("shortlist", "no-such.yaml")
        .refused("no-such.yaml: no such file; give the path of a problem file, or - for standard");
    Run.of("check", folder.toString()).refused(folder + ": is a folder; give the path");
    Run.of("shortlist", "").refused("FILE: its name is empty; give the path");
    Run.of("shortlist", "@x").refused("@x: no such file");
    Run.of("shortlist", "--", "-x").refused("-x: no such file");
    Run.of("shortlist", "a\0b").refused("a b: ");
  }

  @Test
  void filesThatAreTooLarge() {
    String comment = "# large\n".repeat(1 << 17);
    Run.reading(comment + "#", "shortlist", "-").refused("standard input: larger than 1 MiB");
    Run.reading(comment, "shortlist", "-").refused("standard input: file");
  }

  @Test
  void filesThatAreNoProblem() throws IOException {
    Run.reading("", "shortlist", "-").refused("standard input: file", "empty");
    Run.reading("a: [", "shortlist", "-").refused("standard input: file (line 1)");
    Run.reading("{\"a\": ", "shortlist", "-").refused("not readable as JSON");
    Path bytes = Files.write(folder.resolve("latin.yaml"), new byte[] {'a', ':', (byte) 0xE4});
    Run.of("shortlist", bytes.toString()).refused(bytes + ": file (line 1): ", "not UTF-8");
  }

  @Test
  void everyFaultIsOneLineWithTheFilesName() {
    String wrong = Run.VALVE.replace("bore: 18 mm", "bor: 18 mm").replace("18 N", "18");
    String file = Run.file(folder, "wrong.yaml", wrong);
    Run.of("shortlist", file)
        .refused(
            file + ": loads[0].force (line 4): ",
            file + ": envelope.bor (line 6): ",
            "did you mean bore?");
  }

  @Test
  void contradictions() {
    refused("force: 18 N", "force: 45 N", "loads");
    refused("length: 22 mm", "length: 32 mm", "loads");
    refused("rod: 8 mm", "rod: 19 mm", "envelope");
    refused("envelope:", "rate: 3 N/mm\nenvelope:", "rate");
    String thick = Run.DESIGN.replace("wire_diameter: 1.3 mm", "wire_diameter: 11 mm");
    Run.reading(thick, "check", "-").refused("standard input: design");
  }

  private static void refused(String piece, String replacement, String place) {
    Run.reading(Run.VALVE.replace(piece, replacement), "shortlist", "-")
        .refused("standard input: " + place);
  }
}
