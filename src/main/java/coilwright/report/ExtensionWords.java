package coilwright.report;

import coilwright.limit.ExtensionPlace;
import coilwright.problem.ExtensionAsked;
import coilwright.problem.HookLength;
import coilwright.problem.HooksAsked;
import coilwright.problem.LoopPlanes;
import coilwright.problem.Problem;
import coilwright.problem.StressLimit;
import coilwright.problem.TensionLine;
import coilwright.spring.HookType;
import coilwright.spring.InitialTension;
import coilwright.unit.Dimension;

/** What of a problem only extension springs have, in words. */
final class ExtensionWords {

  private final Understood words;
  private final Problem problem;
  private final ExtensionAsked asked;

  ExtensionWords(Understood words) {
    this.words = words;
    this.problem = words.problem();
    this.asked = problem.extension().orElseThrow();
  }

  /** Adds the loads and what they come to. */
  void loads() {
    words.row("loads", new LoadWords(words).text());
    asked.line().ifPresent(line -> words.row(words.each(), line(line)));
    asked
        .freeLength()
        .ifPresent(length -> words.row("free length", words.length(length) + " inside the hooks"));
    new LoadWords(words).overtravel();
  }

  private String line(TensionLine line) {
    return "rate "
        + words.units().brief(Dimension.RATE, line.rate(), 4)
        + (line.zeroForceLength().isPresent()
            ? ", would come to no force at " + words.length(line.zeroForceLength().getAsDouble())
            : ", lengths as body and hooks make them")
        + ", from "
        + line.rule();
  }

  /** Adds the hooks. */
  void hooks() {
    HooksAsked hooks = asked.hooks();
    words.row(
        "hooks",
        String.join(", ", hooks.types().stream().map(HookType::id).toList()) + shape(hooks));
  }

  private String shape(HooksAsked hooks) {
    HookLength length = hooks.length();
    String reach =
        switch (length.rule()) {
          case NATURAL -> "natural length";
          case FREE ->
              asked.freeLength().isPresent() ? "length from the free length" : "any length";
          case GIVEN -> words.length(length.given().orElseThrow()) + " long";
        };
    return ", "
        + reach
        + ", radii "
        + Numbers.brief(hooks.bendRadius(), 3)
        + " D and at the side "
        + Numbers.brief(hooks.sideRadius(), 3)
        + " D"
        + (hooks.planes() == LoopPlanes.ANY ? "" : ", planes " + hooks.planes().id());
  }

  /** Adds the limits. */
  void limits() {
    words.row(
        "limits",
        "index "
            + LimitWords.band(problem.limits().springIndex())
            + ", body coils "
            + LimitWords.band(problem.limits().activeCoils()));
    words.row(
        "tension",
        asked.preferredTension()
            ? "initial tension in the preferred range by " + InitialTension.USUAL.author()
            : "initial tension any, not below zero");
    words.row(
        "stress",
        "body "
            + share(ExtensionPlace.BODY, asked.stressInBody())
            + "; hook bending "
            + share(ExtensionPlace.HOOK_BENDING, asked.hookBending())
            + "; hook torsion "
            + share(ExtensionPlace.HOOK_TORSION, asked.hookTorsion())
            + (asked.hooks().types().stream().allMatch(HookType::onAxis)
                ? ""
                : "; side loops not assessed"));
    new LimitWords(words).surge();
  }

  private String share(ExtensionPlace place, StressLimit limit) {
    return new LimitWords(words)
        .share(
            limit, grade -> place.share(problem.limits().method(), grade.allowableClass(), false));
  }
}
