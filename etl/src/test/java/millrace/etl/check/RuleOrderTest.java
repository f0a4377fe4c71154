package millrace.etl.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import millrace.etl.contract.ContractTable;
import millrace.etl.fixture.RowsInMemory;
import org.junit.jupiter.api.Test;

/**
 * Extract contract, row rules: the first rule broken, in the order of the table, is the one
 * reported. A row that breaks all rules of its table is mended one rule at a time.
 */
class RuleOrderTest {
  private static final String PATIENT = "patients.";

  /** What is reported and then, until nothing is, the change that mends it. */
  private static void assertReported(
      ContractTable table, List<String> broken, String... rulesAndMends) {
    List<String> changes = new ArrayList<>(broken);
    List<String> patient = new ArrayList<>();
    for (int i = 0; i < rulesAndMends.length; i += 2) {
      assertEquals(
          List.of(rulesAndMends[i]), brokenRules(table, changes, patient), changes.toString());
      String mend = rulesAndMends[i + 1];
      if (mend.startsWith(PATIENT)) {
        patient.add(mend.substring(PATIENT.length()));
      } else {
        changes.add(mend);
      }
    }
    assertEquals(List.of(), brokenRules(table, changes, patient));
  }

  private static List<String> brokenRules(
      ContractTable table, List<String> changes, List<String> patient) {
    List<String> person = new ArrayList<>(List.of("died_at=2031-05-01T08:00"));
    person.addAll(patient);
    RowsInMemory rows = RowsInMemory.ofOnePatient(person.toArray(String[]::new));
    return rows.add(table, changes.toArray(String[]::new)).check().broken(table).stream()
        .map(b -> b.substring(b.indexOf(' ') + 1))
        .toList();
  }

  @Test
  void rulesStandInTheOrderOfTheContract() {
    assertEquals(
        "missing unreadable unknown-word orphan repeated-key reversed outside-life outside-cover"
            + " unit-of-measure implausible not-final not-given",
        Arrays.stream(Rule.values()).map(Rule::word).collect(Collectors.joining(" ")));
    for (Rule rule : Rule.values()) {
      assertEquals(rule.name(), rule.word().replace('-', '_').toUpperCase(Locale.ROOT));
    }
  }

  @Test
  void ofAPatient() {
    assertReported(
        ContractTable.PATIENTS,
        List.of("birth_date=", "died_at=x", "sex=none"),
        "missing birth_date",
        "birth_date=1961",
        "unreadable died_at",
        "died_at=2031-05-01T08:00",
        "unknown-word sex",
        "sex=male",
        "repeated-key patient_id",
        "patient_id=P2");
  }

  @Test
  void ofAnAdmission() {
    assertReported(
        ContractTable.ADMISSIONS,
        List.of(
            "patient_id=",
            "admitted_at=x",
            "discharged_at=2031-07-30T08:00",
            "discharge_status=none"),
        "missing patient_id",
        "patient_id=P2",
        "unreadable admitted_at",
        "admitted_at=2031-08-01T08:00",
        "unknown-word discharge_status",
        "discharge_status=",
        "orphan patient_id",
        "patient_id=P1",
        "repeated-key admission_id",
        "admission_id=A2",
        "reversed discharged_at",
        "discharged_at=",
        "outside-life admitted_at",
        "patients.died_at=",
        "outside-cover admitted_at",
        "admitted_at=2031-05-01T08:00");
  }

  @Test
  void ofAStay() {
    assertReported(
        ContractTable.UNIT_STAYS,
        List.of("unit_id=", "admission_id=A2", "entered_at=x", "left_at=2031-07-30T08:00"),
        "missing unit_id",
        "unit_id=M1",
        "unreadable entered_at",
        "entered_at=2031-08-01T08:00",
        "orphan admission_id",
        "admission_id=A1",
        "orphan unit_id",
        "unit_id=ICU",
        "reversed left_at",
        "left_at=",
        "outside-life entered_at",
        "patients.died_at=",
        "outside-cover entered_at",
        "entered_at=2031-05-01T08:00");
  }

  @Test
  void ofAUnit() {
    assertReported(
        ContractTable.UNITS,
        List.of("name=", "kind=none"),
        "missing name",
        "name=High dependency",
        "unknown-word kind",
        "kind=step-down",
        "repeated-key unit_id",
        "unit_id=HDU");
  }

