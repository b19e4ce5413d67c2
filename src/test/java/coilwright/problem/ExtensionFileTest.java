package coilwright.problem;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import coilwright.spring.Hand;
import coilwright.spring.HookType;
import coilwright.spring.Kind;
import coilwright.spring.LoadPoint;
import coilwright.spring.Method;
import coilwright.spring.StressCorrection;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Files of extension springs that use much or little, read value by value. */
class ExtensionFileTest {

  private static final OptionalDouble NONE = OptionalDouble.empty();

  static final String FULL =
      """
      title: Gate latch return
      spring: extension
      units: metric
      loads:
        - length: 50 mm
          force: 18 N
          tolerance: 10 %
        - length: 65 mm
          force: 45 N
          tolerance: {plus: 3 N, minus: 2 N}
      rate: 1.8 N/mm
      free_length: 46 mm
      stroke: 15 mm
      overtravel: {length: 68 mm}
      springs_in_parallel: 2
      envelope:
        bore: 16 mm
        rod: 4 mm
        diametral_clearance: 0.4 mm
        max_outside_diameter: 15.5 mm
        min_inside_diameter: 5 mm
        max_free_length: 48 mm
        max_extended_length: 70 mm
        pin: 6 mm
      make:
        supply: us
        materials: [music-wire]
        exclude_materials: [hard-drawn]
        wire_series: [metric]
        hooks: [side-loop, extended-hook]
        hook_length: free
        hook_bend_radius: 0.45
        hook_side_radius: 0.3
        loop_planes: in-line
        hook_active_coils: 0.25
        hand: left
        coating: {thickness: 8 um}
        coil_step: 1.5
        diameter_step: 0.05 mm
        length_step: 0.2 mm
      limits:
        spring_index: {min: 4}
        active_coils: {max: 80}
        stress_basis: en-13906
        stress_correction: wahl
        initial_tension: any
        stress_in_body: {max: 40 %}
        hook_bending_stress: {max: 70 %}
        hook_torsion_stress: none
        surge_frequency: {min: 150 Hz}
      own_materials: [{id: coil-lot-2608, like: music-wire, tensile_strength: 1900 MPa}]
      rank: {by: margin, top: 4}
      """;

  /** The same problem in inches and pounds. */
  private static final String INCH =
      FULL.replace("50 mm", "1.968503937007874 in")
          .replace("65 mm", "2.559055118110236 in")
          .replace("18 N", "4.046561 lbf")
          .replace("45 N", "10.116402 lbf")
          .replace("1.8 N/mm", "10.278 lbf/in")
          .replace("46 mm", "1.811023622047244 in")
          .replace("15 mm", "0.5905511811023622 in")
          .replace("6 mm", "0.2362204724409449 in")
          .replace("70 mm", "2.755905511811024 in")
          .replace("68 mm", "2.677165354330709 in")
          .replace("150 Hz", "0.15 kHz");

  private final Problem problem = Files.problem(FULL);
  private final ExtensionAsked asked = problem.extension().orElseThrow();

  @Test
  void theHeadAndWhatIsOfOtherKinds() {
    assertThat(problem.title()).isEqualTo("Gate latch return");
    assertThat(problem.kind()).isEqualTo(Kind.EXTENSION);
    assertThat(problem.required()).isEmpty();
    assertThat(problem.overtravel()).hasValue(68);
    assertThat(problem.seats()).isEmpty();
    assertThat(problem.torsion()).isEmpty();
    assertThat(problem.design()).isEmpty();
    assertThat(problem.ownMaterials()).hasSize(1);
    assertThat(problem.rankBy()).isEqualTo(RankBy.MARGIN);
    assertThat(problem.top()).isEqualTo(4);
  }

  @Test
  void theLoadsAreOfTheGroupAndTheLineOfOneSpring() {
    assertThat(problem.facts())
        .isEqualTo(
            new LoadFacts(
                List.of(
                    new LoadAsked(of(50), of(18), Optional.of(new Tolerance(1.8, 1.8))),
                    new LoadAsked(of(65), of(45), Optional.of(new Tolerance(3, 2)))),
                of(1.8),
                of(46),
                of(15),
                2));
    assertThat(asked.line())
        .contains(
            new TensionLine(
                0.9,
                of(40),
                "two loads at lengths",
                List.of(LoadPoint.at(50, 9), LoadPoint.at(65, 22.5))));
    assertThat(asked.freeLength()).hasValue(46);
  }

  @Test
  void theSpace() {
    assertThat(problem.envelope())
        .isEqualTo(new Envelope(of(16), of(4), of(0.4), of(15.5), of(5), of(48), NONE));
    assertThat(asked.maxExtendedLength()).hasValue(70);
    assertThat(asked.pin()).hasValue(6);
  }

