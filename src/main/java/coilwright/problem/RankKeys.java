package coilwright.problem;

import java.util.List;

/** The keys about the order of the shortlist. */
final class RankKeys {

  static final ProblemKey<Section> RANK =
      ProblemKey.section("rank", "the defaults", "the order of the shortlist");

  static final ProblemKey<RankBy> BY =
      ProblemKey.of(
          "rank.by",
          new WordReader<>(List.of(RankBy.values()), RankBy::id),
          "mass",
          "lightest, greatest least stress margin, cheapest, or greatest least margin first",
          "mass");

  static final ProblemKey<Integer> TOP =
      ProblemKey.of("rank.top", Values.count(), "10", "how many lines are shown", "10");

  /** All of them. */
  static final List<ProblemKey<?>> ROWS = List.of(RANK, BY, TOP);

  private RankKeys() {}
}
