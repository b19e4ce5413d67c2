package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The search finds every practical spring that holds, and no other. */
class CompletenessTest {

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("coilwright.search.Searched#seeds")
  void findsWhatAScanOfEveryCountFinds(long seed) {
    Searched.wiresOf(seed)
        .forEach(
            wire ->
                assertThat(wire.counts())
                    .as(wire.toString())
                    .isEqualTo(EveryCount.of(wire).held()));
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("coilwright.search.Searched#seeds")
  void findsASpringWhoseOwnNumbersAreTheBounds(long seed) {
    OwnNumbers.drafts(seed, 120).forEach(CompletenessTest::findsIt);
  }

  private static void findsIt(OwnNumbers spring) {
    Searched wire = Searched.wiresOf("own", spring.draft().problem()).findFirst().orElseThrow();
    assertThat(wire.counts())
        .as(spring.toString())
        .contains(spring.coils())
        .isEqualTo(EveryCount.of(wire).held());
  }

  @Test
  void theRandomProblemsAreWorthSearching() {
    long[] found = new long[2];
    Searched.seeds()
        .boxed()
        .flatMap(seed -> Searched.wiresOf(seed).stream())
        .forEach(wire -> found[wire.failed() ? 1 : 0]++);
    assertThat(found[0]).as("wires with candidates").isGreaterThan(500);
    assertThat(found[1]).as("wires without").isGreaterThan(3000);
  }
}
