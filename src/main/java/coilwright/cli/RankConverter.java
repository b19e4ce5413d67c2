package coilwright.cli;

import coilwright.problem.RankBy;
import java.util.List;

/** Reads {@code --rank}. */
final class RankConverter extends WordConverter<RankBy> {

  RankConverter() {
    super(List.of(RankBy.values()), RankBy::id);
  }
}
