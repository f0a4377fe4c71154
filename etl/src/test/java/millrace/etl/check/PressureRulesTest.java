package millrace.etl.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.List;
import millrace.etl.contract.ContractTable;
import millrace.etl.fixture.Checked;
import millrace.etl.fixture.RowsInMemory;
import millrace.etl.record.BloodPressure;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Extract contract, row rules: implausible, for blood pressures; rival readings. */
class PressureRulesTest {
  private static final ContractTable TABLE = ContractTable.BLOOD_PRESSURES;

  private static String[] values(String systolic, String diastolic, String mean) {
    return new String[] {"systolic=" + systolic, "diastolic=" + diastolic, "mean=" + mean};
  }

  private static Checked reading(String systolic, String diastolic, String mean) {
    return RowsInMemory.ofOnePatient().add(TABLE, values(systolic, diastolic, mean)).check();
  }

  private static String mmHg(long nanos) {
    return nanos == BloodPressure.NONE
        ? "-"
        : BigDecimal.valueOf(nanos, 9).stripTrailingZeros().toPlainString();
  }

  private static String text(BloodPressure p) {
    return mmHg(p.systolicNanoMmHg())
        + "/"
        + mmHg(p.diastolicNanoMmHg())
        + "/"
        + mmHg(p.meanNanoMmHg());
  }

  private static List<String> standing(RowsInMemory rows) {
    return rows.check().all(CheckedPatient::pressures).stream()
        .map(PressureRulesTest::text)
        .toList();
  }

  /** Systolic 30-300, diastolic 10-225 and at most systolic - 5, mean 20-250; bounds included. */
  @ParameterizedTest
  @CsvSource({
    "120, 80, 93,           120/80/93",
    "30, '', '',            30/-/-",
    "300, '', '',           300/-/-",
    "'', 10, '',            -/10/-",
    "'', 225, '',           -/225/-",
    "'', '', 20,            -/-/20",
    "'', '', 250,           -/-/250",
    "300, 225, 250,         300/225/250",
    "29.999, 12, '',        -/12/-",
    "300.001, 80, '',       -/80/-",
    "120, 9.999, '',        120/-/-",
    "120, 225.001, '',      120/-/-",
    "120, 80, 19.999,       120/80/-",
    "120, 80, 250.001,      120/80/-",
    "120, 115, '',          120/115/-",
    "120, 115.001, '',      120/-/-",
    "120, 120, '',          120/-/-",
    "80, 120, '',           80/-/-",
    "80, 120, 93,           80/-/93",
    "29, 28, '',            -/28/-",
    "301, 225, '',          -/225/-",
    "0, 80, 90,             -/80/90",
    "-120, 80, '',          -/80/-",
    "1e40, 80, '',          -/80/-",
    "119.5, 70.25, 88.125,  119.5/70.25/88.125",
    "120, 80, 130,          120/80/130"
  })
  void aFieldOutOfItsBoundsIsEmptied(
      String systolic, String diastolic, String mean, String expected) {
    Checked checked = reading(systolic, diastolic, mean);

    assertEquals(List.of(), checked.broken(TABLE));
    assertEquals(expected, text(checked.only(CheckedPatient::pressures)));
  }

  @ParameterizedTest
  @CsvSource({
    "29, 9, 19,    systolic",
    "301, 226, 251, systolic",
    "29, '', '',   systolic",
    "'', 9, '',    diastolic",
    "'', 226, 10,  diastolic",
    "'', '', 251,  mean",
    "'', '', '',   systolic"
  })
  void aReadingWithoutAUsableFieldIsImplausible(
      String systolic, String diastolic, String mean, String column) {
    Checked checked = reading(systolic, diastolic, mean);

    assertEquals(List.of("2 implausible " + column), checked.broken(TABLE));
    assertEquals(List.of(), checked.findings(TABLE));
  }

  @Test
  void emptiedFieldsAreCountedByColumn() {
    Checked checked =
        RowsInMemory.ofOnePatient()
            .add(TABLE, values("29", "80", ""))
            .add(TABLE, values("120", "118", "300"))
            .add(TABLE, "measured_at=2031-03-02T09:00", "systolic=20", "diastolic=300", "mean=70")
            .check();

    assertEquals(
        List.of(
            "emptied-pressure diastolic 2",
            "emptied-pressure mean 1",
            "emptied-pressure systolic 2",
            "rival-pressures 1"),
        checked.findings(TABLE));
  }

  /** Extract contract, duplicates: the lower MAP stands, then the lower systolic. */
  @ParameterizedTest
  @CsvSource({
    "120, 80, '',  110, 70, '',     110/70/-",
    "110, 70, '',  120, 80, '',     110/70/-",
    "120, 80, '',  120, 80, 93.333, 120/80/93.333",
    "120, 80, '',  120, 80, 93.334, 120/80/-",
    "120, 80, '',  130, 75, '',     120/80/-",
    "140, 70, '',  120, 80, '',     120/80/-",
    "'', '', 60,   100, 70, '',     -/-/60",
    "90, '', '',   120, 80, '',     120/80/-",
    "90, '', '',   95, '', '',      90/-/-",
    "95, '', '',   90, '', '',      90/-/-",
    "'', 40, '',   90, '', '',      90/-/-",
    "'', '', 70,   100, '', 70,     100/-/70"
  })
  void ofTwoRivalsTheLowerMeanStands(
      String systolic,
      String diastolic,
      String mean,
      String otherSystolic,
      String otherDiastolic,
      String otherMean,
      String expected) {
    RowsInMemory rows =
        RowsInMemory.ofOnePatient()
            .add(TABLE, values(systolic, diastolic, mean))
            .add(TABLE, values(otherSystolic, otherDiastolic, otherMean));

    assertEquals(List.of(expected), standing(rows));
    assertEquals(new Accounting.Line(2, 1, 1, 0), rows.check().account(TABLE));
    assertTrue(rows.check().findings(TABLE).contains("rival-pressures 1"));
  }

  @Test
  void readingsOfAnotherMethodOrInstantAreNoRivals() {
    RowsInMemory rows =
        RowsInMemory.ofOnePatient()
            .add(TABLE, "systolic=120", "method=cuff")
            .add(TABLE, "systolic=121", "method=arterial-line")
            .add(TABLE, "systolic=122", "method=unknown")
            .add(TABLE, "systolic=123", "method=")
            .add(TABLE, "systolic=124", "method=cuff", "measured_at=2031-03-02T08:00:01");
    Checked checked = rows.check();

    assertEquals(List.of("121/80/-", "120/80/-", "122/80/-", "124/80/-"), standing(rows));
    assertEquals(List.of("rival-pressures 1"), checked.findings(TABLE));
    assertEquals(new Accounting.Line(5, 4, 1, 0), checked.account(TABLE));
  }

  @Test
  void aReadingInTheQuarantineIsNoRival() {
    Checked checked =
        RowsInMemory.ofOnePatient()
            .add(TABLE, values("120", "80", ""))
            .add(TABLE, values("20", "", ""))
            .check();

    assertEquals(new Accounting.Line(2, 1, 0, 1), checked.account(TABLE));
    assertEquals(0, checked.count(FindingKind.RIVAL_PRESSURES));
  }
}
