package millrace.analytics.mart;

import java.util.List;

/** The cautions that every page and file carries (methods 11). */
public final class Cautions {
  /** In full sentences, in order. */
  public static final List<String> SENTENCES =
      List.of(
          "Retrospective surveillance for quality review, not for the care of a patient.",
          "Associations, not causes: the sick receive more drugs, more tests and lower pressures.",
          "Creatinine lags the injury by a day or two.",
          "A unit that tests more finds more.",
          "Policies and drug lists are the hospital's own to set under its local rules and licensed practice.");

  private Cautions() {}
}
