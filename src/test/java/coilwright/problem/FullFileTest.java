package coilwright.problem;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.material.Supply;
import coilwright.material.WireSeries;
import coilwright.spring.EndType;
import coilwright.spring.Hand;
import coilwright.spring.LoadPoint;
import coilwright.spring.Method;
import coilwright.spring.Rounding;
import coilwright.spring.Seating;
import coilwright.spring.StressCorrection;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** Files that use much or little, read value by value. */
class FullFileTest {

  static final String FULL =
      """
      title: Greenhouse vent latch
      spring: compression
      units: metric
      loads:
        - length: 32 mm
          force: 18 N
          tolerance: 10 %
        - length: 22 mm
          force: 45 N
          tolerance: {plus: 3 N, minus: 2 N}
      rate: 2.7 N/mm
      free_length: 38.67 mm
      springs_in_parallel: 2
      envelope:
        bore: 16 mm
        rod: 8 mm
        diametral_clearance: 0.4 mm
        max_outside_diameter: 15.5 mm
        min_inside_diameter: 8.5 mm
        max_free_length: 45 mm
        max_solid_length: 18 mm
      seats: fixed-pinned
      make:
        supply: any
        materials: [music-wire, coil-lot-2608]
        exclude_materials: hard-drawn
        wire_series: [metric, music-wire-gauge]
        ends: squared
        hand: left
        set_removed: false
        coil_step: 0.5
        diameter_step: 0.05 mm
        length_step: 0 mm
      limits:
        spring_index: {max: 14}
        active_coils: none
        pitch_angle: {max: 10 deg}
        clash_allowance: 10 %
        stress_basis: handbook
        stress_correction: wahl
        stress_at_load: {max: 40 %}
        stress_at_solid: none
        buckling: at-solid
        surge_frequency: {min: 200 Hz}
      own_materials:
        - id: coil-lot-2608
          like: music-wire
          tensile_strength: 1900 MPa
      rank: {by: robust, top: 3}
      """;

  private final Problem problem = Files.problem(FULL);

  @Test
  void theHead() {
    assertThat(problem.title()).isEqualTo("Greenhouse vent latch");
    assertThat(problem.units()).isEqualTo(UnitSystem.METRIC);
    assertThat(problem.seats()).contains(Seating.FIXED_PINNED);
    assertThat(problem.rankBy()).isEqualTo(RankBy.ROBUST);
    assertThat(problem.top()).isEqualTo(3);
    assertThat(problem.design()).isEmpty();
    assertThat(problem.ownMaterials()).hasSize(1);
  }

  @Test
  void theLoadsAreOfTheGroupAndTheRequirementOfOneSpring() {
    assertThat(problem.facts())
        .isEqualTo(
            new LoadFacts(
                List.of(load(32, 18, new Tolerance(1.8, 1.8)), load(22, 45, new Tolerance(3, 2))),
                OptionalDouble.of(2.7),
                OptionalDouble.of(38.67),
                OptionalDouble.empty(),
                2));
    assertThat(problem.required())
        .contains(
            new Requirement(
                1.35,
                of(32 + 18 / 2.7),
                "two loads at lengths",
                List.of(LoadPoint.at(32, 9), LoadPoint.at(22, 22.5))));
  }

  @Test
  void theSpace() {
    assertThat(problem.envelope())
        .isEqualTo(new Envelope(of(16), of(8), of(0.4), of(15.5), of(8.5), of(45), of(18)));
  }

  @Test
  void whatMayBeMade() {
    assertThat(problem.make())
        .isEqualTo(
            new Make(
                Supply.ANY,
                List.of("music-wire", "coil-lot-2608"),
                false,
                List.of("hard-drawn"),
                List.of(WireSeries.METRIC, WireSeries.MUSIC_WIRE_GAUGE),
                List.of(),
                List.of(EndType.SQUARED),
                Hand.LEFT,
                false,
                0,
                0.5,
                new Rounding(0.05, 0, 0.05, 0)));
  }

