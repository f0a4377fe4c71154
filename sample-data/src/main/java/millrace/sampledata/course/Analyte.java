package millrace.sampledata.course;

/** What the laboratory measures for us. */
public enum Analyte {
  CREATININE,
  POTASSIUM,
  UREA,
  BICARBONATE
}
