package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.limit.Finding;
import coilwright.material.WireSize;
import coilwright.problem.ExtensionDesign;
import coilwright.problem.HookLength;
import coilwright.problem.HooksAsked;
import coilwright.problem.LimitName;
import coilwright.problem.LoopPlanes;
import coilwright.problem.Problem;
import coilwright.spring.ExtensionState;
import coilwright.spring.Hand;
import coilwright.spring.HookType;
import coilwright.spring.Method;
import coilwright.unit.Dimension;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

/** What the search for extension springs offers, refuses and holds them to. */
class ExtensionSearchTest {

  private static final double LBF = Dimension.FORCE.unit("lbf").orElseThrow().toInner(1);
  private static final double INCH = 25.4;
  private static final double MPSI = 1e6 * Dimension.STRESS.unit("psi").orElseThrow().toInner(1);

  /** 10 N at 60 mm and 30 N at 85 mm, one wire of 1.2 mm of a steel of 2000 MPa. */
  private static ExtensionDraft plain() {
    return new ExtensionDraft()
        .loads(0.8, 47.5, 60, 85)
        .own(GradeDraft.of("steel", 2000).grade())
        .sizes(1.2);
  }

  @Test
  void springsAreFoundWithTensionInTheirRange() {
    ExtensionWires wire = ExtensionWires.of(plain()).findFirst().orElseThrow();
    assertThat(wire.counts()).isNotEmpty();
    assertThat(wire.counts()).isEqualTo(wire.held());
  }

  /**
   * The textbook's spring 10-6 asked for a first load that its coils would have to push for: 1 lbf
   * at 1 in, where its rate leaves none of it to hold the coils together. No printed trial was at
   * hand, so that this one is constructed from a printed spring.
   */
  @Test
  void aNegativeInitialTensionIsRefusedWhateverTheFileSays() {
    double rate = 17.76 * LBF / INCH;
    ExtensionDraft draft =
        new ExtensionDraft()
            .loads(rate, INCH - LBF / rate, INCH, INCH + 4.25 * LBF / rate)
            .own(GradeDraft.of("drawn steel", 1825).moduli(11.5 * MPSI, 28.7 * MPSI).grade())
            .sizes(.035 * INCH)
            .with(ExtensionBound.FEWEST_COILS, 12)
            .with(ExtensionBound.MOST_COILS, 12.25)
            .anyTension();
    ExtensionWires wire = ExtensionWires.of(draft).findFirst().orElseThrow();
    ExtensionState trial = wire.family().at(12.17);
    assertThat(trial.spring().meanDiameter() / INCH).isBetween(.2129, .2132);
    assertThat(trial.initialTension() / LBF).isBetween(-2.3, -2.2);
    assertThat(names(wire.outcome().conflict().orElseThrow()))
        .containsExactlyInAnyOrder(LimitName.ACTIVE_COILS, LimitName.INITIAL_TENSION);
    assertThat(wire.outcome().ruledOutBy()).doesNotContain(LimitName.INITIAL_TENSION);
    Finding refused =
        wire.limits().stream()
            .filter(limit -> limit.name() == LimitName.INITIAL_TENSION)
            .map(limit -> limit.judge(trial))
            .findFirst()
            .orElseThrow();
    assertThat(refused.holds()).isFalse();
    assertThat(refused.bound()).isZero();
    assertThat(refused.slack() / LBF).isBetween(-2.3, -2.2);
  }

  /** A first load below the initial tension: the coils have not parted there. */
  @Test
  void aSpringLongerThanItsShortestLoadedLengthIsRefused() {
    ExtensionDraft draft = plain().loads(0.8, 37.5, 50, 75).sizes(1.9).anyTension();
    draft.without(ExtensionBound.LEAST_INDEX, ExtensionBound.GREATEST_INDEX);
    ExtensionWires wire = ExtensionWires.of(draft).findFirst().orElseThrow();
    assertThat(names(wire.outcome().conflict().orElseThrow()))
        .containsExactly(LimitName.FREE_LENGTH);
    assertThat(wire.outcome().ruledOutBy()).containsExactly(LimitName.FREE_LENGTH);
  }

