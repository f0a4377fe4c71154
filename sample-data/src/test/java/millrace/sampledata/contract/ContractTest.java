package millrace.sampledata.contract;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * The small extract keeps to the contract but for its planted faults, and has a fault for every row
 * rule.
 */
final class ContractTest {
  private static final Set<String> RULES =
      Set.of(
          "missing",
          "unreadable",
          "unknown-word",
          "orphan",
          "repeated-key",
          "reversed",
          "outside-life",
          "outside-cover",
          "unit-of-measure",
          "implausible",
          "not-final",
          "not-given");

  private static final Map<String, Map<String, Integer>> BROKEN = new TreeMap<>();
  private static final Map<String, List<Map<String, String>>> TABLES = new HashMap<>();
  private static Extract extract = new Extract("", Map.of());

  @BeforeAll
  static void read() throws IOException {
    extract = Extract.read(Path.of("small-extract"));
    RowChecker checker = new RowChecker();
    for (TableRules rules : TableRules.all()) {
      TABLES.put(rules.table(), extract.table(rules.table()));
      Map<String, Integer> counts = BROKEN.computeIfAbsent(rules.table(), table -> new TreeMap<>());
      for (Map<String, String> row : distinct(rules.table())) {
        counts.merge(checker.check(rules, row), 1, Integer::sum);
      }
    }
  }

  private static List<Map<String, String>> distinct(String table) {
    return TABLES.get(table).stream().distinct().toList();
  }

  @Test
  void everyRuleIsBrokenSomewhere() {
    Set<String> seen = new TreeSet<>();
    BROKEN.values().forEach(counts -> seen.addAll(counts.keySet()));
    seen.remove("");
    assertEquals(new TreeSet<>(RULES), seen, BROKEN.toString());
  }

  @Test
  void everyTableHasAFaultAndMostRowsAreClean() {
    for (TableRules rules : TableRules.all()) {
      Map<String, Integer> counts = BROKEN.get(rules.table());
      int all = counts.values().stream().mapToInt(Integer::intValue).sum();
      int faults = all - counts.get("") - counts.getOrDefault("not-given", 0);
      assertTrue(faults > 0, rules.table() + counts);
      assertTrue(faults <= Math.max(6, all / 10), rules.table() + counts);
    }
  }

  @Test
  void headersAreThoseOfTheContract() {
    for (TableRules rules : TableRules.all()) {
      Set<String> columns = new TreeSet<>(rules.required());
      columns.addAll(rules.optional());
      Set<String> header = new TreeSet<>(TABLES.get(rules.table()).get(0).keySet());
      if (rules.table().equals("conditions")) {
        assertTrue(header.remove("description"), "the column the contract does not know");
      }
      assertEquals(columns, header, rules.table());
    }
    assertEquals(
        List.of("table", "local_code", "code_system", "code", "name"),
        List.copyOf(extract.table("code_map").get(0).keySet()));
  }

  @Test
  void descriptorListsEveryFileAndSaysThatAllIsInvented() {
    assertEquals(new TreeSet<>(extract.files().keySet()), new TreeSet<>(extract.listed()));
    assertEquals(extract.files().size(), extract.listed().size());
    String descriptor = extract.descriptor();
    assertTrue(descriptor.contains("(an invented hospital)"), descriptor);
    assertTrue(
        descriptor.contains("Every person, place and event in this extract is invented."),
        descriptor);
    for (String line :
        List.of(
            "\"zone\": \"Europe/Dublin\"",
            "\"covers_from\": \"2029-04-01\"",
            "\"covers_to\": \"2031-04-01\"")) {
      assertTrue(descriptor.contains(line), line);
    }
  }

  @Test
  void oneFileHasWindowsLineEndsAndOneAByteOrderMark() {
    List<String> windows =
        extract.files().keySet().stream()
            .filter(name -> extract.files().get(name).contains("\r\n"))
            .toList();
    assertEquals(List.of("administrations-0002.csv"), windows);
    List<String> marked =
        extract.files().keySet().stream()
            .filter(name -> extract.files().get(name).startsWith("\uFEFF"))
            .toList();
    assertEquals(List.of("body_measures-0001.csv.gz"), marked);
  }

  @ParameterizedTest
  @ValueSource(strings = {"results", "administrations", "blood_pressures", "conditions"})
  void largeTablesHaveExactDuplicates(String table) {
    assertTrue(distinct(table).size() < TABLES.get(table).size(), table);
  }

  @Test
  void findingsThatAreNoFaultsOccur() {
    assertTrue(any("results", "value", "<.*"), "below a limit");
    assertTrue(any("results", "collected_at", ".*Z"), "offset");
    assertTrue(any("results", "collected_at", "2030-03-31T01:.*"), "spring gap");
    assertTrue(any("results", "collected_at", "2029-10-28T01:.*"), "autumn overlap");
    assertTrue(any("results", "analyte", "BIO-(ALB|CK)"), "unmapped code of results");
    assertTrue(any("administrations", "drug", "LOC-.*"), "unmapped code of drugs");
    assertTrue(any("administrations", "drug", "P-100.*"), "mapped code of drugs");
    assertTrue(any("administrations", "started_at", ".{10}"), "bare date");
    assertTrue(any("administrations", "basis", "ordered"), "orders");
    assertTrue(any("administrations", "dose", "(?s).*\n.*"), "line break in a field");
    assertTrue(any("administrations", "drug_name", ".*,.*"), "comma in a field");
    assertTrue(any("conditions", "recorded_at", ".{10}"), "bare date of a condition");
    assertTrue(any("patients", "birth_date", "1893-.*"), "age above 120");
    assertTrue(any("admissions", "discharged_at", ""), "open stay");
  }

  @Test
  void creatinineComesInBothUnitsAndFromThreeCodes() {
    Set<String> kinds = new TreeSet<>();
    for (Map<String, String> row : TABLES.get("results")) {
      if (Set.of("2160-0", "14682-9", "38483-4", "BIO-CREA").contains(row.get("analyte"))) {
        kinds.add(row.get("analyte") + " " + row.get("unit"));
      }
    }
    List<String> expected =
        new ArrayList<>(
            List.of(
                "14682-9 umol/L",
                "14682-9 \u00B5mol/L",
                "2160-0 mg/dL",
                "38483-4 mg/dL",
                "BIO-CREA umol/L"));
    assertTrue(kinds.containsAll(expected), kinds.toString());
  }

  @ParameterizedTest
  @ValueSource(strings = {"blood_pressures-0001.csv.gz", "blood_pressures-0002.csv.gz"})
  void rowsOfAFileComeInOrderOfTime(String name) {
    List<String> times =
        CsvText.rows(extract.files().get(name)).stream()
            .map(row -> row.get("measured_at"))
            .filter(time -> time.contains(" ") && !time.matches(".*-10-\\d\\d 01:.*"))
            .toList();
    assertTrue(times.size() > 1000, "times: " + times.size());
    assertEquals(times.stream().sorted().toList(), times);
  }

  private static boolean any(String table, String column, String pattern) {
    return TABLES.get(table).stream().anyMatch(row -> row.get(column).matches(pattern));
  }
}
