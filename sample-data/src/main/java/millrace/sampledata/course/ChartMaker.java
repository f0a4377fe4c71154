package millrace.sampledata.course;

import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import millrace.sampledata.person.Admission;
import millrace.sampledata.person.Kidneys;
import millrace.sampledata.person.Person;
import millrace.sampledata.person.Profile;
import millrace.sampledata.scenario.Calendar;
import millrace.sampledata.scenario.Chance;

/** Lives one patient's time in hospital, admission by admission. */
public final class ChartMaker {
  private static final long HOUR = 3600;
  private static final long DAY = 24 * HOUR;
  private static final long CLEAR_DAYS = 16;

  private final Chance chance;
  private final Person person;
  private final RiskTally counted;
  private final RiskTally uncounted;
  private final Chart chart;
  private final CreatinineCourse course = new CreatinineCourse();
  private final LabRounds rounds;
  private final LabBench bench;
  private final ReplacementPlan replacements;
  private final Aftermath aftermath;
  private boolean unsettled;

  /**
   * A maker for one patient.
   *
   * @param chance the patient's dice
   * @param person the patient
   * @param counted tally of those whose admissions are in rates
   * @param uncounted tally of the others
   */
  public ChartMaker(Chance chance, Person person, RiskTally counted, RiskTally uncounted) {
    this.chance = chance;
    this.person = person;
    this.counted = counted;
    this.uncounted = uncounted;
    this.chart = new Chart(person);
    this.rounds = new LabRounds(chance.split(), person);
    this.bench = new LabBench(chance.split(), person, course, chart.results());
    this.replacements = new ReplacementPlan(chance.split(), chart.replacements());
    this.aftermath = new Aftermath(rounds, replacements);
  }

  /**
   * Lives the patient's time.
   *
   * @return all that is written about it
   */
  public Chart make() {
    outsideBefore(person.admissions().get(0).admittedAt());
    for (int index = 0; index < person.admissions().size(); index++) {
      boolean last = index + 1 == person.admissions().size();
      long next = last ? Long.MAX_VALUE : person.admissions().get(index + 1).admittedAt();
      admit(person.admissions().get(index), next);
    }
    chart.dies(end());
    return chart;
  }

  private OptionalLong end() {
    Admission last = chart.admissions().get(chart.admissions().size() - 1);
    long at = last.dischargedAt();
    if (!last.died()) {
      at = chance.happens(0.03) ? at + chance.between(14 * 1440, 200 * 1440) * 60 : Calendar.TO;
    }
    return at < Calendar.TO ? OptionalLong.of(at) : OptionalLong.empty();
  }

  private void outsideBefore(long firstAdmittedAt) {
    if (!person.testedOutside()) {
      return;
    }
    int draws = 1 + chance.below(4);
    for (int draw = 0; draw < draws; draw++) {
      long day = Calendar.startOfDay(firstAdmittedAt, -(10 + chance.below(340)));
      bench.outside(day + 9 * HOUR + chance.below(8 * 60) * 60, 1);
    }
  }

  private void admit(Admission planned, long next) {
    Visit visit = plan(planned, next);
    Chance own = chance.split();
    boolean inRates = person.inRates() && visit.assessable() && !unsettled;
    Admission admission = planned;
    Optional<Injury> injury = Optional.empty();
    if (person.kidneys().onMaintenance()) {
      long earliest = chart.admissions().isEmpty() ? 0 : lastDischarge();
      replacements.maintenance(person.kidneys(), planned, earliest);
    } else {
      injury = injure(own, visit, walk(visit, inRates ? counted : uncounted));
      if (injury.isPresent()) {
        course.add(injury.get());
        admission = aftermath.suffer(own, injury.get(), visit);
      } else if (planned.dischargedAt() - planned.admittedAt() > 13 * DAY && own.happens(0.08)) {
        course.creep(planned.admittedAt() + DAY, planned.dischargedAt());
      }
    }
    write(admission, visit);
    if (injury.isPresent()) {
      note(injury.get(), admission, inRates);
    }
    followUp(own, admission, next);
  }

