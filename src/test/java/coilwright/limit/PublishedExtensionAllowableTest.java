package coilwright.limit;

import static coilwright.published.Published.Column.CLASS;
import static coilwright.published.Published.Column.QUANTITY;
import static coilwright.published.Published.Column.VALUE;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import coilwright.material.AllowableClass;
import coilwright.material.Wire;
import coilwright.material.WireSize;
import coilwright.problem.StressLimit;
import coilwright.published.Published;
import coilwright.source.Evidence;
import coilwright.spring.ExtensionDuty;
import coilwright.spring.ExtensionSpring;
import coilwright.spring.ExtensionState;
import coilwright.spring.HookType;
import coilwright.spring.Hooks;
import coilwright.spring.InitialTension;
import coilwright.spring.LoadPoint;
import coilwright.spring.Method;
import coilwright.spring.SampleWire;
import coilwright.spring.StressCorrection;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The static shares of tensile strength of extension springs against published ones. */
class PublishedExtensionAllowableTest {

  private static final OptionalDouble NONE = OptionalDouble.empty();
  private static final double FORCE = 100;

  static Stream<Published> shares() {
    return Published.ofGroup("extension allowables", CLASS);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("shares")
  void theBoundIsAsPublished(Published row) {
    String[] words = row.text(QUANTITY).split(" ", 2);
    ExtensionPlace place = ExtensionPlace.valueOf(words[0]);
    boolean en = row.text(QUANTITY).endsWith("EN");
    boolean high = row.text(QUANTITY).endsWith("high tension");
    Finding finding =
        limit(place, en ? Method.EN_13906 : Method.HANDBOOK, NONE)
            .judge(state(AllowableClass.valueOf(row.text(CLASS)), HookType.FULL_LOOP, high));
    assertThat(finding.bound())
        .isCloseTo(row.number(VALUE) / 100 * SampleWire.STRENGTH, row.closeness());
    assertThat(finding.source().evidence()).isEqualTo(Evidence.SEEN);
  }

  @Test
  void eachPlaceIsHeldToItsOwnStress() {
    ExtensionState state = state(AllowableClass.COLD_DRAWN_CARBON, HookType.FULL_LOOP, false);
    for (ExtensionPlace place : ExtensionPlace.values()) {
      double stress = limit(place, Method.HANDBOOK, NONE).judge(state).value();
      assertThat(stress).isEqualTo(place.stress(state, FORCE, true));
      assertThat(limit(place, Method.HANDBOOK, NONE).name()).isEqualTo(place.limit());
    }
    assertThat(limit(ExtensionPlace.BODY, Method.HANDBOOK, NONE).judge(state).value())
        .isEqualTo(state.loads().get(0).correctedShearStress());
    assertThat(limit(ExtensionPlace.BODY, Method.EN_13906, NONE).judge(state).value())
        .isEqualTo(state.loads().get(0).shearStress());
    assertThat(limit(ExtensionPlace.HOOK_BENDING, Method.EN_13906, NONE).judge(state).value())
        .isEqualTo(state.loads().get(0).hookBendingStress());
  }

  /** A share of the file counts whatever the initial tension, and keeps the definition. */
  @Test
  void aShareOfTheFileCounts() {
    ExtensionState state = state(AllowableClass.COLD_DRAWN_CARBON, HookType.FULL_LOOP, true);
    for (ExtensionPlace place : ExtensionPlace.values()) {
      Finding finding = limit(place, Method.HANDBOOK, OptionalDouble.of(0.37)).judge(state);
      assertThat(finding.bound()).isCloseTo(0.37 * SampleWire.STRENGTH, within(1e-9));
      assertThat(finding.source().text()).contains("problem file");
    }
  }

  /** The load of a side loop is beside the axis: the formulas for one on it say nothing. */
  @Test
  void theStressOfASideLoopIsNotAssessed() {
    ExtensionState state = state(AllowableClass.COLD_DRAWN_CARBON, HookType.SIDE_LOOP, false);
    assertThat(state.stressAssessed()).isFalse();
    assertThat(state.loads().get(0).shearStress()).isNaN();
    assertThat(state.loads().get(0).correctedShearStress()).isNaN();
    assertThat(state.loads().get(0).hookBendingStress()).isNaN();
    assertThat(state.loads().get(0).hookTorsionStress()).isNaN();
    for (ExtensionPlace place : ExtensionPlace.values()) {
      Finding finding = limit(place, Method.HANDBOOK, NONE).judge(state);
      assertThat(finding.canFail()).isFalse();
      assertThat(finding.value()).isNaN();
      assertThat(finding.check().definition()).startsWith("not assessed");
    }
  }

  private static ExtensionStress limit(ExtensionPlace place, Method method, OptionalDouble share) {
    return new ExtensionStress(
        place, new StressLimit(true, share), method, StressCorrection.BERGSTRAESSER, false);
  }

  private static ExtensionState state(
      AllowableClass allowableClass, HookType type, boolean highTension) {
    Wire wire =
        new Wire(
            SampleWire.grade(allowableClass, NONE, NONE),
            WireSize.explicit("sample", 2),
            SampleWire.STRENGTH,
            SampleWire.SHEAR_MODULUS,
            SampleWire.ELASTIC_MODULUS,
            Evidence.SEEN);
    ExtensionSpring spring =
        new ExtensionSpring(wire, 16, 20, new Hooks(type, 0.5, 0.25, 0.2), 14, 0);
    double most = InitialTension.force(InitialTension.USUAL.greatest(8), 16, 2);
    return new ExtensionState(
        spring,
        highTension ? most + 0.001 : most - 0.001,
        new ExtensionDuty(
            List.of(new LoadPoint(NONE, OptionalDouble.of(FORCE))),
            StressCorrection.BERGSTRAESSER,
            NONE));
  }
}
