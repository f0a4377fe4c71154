package millrace.sampledata.course;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import millrace.sampledata.person.Admission;
import millrace.sampledata.person.Kidneys;
import millrace.sampledata.person.Person;
import millrace.sampledata.person.Population;
import millrace.sampledata.person.Profile;
import millrace.sampledata.scenario.Calendar;
import millrace.sampledata.scenario.Chance;
import millrace.sampledata.scenario.Drug;
import millrace.sampledata.scenario.UnitKind;

/**
 * Prescribes the drugs of one admission. Harmful drugs are given without regard to blood pressure;
 * the loop diuretic is given mostly after its first low spell, so that it shares the blame of the
 * pressure without deserving it.
 */
final class Prescriber {
  private static final long HOUR = 3600;
  private static final long DAY = 24 * HOUR;

  private final Chance chance;
  private final Person person;
  private final Admission admission;
  private final long end;
  private final List<Dose> doses = new ArrayList<>();

  Prescriber(Chance chance, Person person, Admission admission) {
    this.chance = chance;
    this.person = person;
    this.admission = admission;
    this.end = Math.min(admission.dischargedAt(), Calendar.TO);
  }

  /** The doses, in order of time. */
  List<Dose> prescribe(List<Spell> spells) {
    Profile profile = admission.profile();
    if (profile == Profile.SHORT) {
      sometimes(0.7, Drug.PARACETAMOL, span(0, 0.2, 1, 1));
      sometimes(0.2, Drug.IOHEXOL, span(0, 0.1, 1, 1));
      sometimes(0.15, Drug.IBUPROFEN, span(0, 0.2, 1, 1));
      return sorted();
    }
    infections(profile);
    habits(profile);
    pain(profile);
    rareDrugs(profile);
    oddRoutes();
    afterLowPressure(spells);
    return sorted();
  }

  private void infections(Profile profile) {
    double more = profile == Profile.MATERNITY ? 0.2 : profile == Profile.CHILD ? 0.6 : 1;
    boolean vancomycin = sometimes(0.1 * more, Drug.VANCOMYCIN, span(0, 2.5, 4, 9));
    sometimes((vancomycin ? 0.5 : 0.12) * more, Drug.PIPERACILLIN_TAZOBACTAM, span(0, 2.5, 4, 9));
    if (chance.happens(0.08 * more)) {
      double draw = chance.uniform();
      Drug drug = draw < 0.7 ? Drug.GENTAMICIN : draw < 0.9 ? Drug.AMIKACIN : Drug.TOBRAMYCIN;
      course(drug, span(0, 2.5, 3, 8));
    }
    sometimes(0.04 * more, Drug.CO_TRIMOXAZOLE, span(0, 2, 5, 10));
    sometimes(profile == Profile.SURGICAL ? 0.5 : 0.18, Drug.CEFUROXIME, span(0, 1, 1, 4));
  }

  private void habits(Profile profile) {
    if (profile == Profile.MATERNITY || profile == Profile.CHILD) {
      return;
    }
    if (chance.happens(0.24)) {
      course(chance.happens(0.6) ? Drug.RAMIPRIL : Drug.LOSARTAN, span(0, 1, 4, 20));
    }
    sometimes(0.06, Drug.INDAPAMIDE, span(0, 1, 4, 20));
    sometimes(0.33, Drug.PANTOPRAZOLE, span(0, 1.5, 3, 20));
    sometimes(0.45, Drug.ENOXAPARIN, span(0, 1, 3, 20));
    sometimes(0.08, Drug.SALBUTAMOL, span(0, 1, 3, 8));
  }

  private void pain(Profile profile) {
    sometimes(0.55, Drug.PARACETAMOL, span(0, 1, 2, 9));
    double nsaid =
        switch (profile) {
          case SURGICAL -> 0.26;
          case MATERNITY -> 0.4;
          case CHILD -> 0.2;
          default -> 0.09;
        };
    if (chance.happens(nsaid)) {
      double draw = chance.uniform();
      course(
          draw < 0.6 ? Drug.IBUPROFEN : draw < 0.85 ? Drug.DICLOFENAC : Drug.KETOROLAC,
          span(0, 2, 2, 6));
    }
  }

