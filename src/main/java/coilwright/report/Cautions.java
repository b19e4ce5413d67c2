package coilwright.report;

import java.util.List;

/** What every report says about safety. */
public final class Cautions {

  /** The cautions, one sentence group a line. */
  public static final List<String> LINES =
      List.of(
          "A loaded spring stores energy: wear eye protection, release it under control, never load it"
              + " beyond solid.",
          "These are calculated values. Verify by test; local codes, the current editions of the"
              + " standards and licensed practice decide.",
          "Safety-critical use (brakes, lifting, overhead doors, medical, pressure relief) needs a"
              + " qualified engineer's sign-off.");

  private Cautions() {}
}