  @Test
  void theHooksPlanesFixTheFractionOfACoil() {
    assertThat(fractions(LoopPlanes.IN_LINE)).containsExactlyInAnyOrder(0.0, 0.5);
    assertThat(fractions(LoopPlanes.RIGHT_ANGLE)).containsExactlyInAnyOrder(0.25, 0.75);
    assertThat(fractions(LoopPlanes.ANY)).containsExactlyInAnyOrder(0.0, 0.25, 0.5, 0.75);
    Problem whole = plain().coilStep(1).planes(LoopPlanes.IN_LINE).problem();
    assertThat(new ExtensionSearch().step(whole).size()).isEqualTo(1);
  }

  private static Set<Double> fractions(LoopPlanes planes) {
    return ExtensionWires.of(plain().planes(planes))
        .flatMap(wire -> wire.counts().stream())
        .map(coils -> coils % 1)
        .collect(Collectors.toSet());
  }

  @Test
  void hooksThatAreSofterThanTheRateLeaveNoSpring() {
    ExtensionDraft draft = plain().sizes(0.05, 1.2).loads(2000, 47.5, 60, 85);
    Problem problem = draft.problem();
    WireChoice choice = WireChoice.of(problem, Searched.CATALOGUE);
    Answer<ExtensionState> answer = new ExtensionSearch().search(problem, choice);
    assertThat(answer.wires()).isEqualTo(2);
    assertThat(answer.conflicts())
        .anySatisfy(
            conflict -> {
              assertThat(conflict.wire().diameter()).isEqualTo(0.05);
              assertThat(names(conflict)).containsExactly(LimitName.HOOKS);
            });
  }

  @Test
  void everyLimitOfTheProblemIsAskedOnce() {
    ExtensionDraft draft = plain().hookLength(HookLength.free());
    for (ExtensionBound bound : ExtensionBound.values()) {
      draft.with(bound, 10);
    }
    assertThat(limits(draft))
        .containsExactly(
            "spring index min",
            "spring index max",
            "active coils min",
            "active coils max",
            "bore max",
            "rod min",
            "outside diameter max",
            "inside diameter min",
            "free length max",
            "free length max",
            "surge frequency min",
            "initial tension min",
            "initial tension min",
            "initial tension max",
            "body stress max",
            "hook bending stress max",
            "hook torsion stress max",
            "hook length min",
            "extended length max",
            "pin min",
            "nominal load max");
    assertThat(limits(plain().anyTension().without(ExtensionBound.values())))
        .containsExactly("free length max", "initial tension min", "nominal load max");
  }

  private static List<String> limits(ExtensionDraft draft) {
    return new ExtensionSearch()
        .limits(draft.problem()).stream()
            .map(limit -> limit.name().text() + " " + limit.check().side().id())
            .toList();
  }

  @Test
  void whatIsNeverSwitchedOffIsNotRemovable() {
    List<String> fixed =
        new ExtensionSearch()
            .limits(plain().with(ExtensionBound.FREE_LENGTH, 60).problem()).stream()
                .filter(limit -> !limit.removable())
                .map(limit -> limit.name().text() + ": " + limit.check().definition())
                .toList();
    assertThat(fixed)
        .satisfiesExactly(
            slack -> assertThat(slack).startsWith("free length: inside the hooks, against the sh"),
            pushing -> assertThat(pushing).startsWith("initial tension: zero or more"),
            load -> assertThat(load).startsWith("nominal load"));
  }

  @Test
  void aGivenSpringIsJudgedByItsOwnInitialTension() {
    ExtensionDesign design =
        new ExtensionDesign(
            "steel",
            WireSize.explicit("1.2 mm", 1.2),
            9.5,
            31,
            6,
            new HooksAsked(
                List.of(HookType.FULL_LOOP),
                HookLength.of(9),
                0.5,
                0.25,
                LoopPlanes.ANY,
                OptionalDouble.empty()),
            Hand.EITHER,
            0);
    Problem problem = plain().method(Method.HANDBOOK).design(design).problem();
    SpringCheck<ExtensionState> check =
        SpringCheck.of(problem, new ExtensionSearch(), Searched.CATALOGUE);
    ExtensionState state = check.spring().orElseThrow().state();
    assertThat(state.initialTension()).isEqualTo(6);
    assertThat(state.freeLength()).isEqualTo(32 * 1.2 + 18);
    assertThat(state.forces()[0]).isEqualTo(6 + state.rate() * (60 - state.freeLength()));
    assertThat(check.spring().orElseThrow().failed()).containsExactly(LimitName.NOMINAL_LOAD);
  }

  private static List<LimitName> names(Conflict conflict) {
    return conflict.parts().stream().map(Conflict.Part::limit).toList();
  }
}