  private void rareDrugs(Profile profile) {
    sometimes(
        profile == Profile.CRITICAL ? 0.25 : profile == Profile.CHILD ? 0.02 : 0.13,
        Drug.IOHEXOL,
        span(0, 4, 1, 1));
    sometimes(profile == Profile.CANCER ? 0.05 : 0.005, Drug.AMPHOTERICIN, span(0, 2, 4, 10));
    if (profile == Profile.CANCER) {
      sometimes(0.12, Drug.CISPLATIN, span(0, 1.5, 1, 2));
    }
    sometimes(0.02, Drug.ACICLOVIR, span(0, 1.5, 4, 8));
    if (person.kidneys() == Kidneys.TRANSPLANT) {
      course(Drug.TACROLIMUS, span(0, 0.5, 10, 30));
    }
  }

  private void oddRoutes() {
    sometimes(0.02, Drug.GENTAMICIN_EYE, span(0, 2, 3, 7));
    sometimes(0.01, Drug.KETOROLAC_EYE, span(0, 2, 3, 7));
    sometimes(0.015, Drug.VANCOMYCIN_ORAL, span(0, 2, 5, 10));
    sometimes(0.008, Drug.TOBRAMYCIN_INHALED, span(0, 2, 5, 10));
    sometimes(0.015, Drug.ACICLOVIR_ORAL, span(0, 2, 5, 7));
    sometimes(0.12, Drug.FLUSH, span(0, 1, 1, 4));
  }

  private void afterLowPressure(List<Spell> spells) {
    boolean low = person.pressureProne() && !spells.isEmpty();
    if (low && chance.happens(0.72)) {
      double days = (spells.get(0).endAt() - admission.admittedAt()) / (double) DAY;
      course(Drug.FUROSEMIDE, span(days + 0.1, days + 0.3, 4, 12));
    } else if (!person.pressureProne() && person.population() != Population.CHILD) {
      sometimes(0.035, Drug.FUROSEMIDE, span(0, 2, 3, 9));
    }
    for (Spell spell : spells) {
      boolean intensive = admission.unitAt(spell.startAt()).kind() == UnitKind.CRITICAL_CARE;
      if (intensive && chance.happens(0.5)) {
        long startedAt = spell.startAt() + 20 * 60;
        long endedAt = Math.min(end, spell.endAt() + chance.between(30, 600) * 60);
        if (endedAt > startedAt) {
          doses.add(
              new Dose(
                  startedAt, endedAt, Drug.NORADRENALINE, "given", false, true, admission.id()));
        }
      }
    }
  }

  private boolean sometimes(double probability, Drug drug, Span span) {
    boolean happens = chance.happens(probability);
    if (happens) {
      course(drug, span);
    }
    return happens;
  }

  private void course(Drug drug, Span span) {
    long at =
        admission.admittedAt() + (long) (chance.within(span.fromDay, span.toDay) * 96) * 900 + 1200;
    long days = span.fewestDays + chance.below(span.mostDays - span.fewestDays + 1);
    long stop = Math.min(end, at + days * DAY - HOUR);
    if (drug.everySeconds() >= DAY && days == 1) {
      stop = Math.min(end, at + 1);
    }
    boolean ordered = chance.happens(0.02);
    for (; at < stop; at += drug.everySeconds()) {
      long startedAt = at + chance.below(31) * 60;
      if (startedAt < end) {
        doses.add(dose(drug, startedAt, ordered));
      }
    }
  }

  private Dose dose(Drug drug, long startedAt, boolean ordered) {
    double draw = chance.uniform();
    String action =
        draw < 0.95
            ? "given"
            : draw < 0.975
                ? "held"
                : draw < 0.99 ? "refused" : draw < 0.997 ? "stopped" : "entered-in-error";
    long endedAt = drug.infusionSeconds() == 0 ? 0 : startedAt + drug.infusionSeconds();
    boolean pump =
        !drug.localCode().isEmpty() && admission.unitAt(startedAt).kind() == UnitKind.CRITICAL_CARE;
    return new Dose(startedAt, endedAt, drug, action, ordered, pump, admission.id());
  }

  private List<Dose> sorted() {
    doses.sort(Comparator.comparingLong(Dose::startedAt));
    return doses;
  }

  private static Span span(double fromDay, double toDay, int fewestDays, int mostDays) {
    return new Span(fromDay, toDay, fewestDays, mostDays);
  }

  /** When a course starts, in days after admission, and how many days it lasts. */
  private record Span(double fromDay, double toDay, int fewestDays, int mostDays) {}
}