  @Test
  void theLimits() {
    OptionalDouble none = OptionalDouble.empty();
    assertThat(problem.limits())
        .isEqualTo(
            new DesignLimits(
                new Band(of(5), of(14)),
                new Band(none, none),
                of(Math.toRadians(10)),
                of(0.1),
                false,
                Method.HANDBOOK,
                StressCorrection.WAHL,
                new StressLimit(true, of(0.4)),
                new StressLimit(false, none),
                BucklingRule.AT_SOLID,
                of(200)));
  }

  @Test
  void theDefaults() {
    Problem plain = Files.problem(Files.LOADS);
    OptionalDouble none = OptionalDouble.empty();
    List<String> noIds = Collections.emptyList();
    assertThat(plain.title()).isEmpty();
    assertThat(plain.units()).isEqualTo(UnitSystem.METRIC);
    assertThat(plain.seats()).isEmpty();
    assertThat(plain.envelope()).isEqualTo(new Envelope(none, none, none, none, none, none, none));
    assertThat(plain.make())
        .isEqualTo(
            new Make(
                Supply.EN,
                noIds,
                false,
                noIds,
                List.of(),
                List.of(),
                List.of(EndType.SQUARED_GROUND, EndType.SQUARED),
                Hand.EITHER,
                false,
                0,
                0.25,
                new Rounding(0.01, 0.1, 0.001, 0.01)));
    assertThat(plain.ownMaterials()).isEmpty();
    assertThat(plain.rankBy()).isEqualTo(RankBy.MASS);
    assertThat(plain.top()).isEqualTo(10);
  }

  @Test
  void inchFilesHaveOtherDefaults() {
    Make make = Files.problem("units: inch\n" + Files.LOADS).make();
    assertThat(make.supply()).isEqualTo(Supply.US);
    assertThat(make.rounding().diameterStep()).isEqualTo(0.0005 * 25.4);
    assertThat(make.rounding().lengthStep()).isEqualTo(0.005 * 25.4);
    assertThat(make.rounding().smallDiameterStep()).isEqualTo(0.0005 * 25.4 / 10);
    assertThat(make.rounding().smallLengthStep()).isEqualTo(0.005 * 25.4 / 10);
  }

  @Test
  void aSpringToCheck() {
    CompressionDesign design = design(Files.DESIGN);
    assertThat(design.material()).isEqualTo("music-wire");
    assertThat(design.wireSize().label()).isEqualTo("1.4 mm");
    assertThat(design.wireSize().diameter()).isEqualTo(1.4);
    assertThat(design.meanDiameter()).isEqualTo(12.2);
    assertThat(design.coils()).isEqualTo(8);
    assertThat(design.freeLength()).isEqualTo(38.7);
    assertThat(design.ends()).isEqualTo(EndType.SQUARED_GROUND);
    assertThat(design.hand()).isEqualTo(Hand.EITHER);
    assertThat(Files.checked(Files.DESIGN).required()).isEmpty();
  }

  @Test
  void aSpringToCheckByItsOtherDiametersAndAllItsCoils() {
    String outside = Files.DESIGN.replace("mean_diameter: 12.2 mm", "outside_diameter: 13.6 mm");
    String inside = Files.DESIGN.replace("mean_diameter: 12.2 mm", "inside_diameter: 10.8 mm");
    String total = Files.DESIGN.replace("active_coils: 8", "total_coils: 10.5");
    assertThat(Files.checked(outside).design().orElseThrow().meanDiameter()).isEqualTo(13.6 - 1.4);
    assertThat(Files.checked(inside).design().orElseThrow().meanDiameter()).isEqualTo(10.8 + 1.4);
    assertThat(Files.checked(total).design().orElseThrow().coils()).isEqualTo(8.5);
  }

  private static LoadAsked load(double length, double force, Tolerance tolerance) {
    return new LoadAsked(of(length), of(force), Optional.of(tolerance));
  }

  private static OptionalDouble of(double value) {
    return OptionalDouble.of(value);
  }

  private static CompressionDesign design(String file) {
    return (CompressionDesign) Files.checked(file).design().orElseThrow();
  }
}
