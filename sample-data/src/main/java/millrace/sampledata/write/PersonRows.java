package millrace.sampledata.write;

import java.util.List;
import millrace.sampledata.course.Chart;
import millrace.sampledata.person.Admission;
import millrace.sampledata.person.Person;
import millrace.sampledata.person.Population;
import millrace.sampledata.person.Profile;
import millrace.sampledata.person.Stay;
import millrace.sampledata.scenario.Calendar;
import millrace.sampledata.scenario.Chance;
import millrace.sampledata.scenario.UnitKind;

/** The small tables of one patient. */
final class PersonRows {
  private static final long DAY = 86_400;

  private final Buffers buffers;

  PersonRows(Buffers buffers) {
    this.buffers = buffers;
  }

  void write(Chart chart, Chance chance) {
    patient(chart, chance);
    List<Admission> admissions = chart.admissions();
    for (int index = 0; index < admissions.size(); index++) {
      Admission admission = admissions.get(index);
      admission(chart.person(), admission, chance);
      admission.stays().forEach(stay -> stay(admission, stay));
      measures(chart.person(), admission, chance);
      urine(chart.person(), admission, chance);
    }
    new ConditionRows(buffers.of(ExtractTable.CONDITIONS), chance).write(chart);
  }

  private void patient(Chart chart, Chance chance) {
    Person person = chart.person();
    RowBuffer row = buffers.of(ExtractTable.PATIENTS).begin(0);
    row.plain(person.id()).plain(sex(person, chance)).plain(birthDate(person, chance));
    if (chart.diedAt().isEmpty()) {
      row.empty();
    } else if (chance.happens(0.15)) {
      row.date(chart.diedAt().getAsLong());
    } else {
      row.minute(chart.diedAt().getAsLong());
    }
    row.end();
  }

  private static String sex(Person person, Chance chance) {
    double draw = chance.uniform();
    if (person.population() == Population.GENERAL && draw < 0.004) {
      return draw < 0.001 ? "other" : "unknown";
    }
    return person.female() ? "female" : "male";
  }

  /**
   * A few sources know only the year, or the month; never of the young, whose class might change by
   * it.
   */
  private static String birthDate(Person person, Chance chance) {
    String date = person.bornOn().toString();
    boolean old = person.bornOn().getYear() < Calendar.COVERS_FROM.getYear() - 22;
    double draw = chance.uniform();
    return !old || draw > 0.02 ? date : draw < 0.01 ? date.substring(0, 4) : date.substring(0, 7);
  }

  private void admission(Person person, Admission admission, Chance chance) {
    RowBuffer row = buffers.of(ExtractTable.ADMISSIONS).begin(admission.admittedAt());
    row.plain(admission.id()).plain(person.id()).minute(admission.admittedAt());
    double draw = chance.uniform();
    if (admission.dischargedAt() >= Calendar.TO) {
      row.empty().empty();
    } else {
      String status =
          admission.died()
              ? "died"
              : draw < 0.88 ? "home" : draw < 0.96 ? "transfer" : draw < 0.99 ? "other" : "";
      row.minute(admission.dischargedAt()).plain(status);
    }
    row.end();
  }

  private void stay(Admission admission, Stay stay) {
    if (stay.enteredAt() >= Calendar.TO) {
      return;
    }
    RowBuffer row = buffers.of(ExtractTable.UNIT_STAYS).begin(stay.enteredAt());
    row.plain(admission.id()).plain(stay.unit().id()).minute(stay.enteredAt());
    row.minute(stay.leftAt() >= Calendar.TO ? 0 : stay.leftAt()).end();
  }

  private void measures(Person person, Admission admission, Chance chance) {
    boolean child = person.population() == Population.CHILD;
    long at = admission.admittedAt() + chance.between(20, 400) * 60;
    if (chance.happens(child ? 0.95 : 0.6)
        && at < Math.min(admission.dischargedAt(), Calendar.TO)) {
      RowBuffer row = buffers.of(ExtractTable.BODY_MEASURES).begin(at);
      row.plain(person.id()).minute(at).number(person.weightKg());
      row.numberOrEmpty(child || chance.happens(0.5) ? person.heightCm() : 0).end();
    }
  }

  private void urine(Person person, Admission admission, Chance chance) {
    if (admission.profile() != Profile.CRITICAL || !chance.happens(0.3)) {
      return;
    }
    long end =
        Math.min(Math.min(admission.dischargedAt(), Calendar.TO), admission.admittedAt() + 2 * DAY);
    for (long at = admission.admittedAt() + 4 * 3600; at < end; at += 4 * 3600) {
      if (admission.unitAt(at).kind() == UnitKind.CRITICAL_CARE) {
        RowBuffer row = buffers.of(ExtractTable.URINE_OUTPUTS).begin(at);
        row.plain(person.id()).plain(admission.id()).minute(at - 4 * 3600).minute(at);
        row.number(40 + chance.below(360)).end();
      }
    }
  }
}
