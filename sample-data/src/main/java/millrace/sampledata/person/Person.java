package millrace.sampledata.person;

import java.time.LocalDate;
import java.util.List;

/**
 * One invented patient, before anything happens.
 *
 * @param id identifier in the extract
 * @param female sex as recorded; see the writer for the rare other words
 * @param bornOn date of birth
 * @param population population for life
 * @param kidneys state of the kidneys
 * @param baselineMgDl usual creatinine, mg/dL
 * @param heightCm height
 * @param weightKg weight
 * @param pressureProne whether spells of low pressure come often
 * @param testedOutside whether creatinine was measured outside hospital in the year before
 * @param admissions admissions in order of time
 */
public record Person(
    String id,
    boolean female,
    LocalDate bornOn,
    Population population,
    Kidneys kidneys,
    double baselineMgDl,
    int heightCm,
    int weightKg,
    boolean pressureProne,
    boolean testedOutside,
    List<Admission> admissions) {

  /** Copies the admissions. */
  public Person {
    admissions = List.copyOf(admissions);
  }

  /**
   * Whether admissions of this patient can be in a rate by what is known of the patient.
   *
   * @return true for adults without maintenance dialysis or transplant
   */
  public boolean inRates() {
    return population != Population.CHILD
        && (kidneys == Kidneys.ORDINARY || kidneys == Kidneys.REDUCED);
  }
}
