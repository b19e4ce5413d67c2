package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.material.WireSeries;
import coilwright.problem.Problem;
import coilwright.problem.ProblemReader;
import coilwright.problem.Purpose;
import coilwright.problem.Reading;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/**
 * The search against a scan of every practical coil count, over everything the catalogue holds:
 * every grade of either supply in every size of every series, in whole coils.
 */
class WholeCatalogueTest {

  private static final String FILE =
      """
      spring: compression
      loads:
        - {length: 32 mm, force: 18 N}
        - {length: 22 mm, force: 45 N}
      envelope: {bore: 18 mm, rod: 8 mm, diametral_clearance: 0.6 mm, max_solid_length: 18 mm}
      make:
        supply: any
        materials: all
        wire_series: [%s]
        ends: [squared-ground]
        coil_step: 1
      """;

  private static final List<Searched> WIRES = Searched.wiresOf("catalogue", problem()).toList();

  @Test
  void everyWireHasTheCountsThatAScanFinds() {
    for (Searched wire : WIRES) {
      assertThat(wire.counts()).as(wire.toString()).isEqualTo(EveryCount.of(wire).held());
    }
  }

  @Test
  void everyGradeIsTriedAndManyWiresFit() {
    assertThat(WIRES.stream().map(wire -> wire.family().wire().grade().id()).distinct())
        .containsExactlyInAnyOrderElementsOf(Searched.CATALOGUE.gradeIds());
    assertThat(WIRES).hasSizeGreaterThan(1000);
    assertThat(WIRES.stream().filter(wire -> !wire.failed())).hasSizeGreaterThan(50);
  }

  private static Problem problem() {
    String series =
        Stream.of(WireSeries.values()).map(WireSeries::id).collect(Collectors.joining(", "));
    byte[] file = FILE.replace("%s", series).getBytes(StandardCharsets.UTF_8);
    Reading reading = ProblemReader.read(file, Purpose.SHORTLIST, Searched.CATALOGUE);
    assertThat(reading.faults()).isEmpty();
    return reading.problem().orElseThrow();
  }
}