  @Test
  void whatMayBeMade() {
    Make make = problem.make();
    assertThat(make.ends()).isEmpty();
    assertThat(make.setRemoved()).isFalse();
    assertThat(make.materials()).containsExactly("music-wire");
    assertThat(make.excludeMaterials()).containsExactly("hard-drawn");
    assertThat(make.hand()).isEqualTo(Hand.LEFT);
    assertThat(make.coating()).isEqualTo(0.008);
    assertThat(make.coilStep()).isEqualTo(1.5);
    assertThat(make.rounding().diameterStep()).isEqualTo(0.05);
    assertThat(make.rounding().lengthStep()).isEqualTo(0.2);
    assertThat(asked.hooks())
        .isEqualTo(
            new HooksAsked(
                List.of(HookType.SIDE_LOOP, HookType.EXTENDED_HOOK),
                HookLength.free(),
                0.45,
                0.3,
                LoopPlanes.IN_LINE,
                of(0.25)));
  }

  @Test
  void theLimits() {
    assertThat(problem.limits())
        .isEqualTo(
            new DesignLimits(
                new Band(of(4), of(12)),
                new Band(of(3), of(80)),
                NONE,
                NONE,
                false,
                Method.EN_13906,
                StressCorrection.WAHL,
                new StressLimit(false, NONE),
                new StressLimit(false, NONE),
                BucklingRule.NONE,
                of(150)));
    assertThat(asked.preferredTension()).isFalse();
    assertThat(asked.stressInBody()).isEqualTo(new StressLimit(true, of(0.4)));
    assertThat(asked.hookBending()).isEqualTo(new StressLimit(true, of(0.7)));
    assertThat(asked.hookTorsion()).isEqualTo(new StressLimit(false, NONE));
  }

  @Test
  void inchesMeanTheSame() {
    Problem read = Files.problem(INCH);
    assertThat(read.overtravel().orElseThrow()).isCloseTo(68, within(1e-9));
    assertThat(read.limits().minSurgeFrequency()).hasValue(150);
    ExtensionAsked inch = read.extension().orElseThrow();
    TensionLine line = inch.line().orElseThrow();
    assertThat(line.rate()).isCloseTo(0.9, within(1e-6));
    assertThat(line.zeroForceLength().orElseThrow()).isCloseTo(40, within(1e-5));
    assertThat(line.loads().get(1).length().orElseThrow()).isCloseTo(65, within(1e-9));
    assertThat(inch.freeLength().orElseThrow()).isCloseTo(46, within(1e-9));
    assertThat(inch.pin().orElseThrow()).isCloseTo(6, within(1e-9));
    assertThat(inch.maxExtendedLength().orElseThrow()).isCloseTo(70, within(1e-9));
    assertThat(inch.hooks()).isEqualTo(asked.hooks());
  }

