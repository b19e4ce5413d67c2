package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.limit.CoilSet;
import coilwright.problem.LimitName;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The search finds every practical extension spring that holds, no other, and says why not. */
class ExtensionCompletenessTest {

  private static final int COUNTS = 60;

  /** What counts would tell that the scan leaves out: more of them, or such between steps. */
  private static final Set<LimitName> BEYOND_A_SCAN =
      EnumSet.of(LimitName.ACTIVE_COILS, LimitName.COIL_STEP);

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("coilwright.search.ExtensionWires#seeds")
  void findsWhatAScanOfEveryCountFinds(long seed) {
    for (ExtensionWires wire : ExtensionWires.of(seed)) {
      assertThat(wire.counts()).as(wire.toString()).isEqualTo(wire.held());
    }
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("coilwright.search.ExtensionWires#seeds")
  void whatALimitLeavesIsWhatItJudges(long seed) {
    for (ExtensionWires wire : ExtensionWires.of(seed)) {
      wire.sets().forEach((name, set) -> isJudgedAlike(wire, name, set));
    }
  }

  private static void isJudgedAlike(ExtensionWires wire, LimitName name, CoilSet set) {
    double few = wire.family().fewestCoils();
    double many = wire.family().mostCoils();
    for (int i = 0; i <= COUNTS; i++) {
      double coils = Math.min(many, few * StrictMath.pow(many / few, (double) i / COUNTS));
      boolean near = set.distanceTo(CoilSet.of(coils, coils)) < 1e-7 * coils;
      boolean inside = near && !besideABound(set, coils);
      if (near == inside) {
        assertThat(wire.holds(name, wire.family().at(coils)))
            .as("%s at %s coils: %s leaves %s", wire, coils, name, set)
            .isEqualTo(inside);
      }
    }
  }

  private static boolean besideABound(CoilSet set, double coils) {
    return set.intervals().stream()
        .anyMatch(
            interval ->
                Math.abs(interval.from() - coils) < 1e-7 * coils
                    || Math.abs(interval.to() - coils) < 1e-7 * coils);
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("coilwright.search.ExtensionWires#seeds")
  void everyConflictIsTrue(long seed) {
    for (ExtensionWires wire : ExtensionWires.of(seed)) {
      if (wire.counts().isEmpty()) {
        isTrue(wire, wire.outcome().conflict().orElseThrow().parts(), wire.sets());
      }
    }
  }

  private static void isTrue(
      ExtensionWires wire, List<Conflict.Part> parts, Map<LimitName, CoilSet> sets) {
    assertThat(shared(parts).isEmpty()).as("%s: %s", wire, parts).isTrue();
    for (int i = 0; i < parts.size(); i++) {
      List<Conflict.Part> others = new ArrayList<>(parts);
      others.remove(i);
      assertThat(shared(others).isEmpty()).as("%s without part %s: %s", wire, i, parts).isFalse();
    }
    boolean afterRounding = parts.stream().anyMatch(part -> part.limit() == LimitName.COIL_STEP);
    if (!afterRounding) {
      parts.forEach(part -> isWhatItLeaves(wire, part, sets.get(part.limit())));
    }
  }

  private static void isWhatItLeaves(ExtensionWires wire, Conflict.Part part, CoilSet alone) {
    List<CoilSet.Interval> own = part.coils().intervals();
    assertThat(own).as("%s: %s", wire, part).hasSameSizeAs(alone.intervals());
    for (int i = 0; i < own.size(); i++) {
      assertThat(near(own.get(i).from(), alone.intervals().get(i).from()))
          .as("%s: %s", wire, part)
          .isTrue();
      assertThat(near(own.get(i).to(), alone.intervals().get(i).to()))
          .as("%s: %s", wire, part)
          .isTrue();
    }
  }

  private static boolean near(double one, double other) {
    return one == other || Math.abs(one - other) < 1e-6 * other;
  }

  private static CoilSet shared(List<Conflict.Part> parts) {
    return parts.stream().map(Conflict.Part::coils).reduce(CoilSet.ALL, CoilSet::intersect);
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("coilwright.search.ExtensionWires#seeds")
  void whatRulesAWireOutIsWhatAScanFinds(long seed) {
    for (ExtensionWires wire : ExtensionWires.of(seed)) {
      if (wire.counts().isEmpty() && !wire.decisive().isEmpty()) {
        assertThat(wire.outcome().ruledOutBy()).as(wire.toString()).containsAll(wire.decisive());
      }
    }
  }

  @Test
  void theRandomProblemsAreWorthSearching() {
    long found = 0;
    long none = 0;
    long several = 0;
    for (long seed : ExtensionWires.seeds().toArray()) {
      for (ExtensionWires wire : ExtensionWires.of(seed)) {
        found += wire.counts().isEmpty() ? 0 : 1;
        none += wire.counts().isEmpty() ? 1 : 0;
        several +=
            wire.sets().values().stream().anyMatch(set -> set.intervals().size() > 1) ? 1 : 0;
      }
    }
    assertThat(found).as("wires with candidates").isGreaterThan(300);
    assertThat(none).as("wires without").isGreaterThan(1000);
    assertThat(several).as("wires of which a limit leaves two ranges").isGreaterThan(100);
  }
}
