package coilwright.problem;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import coilwright.spring.Hand;
import coilwright.spring.Kind;
import coilwright.spring.Method;
import coilwright.spring.TorquePoint;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Files of torsion springs that use much or little, read value by value. */
class TorsionFileTest {

  private static final OptionalDouble NONE = OptionalDouble.empty();

  static final String FULL =
      """
      title: Vent flap hinge
      spring: torsion
      units: inch
      loads:
        - angle: 30 deg
          force: 7.5 N
          arm: 20 mm
          tolerance: 10 %
        - angle: 120 deg
          torque: 600 N*mm
          tolerance: {plus: 30 N*mm, minus: 0.02 N*m}
      loading: closing
      rate: 5 N*mm/deg
      free_angle: 0 deg
      stroke: 90 deg
      springs_in_parallel: 2
      envelope:
        bore: 24 mm
        rod: 10 mm
        diametral_clearance: 0.4 mm
        max_outside_diameter: 22 mm
        min_inside_diameter: 11 mm
        max_body_length: 20 mm
      make:
        supply: en
        materials: [music-wire]
        exclude_materials: [hard-drawn]
        wire_sizes: [1.6 mm]
        legs: {first: 20 mm, second: 1 in, angle: 180 deg, at_load: 2}
        hand: right
        coating: {thickness: 8 um}
        diameter_step: 0.05 mm
      limits:
        spring_index: {max: 14}
        active_coils: {min: 2, max: 20}
        stress_basis: en-13906
        bending_stress_at_load: {max: 65 %}
        rate_constant: 11
      own_materials: [{id: coil-lot-2608, like: music-wire, tensile_strength: 1900 MPa}]
      rank: {by: cost, top: 5}
      """;

  private final Problem problem = Files.problem(FULL);
  private final TorsionAsked asked = problem.torsion().orElseThrow();

  @Test
  void theHeadAndWhatIsOfOtherKinds() {
    assertThat(problem.title()).isEqualTo("Vent flap hinge");
    assertThat(problem.kind()).isEqualTo(Kind.TORSION);
    assertThat(problem.units()).isEqualTo(UnitSystem.INCH);
    assertThat(problem.required()).isEmpty();
    assertThat(problem.overtravel()).isEmpty();
    assertThat(problem.seats()).isEmpty();
    assertThat(problem.extension()).isEmpty();
    assertThat(problem.facts().loads()).isEmpty();
    assertThat(problem.facts().springsInParallel()).isEqualTo(2);
    assertThat(problem.rankBy()).isEqualTo(RankBy.COST);
    assertThat(problem.top()).isEqualTo(5);
  }

  @Test
  void theLoadsAreOfTheGroupAndTheLineOfOneSpring() {
    assertThat(asked.closing()).isTrue();
    assertThat(asked.loads().get(0).point()).isEqualTo(point(30, 150));
    assertThat(asked.loads().get(0).tolerance()).contains(new Tolerance(15, 15));
    assertThat(asked.loads().get(1).point()).isEqualTo(point(120, 600));
    assertThat(asked.loads().get(1).tolerance()).contains(new Tolerance(30, 20));
    assertThat(asked.facts().rate().orElseThrow()).isCloseTo(900 / Math.PI, within(1e-12));
    assertThat(asked.facts().freeAngle()).hasValue(0);
    assertThat(asked.facts().stroke().orElseThrow()).isCloseTo(Math.PI / 2, within(1e-15));
    TorqueLine line = asked.line().orElseThrow();
    assertThat(line.rule()).isEqualTo("two loads at angles");
    assertThat(line.rate()).isCloseTo(450 / Math.PI, within(1e-12));
    assertThat(line.freeAngle().orElseThrow()).isCloseTo(0, within(1e-15));
    assertThat(line.loads()).containsExactly(point(30, 75), point(120, 300));
  }

  @Test
  void theSpace() {
    assertThat(problem.envelope())
        .isEqualTo(new Envelope(of(24), of(10), of(0.4), of(22), of(11), NONE, NONE));
    assertThat(asked.maxBodyLength()).hasValue(20);
  }

