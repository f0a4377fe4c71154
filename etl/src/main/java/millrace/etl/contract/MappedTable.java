package millrace.etl.contract;

import millrace.etl.record.Word;

/**
 * Table whose local codes a row of the code map explains. The words are those of the extract
 * contract.
 */
public enum MappedTable implements Word {
  /** results. */
  RESULTS("results"),
  /** administrations. */
  ADMINISTRATIONS("administrations"),
  /** conditions. */
  CONDITIONS("conditions");

  private final String word;

  MappedTable(String word) {
    this.word = word;
  }

  @Override
  public String word() {
    return word;
  }
}