  private Visit plan(Admission planned, long next) {
    PressureCourse pressures = new PressureCourse(chance.split(), person, planned);
    pressures.chart(planned.admittedAt(), planned.dischargedAt(), true);
    List<Spell> spells = SpellFinder.find(planned, pressures.readings());
    List<Dose> doses = new Prescriber(chance.split(), person, planned).prescribe(spells);
    return new Visit(planned, next, pressures, spells, doses, rounds.routine(planned));
  }

  private HazardWalk walk(Visit visit, RiskTally tally) {
    Exposures exposures = new Exposures();
    chart.doses().forEach(exposures::add);
    visit.doses().forEach(exposures::add);
    return new HazardWalk(visit.planned(), exposures, visit.spells(), tally);
  }

  private Optional<Injury> injure(Chance own, Visit visit, HazardWalk walk) {
    if (unsettled || visit.draws().size() < 2) {
      return Optional.empty();
    }
    Admission planned = visit.planned();
    long admittedAt = planned.admittedAt();
    if (person.kidneys() != Kidneys.TRANSPLANT
        && own.happens(shareInjuredBefore(planned.profile()))) {
      return Optional.of(Injury.beforeHospital(own, admittedAt, walk.stretchAt(admittedAt)));
    }
    long to = Math.min(planned.dischargedAt(), Calendar.TO);
    OptionalLong injuredAt = walk.walk(admittedAt + 2 * DAY, to, own.exponential(1));
    if (injuredAt.isEmpty()) {
      return Optional.empty();
    }
    long at = injuredAt.getAsLong();
    return Optional.of(
        Injury.inHospital(
            own, at, person.baselineMgDl(), visit.drawnBefore(at), walk.stretchAt(at)));
  }

  private static double shareInjuredBefore(Profile profile) {
    return switch (profile) {
      case MEDICAL, SHORT -> 0.1;
      case CRITICAL -> 0.15;
      case CANCER -> 0.06;
      case SURGICAL -> 0.025;
      case MATERNITY, CHILD -> 0.006;
    };
  }

  private void write(Admission admission, Visit visit) {
    chart.admissions().add(admission);
    long end = Math.min(admission.dischargedAt(), Calendar.TO);
    visit.pressures().readings().stream()
        .filter(reading -> reading.at() < end)
        .forEach(chart.readings()::add);
    visit.pressures().companions().stream()
        .filter(reading -> reading.at() < end)
        .forEach(chart.readings()::add);
    chart.doses().addAll(visit.doses());
    visit.draws().stream().filter(at -> at < end).forEach(at -> bench.inside(admission, at));
  }

  private void note(Injury injury, Admission admission, boolean inRates) {
    long firstResultAt = 0;
    for (LabResult result : chart.results()) {
      boolean seen =
          result.analyte() == Analyte.CREATININE && result.collectedAt() >= injury.injuredAt();
      if (firstResultAt == 0 && seen && result.admissionId().equals(admission.id())) {
        firstResultAt = result.collectedAt();
      }
    }
    int month = injury.where().month();
    boolean planted =
        injury.origin().equals(Injury.HOSPITAL) && month >= 0 && month < Calendar.MONTHS;
    chart.injuries().add(new InjuryNote(admission.id(), injury, inRates && planted, firstResultAt));
  }

  /** Sees the patient again after an injury, so that the next admission starts settled. */
  private void followUp(Chance own, Admission admission, long next) {
    unsettled = false;
    long discharged = admission.dischargedAt();
    if (admission.died()) {
      return;
    }
    boolean injured = course.factorAt(discharged) > 1.05;
    if (injured && next - discharged < CLEAR_DAYS * DAY) {
      unsettled = true;
    } else if (injured || (person.testedOutside() && own.happens(0.4))) {
      long at = discharged + own.between(9 * 1440, 13 * 1440) * 60;
      if (at < Calendar.TO && at < next) {
        bench.outside(at, own.within(0.98, 1.04));
      }
    }
  }

  private long lastDischarge() {
    return chart.admissions().get(chart.admissions().size() - 1).dischargedAt();
  }
}
