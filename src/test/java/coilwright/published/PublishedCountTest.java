package coilwright.published;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * How many published values hold the laws and the data: counted from the headers of the files, and
 * only where a header says "seen". One row counts once.
 *
 * <p>Every file of the groups of mechanics is read by the test of its group, so that a row counted
 * here is a row tested there.
 */
class PublishedCountTest {

  private static final int OF_EACH_GROUP = 5;
  private static final int ALTOGETHER = 40;
  private static final int OF_THE_MECHANICS = 30;
  private static final int PUBLICATIONS = 6;

  /** What stands for a page whose publication was not noted down. */
  private static final String UNNAMED = "unnamed";

  private static final List<String> MECHANICS =
      List.of("rate", "stress factors", "stress", "solid length and pitch", "buckling");

  @ParameterizedTest
  @ValueSource(
      strings = {
        "strength",
        "moduli",
        "rate",
        "stress factors",
        "stress",
        "solid length and pitch",
        "buckling"
      })
  void eachGroupRestsOnSeveralSeenValues(String group) {
    assertThat(seenOf(group)).isGreaterThanOrEqualTo(OF_EACH_GROUP);
  }

  @Test
  void altogetherThereAreManySeenValues() {
    assertThat(seen().mapToInt(file -> file.rows().size()).sum())
        .isGreaterThanOrEqualTo(ALTOGETHER);
  }

  @Test
  void theSeenValuesComeFromSeveralPublications() {
    assertThat(
            seen()
                .map(file -> file.entry("source"))
                .filter(source -> !source.startsWith(UNNAMED))
                .distinct())
        .hasSizeGreaterThanOrEqualTo(PUBLICATIONS);
  }

  @Test
  void theMechanicsDoNotLeanOnTheMaterialTables() {
    assertThat(MECHANICS.stream().mapToInt(PublishedCountTest::seenOf).sum())
        .isGreaterThanOrEqualTo(OF_THE_MECHANICS);
  }

  /**
   * No printed frequency and no printed weight was seen with its inputs: the laws of surge and of
   * mass rest on values from memory and on a second method. When one is seen, its group moves to
   * the list above.
   */
  @ParameterizedTest
  @ValueSource(strings = {"surge", "mass"})
  void someGroupsHaveNoSeenValue(String group) {
    assertThat(seenOf(group)).isZero();
  }

  private static Stream<PublishedFile> seen() {
    return PublishedFile.all().stream().filter(PublishedFile::seen);
  }

  private static int seenOf(String group) {
    return seen()
        .filter(file -> file.group().equals(group))
        .mapToInt(file -> file.rows().size())
        .sum();
  }
}
