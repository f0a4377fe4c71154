package millrace.sampledata.person;

import millrace.sampledata.scenario.Chance;

/**
 * How many admissions each patient has, so that an extract of any size is divided among workers
 * without counting first: every block of 100 patients has 143 admissions, shuffled within the
 * block.
 */
public final class AdmissionCounts {
  /** Patients in a block. */
  public static final int BLOCK_PATIENTS = 100;

  /** Admissions in a block. */
  public static final int BLOCK_ADMISSIONS = 143;

  private final long seed;
  private final long admissions;

  /**
   * The counts of one extract.
   *
   * @param seed seed of the extract
   * @param admissions admissions wanted in all
   */
  public AdmissionCounts(long seed, long admissions) {
    this.seed = seed;
    this.admissions = admissions;
  }

  /**
   * Number of patients, whole blocks and the start of the last one.
   *
   * @return patients of the extract
   */
  public long patients() {
    long blocks = admissions / BLOCK_ADMISSIONS;
    long rest = admissions - blocks * BLOCK_ADMISSIONS;
    long patients = blocks * BLOCK_PATIENTS;
    int[] counts = block(blocks);
    for (int index = 0; rest > 0; index++) {
      rest -= counts[index];
      patients++;
    }
    return patients;
  }

  /**
   * The admissions of a run of patients.
   *
   * @param from first patient
   * @param to patient after the last
   * @return entry {@code i} is the number of the first admission of patient {@code from + i}; one
   *     entry more than patients
   */
  public long[] firstNumbers(long from, long to) {
    long[] numbers = new long[(int) (to - from) + 1];
    long next = from / BLOCK_PATIENTS * BLOCK_ADMISSIONS;
    int[] counts = block(from / BLOCK_PATIENTS);
    for (int index = 0; index < from % BLOCK_PATIENTS; index++) {
      next += counts[index];
    }
    for (long patient = from; patient < to; patient++) {
      int inBlock = (int) (patient % BLOCK_PATIENTS);
      if (inBlock == 0) {
        counts = block(patient / BLOCK_PATIENTS);
      }
      numbers[(int) (patient - from)] = next;
      next = Math.min(admissions, next + counts[inBlock]);
    }
    numbers[numbers.length - 1] = next;
    return numbers;
  }

  private int[] block(long number) {
    int[] counts = new int[BLOCK_PATIENTS];
    for (int index = 0; index < BLOCK_PATIENTS; index++) {
      counts[index] = index < 3 ? 4 : index < 11 ? 3 : index < 29 ? 2 : 1;
    }
    Chance chance = Chance.of(seed, -1 - number);
    for (int index = BLOCK_PATIENTS - 1; index > 0; index--) {
      int other = chance.below(index + 1);
      int kept = counts[index];
      counts[index] = counts[other];
      counts[other] = kept;
    }
    return counts;
  }
}
