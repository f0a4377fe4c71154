package millrace.etl.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.time.Instant;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import millrace.etl.contract.ContractTable;
import millrace.etl.fixture.Checked;
import millrace.etl.fixture.RowsInMemory;
import millrace.etl.record.CreatinineResult;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FindingsTest {
  /** Dublin's clock goes forward on 30 March 2031 and back on 27 October 2030, at 01:00 UTC. */
  @ParameterizedTest
  @CsvSource({
    "2031-03-30T01:30,  2031-03-30T01:30:00Z, clock-gap collected_at 1",
    "2030-10-27T01:30,  2030-10-27T00:30:00Z, clock-overlap collected_at 1",
    "2030-10-27T01:30Z, 2030-10-27T01:30:00Z, ''",
    "2031-03-30T02:00,  2031-03-30T01:00:00Z, ''"
  })
  void aReadingAtAChangeOfTheClockIsCounted(String text, Instant instant, String finding) {
    Checked checked =
        RowsInMemory.ofOnePatient().add(ContractTable.RESULTS, "collected_at=" + text).check();
    CreatinineResult result = checked.only(CheckedPatient::results);

    assertEquals(instant, Instant.ofEpochSecond(result.collectedAt()));
    assertEquals(
        finding.isEmpty() ? List.of() : List.of(finding), checked.findings(ContractTable.RESULTS));
  }

  @Test
  void aRowShorterOrLongerThanItsHeaderIsCounted() {
    Checked checked =
        RowsInMemory.empty()
            .line(ContractTable.PATIENTS, "P1,female,1960")
            .line(ContractTable.PATIENTS, "P2,female,1960,,")
            .line(ContractTable.PATIENTS, "P3,female,1960,")
            .line(ContractTable.PATIENTS, "P4")
            .check();

    assertEquals(List.of("ragged-row 3"), checked.findings(ContractTable.PATIENTS));
    assertEquals(List.of("5 missing sex"), checked.broken(ContractTable.PATIENTS));
  }

  @Test
  void countsOfOneKindTableAndDetailAddUp() {
    Findings findings = new Findings();
    Findings.Key key = new Findings.Key(FindingKind.UNMAPPED_CODE, "results", "CREA");
    findings.count(key.kind(), ContractTable.RESULTS, key.detail());
    findings.add(key, 4);
    findings.count(FindingKind.UNMAPPED_CODE, ContractTable.RESULTS, "ALB");
    findings.add(new Findings.Key(FindingKind.BARE_DATE, "conditions", ""), 0);
    List<String> all = new ArrayList<>();
    findings.forEach((k, count) -> all.add(k.detail() + " " + count));

    assertEquals(List.of("ALB 1", "CREA 5"), all);
  }

  @Test
  void everyKindHasAWordOfItsOwn() {
    assertEquals(
        FindingKind.values().length,
        Arrays.stream(FindingKind.values()).map(FindingKind::word).distinct().count());
  }
}
