package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.source.Evidence;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** How far hooks reach, by their types. */
class HookTypeTest {

  /**
   * Usual distances as remembered: half hooks 0.55 to 0.80 of the inside diameter, of which the
   * middle is taken; side loops about the whole; extended hooks beyond 1.1.
   */
  @ParameterizedTest
  @CsvSource({
    "FULL_LOOP, 0.75, 1",
    "HALF_LOOP, 0.55, 0.675",
    "SIDE_LOOP, 1, 1",
    "EXTENDED_HOOK, 1.1, 1.1"
  })
  void reaches(HookType type, double least, double natural) {
    assertThat(type.leastShare()).isEqualTo(least);
    assertThat(type.naturalShare()).isEqualTo(natural);
    assertThat(type.naturalCitation().evidence()).isEqualTo(Evidence.MEMORY);
  }

  @Test
  void onlyASideLoopHasItsLoadBesideTheAxis() {
    for (HookType type : HookType.values()) {
      assertThat(type.onAxis()).isEqualTo(type != HookType.SIDE_LOOP);
    }
  }

  @ParameterizedTest
  @EnumSource
  void itsIdFindsIt(HookType type) {
    assertThat(HookType.of(type.id())).contains(type);
    assertThat(HookType.of("hook")).isEmpty();
  }
}
