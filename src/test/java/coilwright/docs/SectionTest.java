package coilwright.docs;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

/** Writing one section of the benchmarks leaves the rest alone. */
class SectionTest {

  private static final String TEXT =
      "# All\n\n## First\n\none\n\n### Part\n\ntwo\n\n## Second\n\nthree\n";

  @Test
  void theFirstIsReplacedUpToTheNext() {
    assertThat(new Section("First").replacedIn(TEXT, "new\n"))
        .isEqualTo("# All\n\n## First\n\nnew\n\n## Second\n\nthree\n");
  }

  @Test
  void theLastIsReplacedToTheEnd() {
    assertThat(new Section("Second").replacedIn(TEXT, "new\n"))
        .isEqualTo("# All\n\n## First\n\none\n\n### Part\n\ntwo\n\n## Second\n\nnew\n");
  }

  @Test
  void aSectionThatIsMissingIsAdded() {
    assertThat(new Section("Third").replacedIn(TEXT, "new"))
        .isEqualTo(TEXT + "\n## Third\n\nnew\n");
  }

  @Test
  void writingTwiceChangesNothingMore() {
    for (String title : new String[] {"First", "Second", "Third"}) {
      Section section = new Section(title);
      String once = section.replacedIn(TEXT, "new");
      assertThat(section.replacedIn(once, "new")).isEqualTo(once);
    }
  }
}
