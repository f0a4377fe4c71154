package millrace.sampledata.contract;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.OffsetDateTime;
import java.time.ZoneId;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;

/**
 * Names the first rule that a row breaks; written from the contract's table of row rules, and
 * knowing no generator.
 */
final class RowChecker {
  private static final Set<String> CREATININE =
      Set.of("2160-0", "38483-4", "14682-9", "77140-2", "21232-4", "59826-8", "BIO-CREA");
  private static final Map<String, Double> PER_MG_DL =
      Map.of(
          "mg/dl",
          1.0,
          "umol/l",
          88.4,
          "\u00B5mol/l",
          88.4,
          "\u03BCmol/l",
          88.4,
          "mg/l",
          10.0,
          "mmol/l",
          0.0884);
  private static final LocalDateTime COVERS_TO = LocalDate.of(2031, 4, 1).atStartOfDay();

  /** Kept rows by table and key. */
  private final Map<String, Map<String, Map<String, String>>> kept = new HashMap<>();

  /** The rule, or an empty text for a clean row, which is kept for others to refer to. */
  String check(TableRules rules, Map<String, String> row) {
    String broken = broken(rules, row);
    if (broken.isEmpty() && !rules.key().isEmpty()) {
      rows(rules.table()).put(row.get(rules.key()), row);
    }
    return broken;
  }

  private String broken(TableRules rules, Map<String, String> row) {
    if (rules.required().stream().anyMatch(column -> row.get(column).isEmpty())) {
      return "missing";
    }
    if (!readable(rules, row)) {
      return "unreadable";
    }
    if (rules.words().entrySet().stream()
        .anyMatch(
            list ->
                !row.get(list.getKey()).isEmpty()
                    && !list.getValue().contains(row.get(list.getKey())))) {
      return "unknown-word";
    }
    if (rules.references().entrySet().stream()
        .anyMatch(reference -> orphan(reference.getValue(), row.get(reference.getKey())))) {
      return "orphan";
    }
    if (!rules.key().isEmpty() && rows(rules.table()).containsKey(row.get(rules.key()))) {
      return "repeated-key";
    }
    return timed(rules, row);
  }

  private String timed(TableRules rules, Map<String, String> row) {
    String first =
        rules.times().stream().map(row::get).filter(time -> !time.isEmpty()).findFirst().orElse("");
    if (!rules.end().isEmpty()
        && !row.get(rules.end()).isEmpty()
        && time(row.get(rules.end())).isBefore(time(first))) {
      return "reversed";
    }
    if (!first.isEmpty() && !rules.table().equals("patients")) {
      Map<String, String> patient = patient(row);
      boolean unborn = time(first).toLocalDate().isBefore(birth(patient.get("birth_date")));
      String died = patient.get("died_at");
      if (unborn
          || !died.isEmpty()
              && time(first).isAfter(time(died).plusDays(1).withHour(23).withMinute(59))) {
        return "outside-life";
      }
      if (!time(first).isBefore(COVERS_TO)) {
        return "outside-cover";
      }
    }
    return switch (rules.table()) {
      case "results" -> result(row);
      case "blood_pressures" -> pressure(row);
      case "administrations" -> List.of("", "given").contains(row.get("action")) ? "" : "not-given";
      default -> "";
    };
  }

  private static String result(Map<String, String> row) {
    if (CREATININE.contains(row.get("analyte"))) {
      Double scale = PER_MG_DL.get(row.get("unit").toLowerCase(Locale.ROOT));
      if (scale == null) {
        return "unit-of-measure";
      }
      double mgDl = number(row.get("value")) / scale;
      if (mgDl < 0.1 || mgDl > 40) {
        return "implausible";
      }
    }
    return List.of("cancelled", "preliminary").contains(row.get("status")) ? "not-final" : "";
  }

  private static String pressure(Map<String, String> row) {
    double systolic = within(row.get("systolic"), 30, 300);
    double highest = systolic > 0 ? Math.min(225, systolic - 5) : 225;
    boolean none =
        systolic + within(row.get("diastolic"), 10, highest) + within(row.get("mean"), 20, 250)
            == 0;
    return none ? "implausible" : "";
  }

  private static double within(String field, double lowest, double highest) {
    double value = field.isEmpty() ? 0 : number(field);
    return value >= lowest && value <= highest ? value : 0;
  }

  private boolean orphan(String table, String id) {
    return !id.isEmpty() && !rows(table).containsKey(id);
  }

  private Map<String, String> patient(Map<String, String> row) {
    String id =
        row.containsKey("patient_id")
            ? row.get("patient_id")
            : rows("admissions").get(row.get("admission_id")).get("patient_id");
    return rows("patients").get(id);
  }

  private Map<String, Map<String, String>> rows(String table) {
    return kept.computeIfAbsent(table, name -> new HashMap<>());
  }

  private static boolean readable(TableRules rules, Map<String, String> row) {
    try {
      rules.times().stream()
          .map(row::get)
          .filter(time -> !time.isEmpty())
          .forEach(RowChecker::time);
      rules.numbers().stream()
          .map(row::get)
          .filter(field -> !field.isEmpty())
          .forEach(RowChecker::number);
      if (row.containsKey("birth_date")) {
        birth(row.get("birth_date"));
      }
      return true;
    } catch (DateTimeException | NumberFormatException unreadable) {
      return false;
    }
  }

  private static double number(String field) {
    return Double.parseDouble(
        field.startsWith("<") || field.startsWith(">") ? field.substring(1) : field);
  }

  private static LocalDate birth(String field) {
    return LocalDate.parse(
        field.length() == 4 ? field + "-07-01" : field.length() == 7 ? field + "-15" : field);
  }

  private static LocalDateTime time(String field) {
    if (field.length() == 10) {
      return LocalDate.parse(field).atTime(12, 0);
    }
    String text = field.replace(' ', 'T');
    return text.endsWith("Z")
        ? OffsetDateTime.parse(text).atZoneSameInstant(ZoneId.of("Europe/Dublin")).toLocalDateTime()
        : LocalDateTime.parse(text);
  }
}
