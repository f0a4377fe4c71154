package millrace.sampledata;

/**
 * How the patients are divided into parts, each one file per table. Depends on the size alone, so
 * that the files do not depend on the machine.
 *
 * @param patients patients in all
 * @param patientsPerPart patients of a part but the last
 */
record Parts(long patients, long patientsPerPart) {
  private static final long FEWEST = 4;
  private static final long MOST_PATIENTS = 10_000;

  /**
   * The division of a number of patients: at least 4 parts (2 for the smallest extracts), none
   * above 10,000 patients.
   */
  static Parts of(long patients) {
    long wanted = patients < 1000 ? FEWEST / 2 : FEWEST;
    long even = (patients + wanted - 1) / wanted;
    return new Parts(patients, Math.min(MOST_PATIENTS, even));
  }

  /** Number of parts. */
  int count() {
    return (int) ((patients + patientsPerPart - 1) / patientsPerPart);
  }

  /** First patient of a part, counted from 0. */
  long from(int part) {
    return part * patientsPerPart;
  }

  /** Patient after the last of a part. */
  long to(int part) {
    return Math.min(patients, from(part) + patientsPerPart);
  }
}
