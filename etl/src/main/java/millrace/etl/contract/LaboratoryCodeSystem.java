package millrace.etl.contract;

import millrace.etl.record.Word;

/** Code system of an analyte. The words are those of the extract contract. */
public enum LaboratoryCodeSystem implements Word {
  /** loinc. */
  LOINC("loinc"),
  /** local. */
  LOCAL("local");

  private final String word;

  LaboratoryCodeSystem(String word) {
    this.word = word;
  }

  @Override
  public String word() {
    return word;
  }
}
