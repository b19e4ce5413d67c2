package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.HashSet;
import java.util.Random;
import java.util.Set;
import java.util.stream.LongStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Tightening a limit of extension springs never adds a candidate; loosening never removes one. */
class ExtensionTighteningTest {

  private static final int DRAFTS = 2;

  static LongStream seeds() {
    return LongStream.range(100, 108);
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void ofEveryBoundThatIsSet(long seed) {
    Random random = new Random(seed);
    RandomExtensionDrafts.of(seed, DRAFTS)
        .forEach(
            draft -> {
              Set<String> found = ids(draft);
              for (ExtensionBound bound : ExtensionBound.values()) {
                draft.bound(bound).ifPresent(value -> holds(draft, found, bound, value, random));
              }
            });
  }

  private static void holds(
      ExtensionDraft draft, Set<String> found, ExtensionBound bound, double value, Random random) {
    double share = 0.1 * random.nextDouble();
    assertThat(found)
        .as("%s tightened by %s", bound, share)
        .containsAll(ids(draft.copy().with(bound, bound.tightened(value, share))));
    assertThat(ids(draft.copy().with(bound, bound.tightened(value, -share))))
        .as("%s loosened by %s", bound, share)
        .containsAll(found);
    if (bound != ExtensionBound.MOST_COILS && bound != ExtensionBound.CLEARANCE) {
      assertThat(ids(draft.copy().without(bound))).as("%s off", bound).containsAll(found);
    }
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void ofTheInitialTension(long seed) {
    RandomExtensionDrafts.of(seed, DRAFTS)
        .forEach(draft -> assertThat(ids(draft.copy().anyTension())).containsAll(ids(draft)));
  }

  private static Set<String> ids(ExtensionDraft draft) {
    Set<String> ids = new HashSet<>();
    ExtensionWires.of(draft)
        .forEach(wire -> wire.counts().forEach(coils -> ids.add(id(wire, coils))));
    return ids;
  }

  private static String id(ExtensionWires wire, double coils) {
    return wire.family().wire().grade().id()
        + " "
        + wire.family().wire().size().label()
        + " "
        + wire.family().endForm()
        + " "
        + coils;
  }
}
