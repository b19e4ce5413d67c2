package coilwright.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;

/** One run of the program: what it returned and printed. */
record Run(int status, byte[] bytes, String err) {

  /** A spring that many wires of one grade can be. */
  static final String VALVE =
      """
      title: Drip-header valve
      spring: compression
      loads:
        - {length: 32 mm, force: 18 N, tolerance: 10 %}
        - {length: 22 mm, force: 45 N, tolerance: 10 %}
      envelope: {bore: 18 mm, rod: 8 mm, max_solid_length: 18 mm, diametral_clearance: 0.6 mm}
      make:
        materials: [music-wire]
        wire_sizes: [1.3 mm, 1.4 mm, 1.5 mm]
        ends: [squared-ground, squared]
      """;

  /** The same in a space that no spring fits. */
  static final String CRAMPED = VALVE.replace("max_solid_length: 18 mm", "max_solid_length: 3 mm");

  /** One spring that meets the loads of the valve. */
  static final String DESIGN =
      VALVE.substring(0, VALVE.indexOf("make:"))
          + """
          design:
            material: music-wire
            wire_diameter: 1.3 mm
            mean_diameter: 10.53 mm
            active_coils: 9.25
            free_length: 38.7 mm
            ends: squared-ground
          """;

  /** One whose wire is too thin. */
  static final String WEAK = DESIGN.replace("wire_diameter: 1.3 mm", "wire_diameter: 1.0 mm");

  static Run of(String... args) {
    return reading("", args);
  }

  static Run reading(String standardInput, String... args) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    byte[] in = standardInput.getBytes(StandardCharsets.UTF_8);
    int status = Program.run(new Terminal(new ByteArrayInputStream(in), out, err), args);
    return new Run(status, out.toByteArray(), err.toString(StandardCharsets.UTF_8));
  }

  /** The text of a problem file under {@code problems}. */
  static String demo(String name) {
    try {
      return Files.readString(Path.of("problems", name + ".yaml"));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Writes a problem file and returns its path. */
  static String file(Path folder, String name, String text) {
    try {
      return Files.writeString(folder.resolve(name), text).toString();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  String out() {
    return new String(bytes, StandardCharsets.UTF_8);
  }

  JsonNode json() {
    try {
      return new ObjectMapper().readTree(bytes);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** A result: on standard output, with nothing on standard error. */
  Run found(int wanted) {
    assertThat(err).isEmpty();
    assertThat(status).isEqualTo(wanted);
    assertThat(out()).endsWith("\n");
    return this;
  }

  /** A fault: on standard error, in words, with nothing on standard output. */
  Run fault(int wanted) {
    assertThat(err).endsWith("\n").doesNotContain("Exception:", "\tat ", "\nat ");
    assertThat(status).as(err).isEqualTo(wanted);
    assertThat(out()).isEmpty();
    return this;
  }

  Run refused(String... words) {
    fault(Status.REFUSED);
    assertThat(err).contains(words);
    return this;
  }
}