  @Test
  void whatMayBeMade() {
    assertThat(asked.legs()).isEqualTo(new LegsAsked(20, 25.4, of(Math.PI), 2));
    assertThat(problem.make().ends()).isEmpty();
    assertThat(problem.make().hand()).isEqualTo(Hand.RIGHT);
    assertThat(problem.make().coating()).isEqualTo(0.008);
    assertThat(problem.make().wireSizes()).hasSize(1);
    assertThat(problem.make().rounding().diameterStep()).isEqualTo(0.05);
    Problem stepped = Files.problem(Files.TORSION + "make: {coil_step: 0.125}\n");
    assertThat(stepped.make().coilStep()).isEqualTo(0.125);
  }

  @Test
  void theLimits() {
    assertThat(problem.limits().springIndex()).isEqualTo(new Band(of(5), of(14)));
    assertThat(problem.limits().activeCoils()).isEqualTo(new Band(of(2), of(20)));
    assertThat(problem.limits().method()).isEqualTo(Method.EN_13906);
    assertThat(problem.limits().buckling()).isEqualTo(BucklingRule.NONE);
    assertThat(problem.limits().stressAtLoad().judged()).isFalse();
    assertThat(asked.bendingStress()).isEqualTo(new StressLimit(true, of(0.65)));
    assertThat(asked.rateConstant()).isEqualTo(11);
  }

  @Test
  void theDefaults() {
    Problem plain = Files.problem(Files.TORSION);
    TorsionAsked usual = plain.torsion().orElseThrow();
    assertThat(usual.closing()).isTrue();
    assertThat(usual.legs()).isEqualTo(new LegsAsked(0, 0, NONE, 1));
    assertThat(usual.maxBodyLength()).isEmpty();
    assertThat(usual.bendingStress()).isEqualTo(new StressLimit(true, NONE));
    assertThat(usual.rateConstant()).isEqualTo(10.8);
    assertThat(usual.facts()).isEqualTo(new TorqueFacts(NONE, NONE, NONE));
    assertThat(plain.limits()).isEqualTo(DesignLimits.defaults(Kind.TORSION));
    assertThat(plain.limits().activeCoils()).isEqualTo(new Band(of(3), of(60)));
    Problem standard = Files.problem(Files.TORSION + "limits: {stress_basis: en-13906}\n");
    assertThat(standard.torsion().orElseThrow().rateConstant())
        .isCloseTo(10.185916357881302, within(1e-14));
  }

