package millrace.analytics.criteria;

/** Kinds of evidence of an acute kidney injury (methods 4; KDIGO 2012, Kidney Int Suppl 2:19). */
public enum Evidence {
  /** A rise within 48 h. */
  RISE_48H,
  /** 1.5 times the lowest of 7 d. */
  RATIO_7D,
  /** 1.5 times the baseline, soon after admission. */
  RATIO_BASELINE,
  /** A first result that later falls: a recovering injury, seen by looking forward. */
  FALL_7D,
  /** The start of a kidney replacement that is not maintenance. */
  REPLACEMENT
}