  @Test
  void ofAResult() {
    assertReported(
        ContractTable.RESULTS,
        List.of(
            "value=",
            "resulted_at=x",
            "setting=none",
            "admission_id=A2",
            "collected_at=2031-08-01T08:00",
            "unit=furlong",
            "status=cancelled"),
        "missing value",
        "value=999",
        "unreadable resulted_at",
        "resulted_at=",
        "unknown-word setting",
        "setting=",
        "orphan admission_id",
        "admission_id=",
        "outside-life collected_at",
        "patients.died_at=",
        "outside-cover collected_at",
        "collected_at=2031-05-01T08:00",
        "unit-of-measure unit",
        "unit=mg/dL",
        "implausible value",
        "value=1.0",
        "not-final status",
        "status=corrected");
  }

  @Test
  void ofADose() {
    assertReported(
        ContractTable.ADMINISTRATIONS,
        List.of(
            "drug=",
            "started_at=x",
            "route=none",
            "admission_id=A2",
            "ended_at=2031-07-30T08:00",
            "action=held"),
        "missing drug",
        "drug=J01GB03",
        "unreadable started_at",
        "started_at=2031-08-01T08:00",
        "unknown-word route",
        "route=iv",
        "orphan admission_id",
        "admission_id=A1",
        "reversed ended_at",
        "ended_at=",
        "outside-life started_at",
        "patients.died_at=",
        "outside-cover started_at",
        "started_at=2031-05-01T08:00",
        "not-given action",
        "action=given");
  }

  @Test
  void ofAPressure() {
    assertReported(
        ContractTable.BLOOD_PRESSURES,
        List.of("measured_at=", "systolic=x", "diastolic=", "method=none", "admission_id=A2"),
        "missing measured_at",
        "measured_at=2031-08-01T08:00",
        "unreadable systolic",
        "systolic=20",
        "unknown-word method",
        "method=cuff",
        "orphan admission_id",
        "admission_id=A1",
        "outside-life measured_at",
        "patients.died_at=",
        "outside-cover measured_at",
        "measured_at=2031-05-01T08:00",
        "implausible systolic",
        "systolic=100");
  }

  @Test
  void ofAReplacement() {
    assertReported(
        ContractTable.KIDNEY_REPLACEMENTS,
        List.of("started_at=", "ended_at=x", "modality=none", "purpose=none", "admission_id=A2"),
        "missing started_at",
        "started_at=2031-08-01T08:00",
        "unreadable ended_at",
        "ended_at=2031-07-30T08:00",
        "unknown-word modality",
        "modality=",
        "unknown-word purpose",
        "purpose=",
        "orphan admission_id",
        "admission_id=A1",
        "reversed ended_at",
        "ended_at=",
        "outside-life started_at",
        "patients.died_at=",
        "outside-cover started_at",
        "started_at=2031-05-01T08:00");
  }

  @Test
  void ofACondition() {
    assertReported(
        ContractTable.CONDITIONS,
        List.of("code=", "recorded_at=x", "code_system=icd11", "admission_id=A2"),
        "missing code",
        "code=N17.9",
        "unreadable recorded_at",
        "recorded_at=2031-08-01T08:00",
        "unknown-word code_system",
        "code_system=icd10",
        "orphan admission_id",
        "admission_id=A1",
        "outside-life recorded_at",
        "patients.died_at=",
        "outside-cover recorded_at",
        "recorded_at=2031-05-01T08:00");
  }

  @Test
  void ofAUrineVolume() {
    assertReported(
        ContractTable.URINE_OUTPUTS,
        List.of("ended_at=", "volume_ml=x", "admission_id=A2", "started_at=2031-08-01T08:00"),
        "missing ended_at",
        "ended_at=2031-07-30T08:00",
        "unreadable volume_ml",
        "volume_ml=50",
        "orphan admission_id",
        "admission_id=A1",
        "reversed ended_at",
        "ended_at=2031-08-01T09:00",
        "outside-life started_at",
        "patients.died_at=",
        "outside-cover started_at",
        "started_at=2031-05-01T08:00");
  }

  @Test
  void ofABodyMeasure() {
    assertReported(
        ContractTable.BODY_MEASURES,
        List.of("measured_at=", "height_cm=x", "patient_id=P2"),
        "missing measured_at",
        "measured_at=2031-08-01T08:00",
        "unreadable height_cm",
        "height_cm=170",
        "orphan patient_id",
        "patient_id=P1",
        "outside-life measured_at",
        "patients.died_at=",
        "outside-cover measured_at",
        "measured_at=2031-05-01T08:00");
  }

  @Test
  void ofTwoFieldsThatBreakOneRuleTheFirstColumnIsNamed() {
    assertReported(
        ContractTable.RESULTS,
        List.of("unit=", "analyte=", "patient_id="),
        "missing patient_id",
        "patient_id=P1",
        "missing analyte",
        "analyte=2160-0",
        "missing unit",
        "unit=mg/dL");
  }
}
