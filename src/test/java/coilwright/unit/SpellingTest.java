package coilwright.unit;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Which known word a misspelt one is taken for. */
class SpellingTest {

  private static final List<String> KNOWN =
      List.of("length", "force", "tolerance", "rod", "bore", "diametral_clearance", "music-wire");

  @ParameterizedTest
  @CsvSource({
    "lenght, length",
    "Length, length",
    "lengths, length",
    "foce, force",
    "tolerence, tolerance",
    "rodd, rod",
    "musik-wire, music-wire",
    "music wire, music-wire",
    "metral, diametral_clearance",
    "tol, tolerance",
    "x,",
    "spring,",
    "'',",
    "abcdefghijklmnopqrstuvwxyzabcdefghijklmnopqrstuvwxyz,"
  })
  void nearest(String word, String nearest) {
    assertThat(Spelling.nearest(word, KNOWN).orElse(null)).isEqualTo(nearest);
  }

  @ParameterizedTest
  @CsvSource({
    "ab, ab, 0",
    "ab, ba, 1",
    "abc, ac, 1",
    "ac, abc, 1",
    "kitten, sitting, 3",
    "'', a, 1"
  })
  void distance(String a, String b, int edits) {
    assertThat(Spelling.distance(a, b)).isEqualTo(edits);
  }
}