  @Test
  void inchesMeanTheSame() {
    String inch =
        """
        spring: torsion
        loads:
          - {angle: 0.5235987755982988 rad, torque: 1.327611 lbf*in}
          - {angle: 120 deg, force: 6.744268 lbf, arm: 0.7874016 in}
        rate: 0.04425371 lbf*in/deg
        """;
    TorqueLine line = Files.problem(inch).torsion().orElseThrow().line().orElseThrow();
    assertThat(line.rate()).isCloseTo(900 / Math.PI, within(1e-4));
    assertThat(line.loads().get(0).torque().orElseThrow()).isCloseTo(150, within(1e-4));
    assertThat(line.loads().get(1).torque().orElseThrow()).isCloseTo(600, within(1e-3));
    assertThat(line.freeAngle().orElseThrow()).isCloseTo(0, within(1e-5));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "[{angle: 120 deg, torque: 600 N*mm}, {angle: 30 deg, torque: 150 N*mm}]||two loads at angles",
        "[{angle: 30 deg, torque: 150 N*mm}]|rate: 5 N*mm/deg|a load and the rate",
        "[{angle: 30 deg, torque: 150 N*mm}]|free_angle: 0 rad|a load and the free angle",
        "[{angle: 30 deg, torque: 150 N*mm}]|stroke: 30 deg|a load and the stroke from the free angle to the torque",
        "[{angle: 30 deg, torque: 150 N*mm}, {torque: 600 N*mm}]|stroke: 90 deg|a load and the stroke between the torques",
        "[{angle: 30 deg}]|{rate: 5 N*mm/deg, free_angle: 0 deg}|the rate and the free angle",
        "[{angle: 30 deg, torque: 150 N*mm}, {angle: 120 deg, torque: 600 N*mm}]|free_angle: 0.1 deg|two loads at angles",
      })
  void factsFixTheLine(String loads, String facts, String rule) {
    TorqueLine line = line("closing", loads, facts);
    assertThat(line.rule()).isEqualTo(rule);
    assertThat(line.rate()).isCloseTo(900 / Math.PI, within(1e-10));
    assertThat(line.freeAngle().orElseThrow()).isCloseTo(0, within(1e-12));
    for (TorquePoint load : line.loads()) {
      assertThat(load.torque().orElseThrow())
          .isCloseTo(line.rate() * load.angle().orElseThrow(), within(1e-9));
    }
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "[{angle: -30 deg, torque: 150 N*mm}, {angle: -120 deg, torque: 600 N*mm}]|",
        "[{angle: -30 deg, torque: 150 N*mm}]|rate: 5 N*mm/deg",
        "[{angle: -120 deg, torque: 600 N*mm}, {angle: -60 deg}]|free_angle: 0 deg",
        "[{angle: -120 deg}, {torque: 150 N*mm}]|{rate: 5 N*mm/deg, free_angle: 0 deg}",
      })
  void anOpeningSpringTurnsTheOtherWay(String loads, String facts) {
    TorqueLine line = line("opening", loads, facts);
    assertThat(line.rate()).isCloseTo(900 / Math.PI, within(1e-10));
    assertThat(line.freeAngle().orElseThrow()).isCloseTo(0, within(1e-12));
    for (TorquePoint load : line.loads()) {
      assertThat(load.torque().orElseThrow())
          .isCloseTo(-line.rate() * load.angle().orElseThrow(), within(1e-9));
    }
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "[{torque: 150 N*mm}, {torque: 600 N*mm}]|stroke: 90 deg|the stroke between the torques",
        "[{torque: 600 N*mm}]|stroke: 120 deg|the stroke from the free angle to the torque",
        "[{torque: 150 N*mm}, {force: 30 N, arm: 2 cm}]|rate: 5 N*mm/deg|the rate",
      })
  void theAnglesMayBeOpen(String loads, String fact, String rule) {
    TorqueLine line = line("closing", loads, fact);
    assertThat(line.rule()).isEqualTo(rule);
    assertThat(line.rate()).isCloseTo(900 / Math.PI, within(1e-10));
    assertThat(line.freeAngle()).isEmpty();
    assertThat(line.loads()).allMatch(load -> load.angle().isEmpty());
  }

  private static TorqueLine line(String loading, String loads, String facts) {
    String lines = facts == null ? "" : facts.replaceAll("[{}]", "").replace(", ", "\n");
    String text = "spring: torsion\nloading: " + loading + "\nloads: " + loads + "\n" + lines;
    return Files.problem(text + "\n").torsion().orElseThrow().line().orElseThrow();
  }

  private static final String DESIGN =
      """
      spring: torsion
      loads: [{angle: 60 deg}, {torque: 600 N*mm}]
      loading: opening
      design:
        material: music-wire
        wire_diameter: 1.8 mm
        inside_diameter: 14.2 mm
        body_coils: 6.5
        legs: {first: 20 mm, second: 1 in, angle: 90 deg, at_load: 2}
        hand: left
        coating: {thickness: 8 um}
      """;

  @Test
  void aSpringToCheck() {
    Problem checked = Files.checked(DESIGN);
    TorsionDesign design = (TorsionDesign) checked.design().orElseThrow();
    assertThat(design.material()).isEqualTo("music-wire");
    assertThat(design.wireSize().diameter()).isEqualTo(1.8);
    assertThat(design.meanDiameter()).isEqualTo(16);
    assertThat(design.coils()).isEqualTo(6.5);
    assertThat(design.legs()).isEqualTo(new LegsAsked(20, 25.4, of(Math.PI / 2), 2));
    assertThat(design.hand()).isEqualTo(Hand.LEFT);
    assertThat(design.coating()).isEqualTo(0.008);
    assertThat(checked.torsion().orElseThrow().legs()).isEqualTo(design.legs());
  }

  @Test
  void aCheckNeedsNoLine() {
    TorsionAsked checked = Files.checked(DESIGN).torsion().orElseThrow();
    assertThat(checked.closing()).isFalse();
    assertThat(checked.line()).isEmpty();
    assertThat(checked.loads().get(0).point().torque()).isEmpty();
    assertThat(checked.loads().get(1).point()).isEqualTo(new TorquePoint(NONE, of(600)));
  }

  private static TorquePoint point(double degrees, double torque) {
    return new TorquePoint(of(degrees * (Math.PI / 180)), of(torque));
  }

  private static OptionalDouble of(double value) {
    return OptionalDouble.of(value);
  }
}