  @Test
  void theDefaults() {
    Problem plain = Files.problem(Files.EXTENSION);
    ExtensionAsked usual = plain.extension().orElseThrow();
    StressLimit ofTheBasis = new StressLimit(true, NONE);
    assertThat(usual.hooks())
        .isEqualTo(
            new HooksAsked(
                List.of(HookType.FULL_LOOP),
                HookLength.natural(),
                0.5,
                0.25,
                LoopPlanes.ANY,
                NONE));
    assertThat(usual.preferredTension()).isTrue();
    assertThat(usual.stressInBody()).isEqualTo(ofTheBasis);
    assertThat(usual.hookBending()).isEqualTo(ofTheBasis);
    assertThat(usual.hookTorsion()).isEqualTo(ofTheBasis);
    assertThat(usual.maxExtendedLength()).isEmpty();
    assertThat(usual.pin()).isEmpty();
    assertThat(plain.limits().activeCoils()).isEqualTo(new Band(of(3), NONE));
    assertThat(plain.limits()).isEqualTo(DesignLimits.defaults(Kind.EXTENSION));
    assertThat(plain.overtravel()).isEmpty();
    assertThat(plain.make().coilStep()).isEqualTo(0.25);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "[{length: 65 mm, force: 45 N}, {length: 50 mm, force: 18 N}]||two loads at lengths",
        "[{length: 50 mm, force: 18 N}]|rate: 1.8 N/mm|a load and the rate",
        "[{length: 50 mm, force: 18 N}, {force: 45 N}]|stroke: 15 mm|a load and the stroke between the forces",
        "[{length: 50 mm, force: 18 N}, {length: 65 mm}]|rate: 1.8 N/mm|a load and the rate",
        "[{length: 50 mm, force: 18 N}, {length: 65 mm, force: 45 N}]|stroke: 15.01 mm|two loads at lengths",
      })
  void factsFixTheLine(String loads, String fact, String rule) {
    TensionLine line = line(loads, fact);
    assertThat(line.rule()).isEqualTo(rule);
    assertThat(line.rate()).isCloseTo(1.8, within(1e-12));
    assertThat(line.zeroForceLength().orElseThrow()).isCloseTo(40, within(1e-12));
    for (LoadPoint load : line.loads()) {
      assertThat(load.force().orElseThrow())
          .isCloseTo(1.8 * (load.length().orElseThrow() - 40), within(1e-12));
    }
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "[{force: 18 N}, {force: 45 N}]|stroke: 15 mm|the stroke between the forces",
        "[{force: 18 N}, {force: 45 N}]|rate: 1.8 N/mm|the rate",
        "[{force: 45 N}]|rate: 1.8 N/mm|the rate",
      })
  void theLengthsMayBeOpen(String loads, String fact, String rule) {
    TensionLine line = line(loads, fact);
    assertThat(line.rule()).isEqualTo(rule);
    assertThat(line.rate()).isCloseTo(1.8, within(1e-12));
    assertThat(line.zeroForceLength()).isEmpty();
    assertThat(line.loads()).allMatch(load -> load.length().isEmpty());
    assertThat(line.loads()).allMatch(load -> load.force().isPresent());
  }

  private static TensionLine line(String loads, String fact) {
    String text = "spring: extension\nloads: " + loads + "\n" + (fact == null ? "" : fact) + "\n";
    return Files.problem(text).extension().orElseThrow().line().orElseThrow();
  }

  @Test
  void anOvertravelIsReadWhereLengthsAreOpenAndForACheck() {
    String open =
        "spring: extension\nloads: [{force: 18 N}, {force: 45 N}]\nrate: 1.8 N/mm\n"
            + "overtravel: {length: 2 in}\n";
    assertThat(Files.problem(open).overtravel()).hasValue(50.8);
    assertThat(Files.checked(DESIGN + "overtravel: {length: 60.1 mm}\n").overtravel())
        .hasValue(60.1);
  }

  @Test
  void aHookLengthMayBeGiven() {
    Problem given = Files.problem(Files.EXTENSION + "make: {hook_length: 0.5 in}\n");
    assertThat(given.extension().orElseThrow().hooks().length()).isEqualTo(HookLength.of(12.7));
  }

  @Test
  void aFreeLengthWithoutInitialTensionIsOnTheLine() {
    Problem none =
        Files.problem(Files.EXTENSION + "free_length: 40 mm\nmake: {hook_length: free}\n");
    assertThat(none.extension().orElseThrow().freeLength()).hasValue(40);
  }

  private static final String DESIGN =
      """
      spring: extension
      loads: [{length: 60 mm}, {force: 20 N}]
      springs_in_parallel: 2
      design:
        material: music-wire
        wire_diameter: 1.2 mm
        outside_diameter: 10.2 mm
        body_coils: 21.5
        initial_tension: 2 lbf
        hooks: half-loop
        hook_length: 6 mm
        hook_bend_radius: 0.4
        hook_side_radius: 0.2
        hook_active_coils: 0.1
        hand: right
        coating: {thickness: 8 um}
      """;

  @Test
  void aSpringToCheck() {
    Problem checked = Files.checked(DESIGN);
    ExtensionDesign design = (ExtensionDesign) checked.design().orElseThrow();
    assertThat(design.material()).isEqualTo("music-wire");
    assertThat(design.wireSize().diameter()).isEqualTo(1.2);
    assertThat(design.meanDiameter()).isEqualTo(10.2 - 1.2);
    assertThat(design.coils()).isEqualTo(21.5);
    assertThat(design.initialTension()).isCloseTo(8.896443230521, within(1e-12));
    assertThat(design.hand()).isEqualTo(Hand.RIGHT);
    assertThat(design.coating()).isEqualTo(0.008);
    assertThat(design.setRemoved()).isFalse();
    assertThat(design.hooks())
        .isEqualTo(
            new HooksAsked(
                List.of(HookType.HALF_LOOP), HookLength.of(6), 0.4, 0.2, LoopPlanes.ANY, of(0.1)));
    assertThat(checked.extension().orElseThrow().hooks()).isEqualTo(design.hooks());
  }

  @Test
  void aCheckNeedsNoLine() {
    Problem checked = Files.checked(DESIGN);
    assertThat(checked.extension().orElseThrow().line()).isEmpty();
    assertThat(checked.facts().springsInParallel()).isEqualTo(2);
    assertThat(checked.facts().loads())
        .containsExactly(
            new LoadAsked(of(60), NONE, Optional.empty()),
            new LoadAsked(NONE, of(20), Optional.empty()));
  }

  private static OptionalDouble of(double value) {
    return OptionalDouble.of(value);
  }
}
