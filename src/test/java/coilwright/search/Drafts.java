package coilwright.search;

import coilwright.spring.EndType;
import coilwright.spring.LoadLine;

/** Drafts that several tests begin with. */
final class Drafts {

  private Drafts() {}

  /** 18 N at 32 mm and 45 N at 22 mm, one wire of 1.4 mm of a steel of 2000 MPa, ground ends. */
  static ProblemDraft plain() {
    return new ProblemDraft()
        .loads(LoadLine.through(32, 18, 22, 45), 32, 22)
        .own(GradeDraft.of("steel", 2000).grade())
        .sizes(1.4)
        .ends(EndType.SQUARED_GROUND);
  }
}
