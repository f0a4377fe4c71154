package millrace.sampledata.write;

/** Which files are compressed. */
public enum Packing {
  /** None. */
  PLAIN,
  /** The odd parts of the three large tables. */
  MIXED,
  /** All but the one with Windows line ends. */
  GZIP
}
