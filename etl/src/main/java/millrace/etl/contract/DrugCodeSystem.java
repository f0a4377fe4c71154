package millrace.etl.contract;

import millrace.etl.record.Word;

/** Code system of a drug. The words are those of the extract contract. */
public enum DrugCodeSystem implements Word {
  /** atc. */
  ATC("atc"),
  /** rxnorm. */
  RXNORM("rxnorm"),
  /** local. */
  LOCAL("local");

  private final String word;

  DrugCodeSystem(String word) {
    this.word = word;
  }

  @Override
  public String word() {
    return word;
  }
}
