package millrace.etl.record;

/** Code system of a condition. The words are those of the extract contract. */
public enum ConditionCodeSystem implements Word {
  /** icd10. */
  ICD10("icd10"),
  /** icd9. */
  ICD9("icd9");

  private final String word;

  ConditionCodeSystem(String word) {
    this.word = word;
  }

  @Override
  public String word() {
    return word;
  }
}
