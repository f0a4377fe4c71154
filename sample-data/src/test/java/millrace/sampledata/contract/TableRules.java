package millrace.sampledata.contract;

import java.util.List;
import java.util.Map;

/**
 * What the contract says of one table.
 *
 * @param table name
 * @param key columns whose value may occur once, empty for none
 * @param required columns that may not be empty
 * @param optional other columns
 * @param times columns of times, the first of them decides cover and life
 * @param end column that may not lie before the first of times, empty for none
 * @param numbers columns of numbers
 * @param words columns with a list of words
 * @param references columns that refer to another table
 */
record TableRules(
    String table,
    String key,
    List<String> required,
    List<String> optional,
    List<String> times,
    String end,
    List<String> numbers,
    Map<String, List<String>> words,
    Map<String, String> references) {
  private static final Map<String, String> PERSON =
      Map.of("patient_id", "patients", "admission_id", "admissions");
  private static final List<String> NONE = List.of();

  /** All tables with rows about patients, those first to which others refer. */
  static List<TableRules> all() {
    return List.of(
        new TableRules(
            "patients",
            "patient_id",
            List.of("patient_id", "sex", "birth_date"),
            List.of("died_at"),
            List.of("died_at"),
            "",
            NONE,
            Map.of("sex", List.of("female", "male", "other", "unknown")),
            Map.of()),
        new TableRules(
            "admissions",
            "admission_id",
            List.of("admission_id", "patient_id", "admitted_at"),
            List.of("discharged_at", "discharge_status"),
            List.of("admitted_at", "discharged_at"),
            "discharged_at",
            NONE,
            Map.of("discharge_status", List.of("home", "transfer", "died", "other")),
            Map.of("patient_id", "patients")),
        new TableRules(
            "units",
            "unit_id",
            List.of("unit_id", "name", "kind"),
            List.of("site"),
            NONE,
            "",
            NONE,
            Map.of(
                "kind",
                List.of(
                    "critical-care",
                    "step-down",
                    "medical",
                    "surgical",
                    "oncology",
                    "obstetric",
                    "paediatric",
                    "emergency",
                    "other")),
            Map.of()),
        new TableRules(
            "unit_stays",
            "",
            List.of("admission_id", "unit_id", "entered_at"),
            List.of("left_at"),
            List.of("entered_at", "left_at"),
            "left_at",
            NONE,
            Map.of(),
            Map.of("admission_id", "admissions", "unit_id", "units")),
        new TableRules(
            "results",
            "",
            List.of("patient_id", "analyte", "collected_at", "value", "unit"),
            List.of("admission_id", "code_system", "resulted_at", "status", "setting"),
            List.of("collected_at", "resulted_at"),
            "",
            List.of("value"),
            Map.of(
                "code_system", List.of("loinc", "local"),
                "status", List.of("final", "corrected", "preliminary", "cancelled"),
                "setting", List.of("inpatient", "outpatient", "emergency", "unknown")),
            PERSON),
        new TableRules(
            "administrations",
            "",
            List.of("patient_id", "drug", "route", "started_at"),
            List.of(
                "admission_id",
                "code_system",
                "drug_name",
                "ended_at",
                "dose",
                "dose_unit",
                "action",
                "basis"),
            List.of("started_at", "ended_at"),
            "ended_at",
            NONE,
            Map.of(
                "code_system", List.of("atc", "rxnorm", "local"),
                "action", List.of("given", "held", "refused", "stopped", "entered-in-error"),
                "basis", List.of("administered", "ordered"),
                "route",
                    List.of(
                        "iv",
                        "im",
                        "sc",
                        "po",
                        "pr",
                        "inhaled",
                        "topical",
                        "ophthalmic",
                        "otic",
                        "nasal",
                        "intravitreal",
                        "intrathecal",
                        "irrigation",
                        "lock",
                        "other",
                        "unknown")),
            PERSON),
        new TableRules(
            "blood_pressures",
            "",
            List.of("patient_id", "measured_at"),
            List.of("admission_id", "systolic", "diastolic", "mean", "method"),
            List.of("measured_at"),
            "",
            List.of("systolic", "diastolic", "mean"),
            Map.of("method", List.of("arterial-line", "cuff", "unknown")),
            PERSON),
        new TableRules(
            "kidney_replacements",
            "",
            List.of("patient_id", "started_at"),
            List.of("admission_id", "ended_at", "modality", "purpose"),
            List.of("started_at", "ended_at"),
            "ended_at",
            NONE,
            Map.of(
                "modality", List.of("intermittent", "continuous", "peritoneal", "unknown"),
                "purpose", List.of("acute", "maintenance", "unknown")),
            PERSON),
        new TableRules(
            "conditions",
            "",
            List.of("patient_id", "code", "code_system"),
            List.of("admission_id", "recorded_at"),
            List.of("recorded_at"),
            "",
            NONE,
            Map.of("code_system", List.of("icd10", "icd9")),
            PERSON),
        new TableRules(
            "urine_outputs",
            "",
            List.of("patient_id", "ended_at", "volume_ml"),
            List.of("admission_id", "started_at"),
            List.of("started_at", "ended_at"),
            "ended_at",
            List.of("volume_ml"),
            Map.of(),
            PERSON),
        new TableRules(
            "body_measures",
            "",
            List.of("patient_id", "measured_at"),
            List.of("weight_kg", "height_cm"),
            List.of("measured_at"),
            "",
            List.of("weight_kg", "height_cm"),
            Map.of(),
            Map.of("patient_id", "patients")));
  }
}
