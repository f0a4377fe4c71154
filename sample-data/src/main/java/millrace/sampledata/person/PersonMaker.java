package millrace.sampledata.person;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import millrace.sampledata.scenario.Calendar;
import millrace.sampledata.scenario.Chance;

/** Invents a patient: age, kidneys, and admissions with their stays. */
public final class PersonMaker {
  private static final long DAY = 86_400;

  private final Chance chance;
  private final PathPlanner paths;

  /**
   * A maker for one patient.
   *
   * @param chance the patient's dice
   */
  public PersonMaker(Chance chance) {
    this.chance = chance;
    this.paths = new PathPlanner(chance.split());
  }

  /**
   * Invents the patient.
   *
   * @param number number of the patient
   * @param firstAdmission number of the first admission
   * @param admissions how many admissions
   * @return the patient
   */
  public Person make(long number, long firstAdmission, int admissions) {
    double draw = chance.uniform();
    Population population =
        draw < 0.08 ? Population.CHILD : draw < 0.16 ? Population.MATERNITY : Population.GENERAL;
    boolean female = population == Population.MATERNITY || chance.happens(0.48);
    int ageYears = age(population);
    LocalDate bornOn = Calendar.COVERS_FROM.minusYears(ageYears).minusDays(chance.below(365));
    Kidneys kidneys = kidneys(population, ageYears);
    double baselineMgDl = baseline(kidneys, population, female, ageYears);
    int heightCm =
        population == Population.CHILD
            ? 78 + 6 * ageYears + chance.below(8)
            : (female ? 152 : 164) + chance.below(24);
    int weightKg =
        population == Population.CHILD ? 9 + 3 * ageYears + chance.below(5) : 50 + chance.below(55);
    List<Admission> visits = visits(population, firstAdmission, admissions);
    boolean critical = visits.stream().anyMatch(visit -> visit.profile() == Profile.CRITICAL);
    boolean prone =
        chance.happens(population == Population.MATERNITY ? 0.03 : critical ? 0.26 : 0.11);
    boolean testedOutside = chance.happens(kidneys == Kidneys.ORDINARY ? 0.63 : 0.85);
    String id = "P" + digits(number + 1, 7);
    return new Person(
        id,
        female,
        bornOn,
        population,
        kidneys,
        baselineMgDl,
        heightCm,
        weightKg,
        prone,
        testedOutside,
        visits);
  }

  private int age(Population population) {
    return switch (population) {
      case CHILD -> 1 + chance.below(14);
      case MATERNITY -> 19 + chance.below(22);
      case GENERAL ->
          chance.happens(0.3)
              ? 19 + chance.below(40)
              : Math.min(97, (int) (70 + 12 * chance.bell()));
    };
  }

  private Kidneys kidneys(Population population, int ageYears) {
    if (population != Population.GENERAL) {
      return Kidneys.ORDINARY;
    }
    double draw = chance.uniform();
    if (draw < 0.011) {
      return Kidneys.MAINTENANCE_HAEMODIALYSIS;
    }
    if (draw < 0.014) {
      return Kidneys.MAINTENANCE_PERITONEAL;
    }
    if (draw < 0.021) {
      return Kidneys.TRANSPLANT;
    }
    return draw < 0.021 + (ageYears >= 60 ? 0.15 : 0.02) ? Kidneys.REDUCED : Kidneys.ORDINARY;
  }

  private double baseline(Kidneys kidneys, Population population, boolean female, int ageYears) {
    if (population == Population.CHILD) {
      return 0.22 + 0.028 * ageYears + chance.within(-0.02, 0.04);
    }
    return switch (kidneys) {
      case ORDINARY ->
          (population == Population.MATERNITY ? 0.55 : female ? 0.72 : 0.92) + 0.1 * chance.bell();
      case REDUCED -> chance.within(1.35, 2.5);
      case MAINTENANCE_HAEMODIALYSIS, MAINTENANCE_PERITONEAL -> chance.within(4.5, 9.0);
      case TRANSPLANT -> chance.within(1.1, 1.9);
    };
  }

  /**
   * Admissions from the last, uniform in the time covered, backwards; the earliest may be history.
   */
  private List<Admission> visits(Population population, long firstAdmission, int count) {
    List<Admission> visits = new ArrayList<>(count);
    long latest = chance.between(Calendar.FROM / 60 - 20 * 1440, Calendar.TO / 60 - 60) * 60;
    for (int index = count - 1; index >= 0; index--) {
      Profile profile = profile(population);
      long length =
          Math.max(
              8 * 3600,
              Math.min(70 * DAY, seconds(chance.skewed(profile.medianDays(), profile.spread()))));
      long admittedAt = index == count - 1 ? latest : latest - length;
      boolean died =
          index == count - 1
              && chance.happens(
                  profile == Profile.CRITICAL ? 0.16 : profile == Profile.MEDICAL ? 0.04 : 0.005);
      String id = "A" + digits(firstAdmission + index + 1, 8);
      long dischargedAt = admittedAt + length;
      visits.add(
          new Admission(
              id,
              profile,
              admittedAt,
              dischargedAt,
              died,
              paths.plan(profile, admittedAt, dischargedAt)));
      double gapDays =
          chance.happens(0.3)
              ? chance.within(3.0, 30.0)
              : Math.min(360.0, 30.0 + chance.exponential(110.0));
      latest = admittedAt - seconds(gapDays);
    }
    Collections.reverse(visits);
    return visits;
  }

  private Profile profile(Population population) {
    if (population == Population.CHILD) {
      return Profile.CHILD;
    }
    if (population == Population.MATERNITY) {
      return Profile.MATERNITY;
    }
    double draw = chance.uniform();
    return draw < 0.45
        ? Profile.MEDICAL
        : draw < 0.75
            ? Profile.SURGICAL
            : draw < 0.84 ? Profile.CRITICAL : draw < 0.92 ? Profile.CANCER : Profile.SHORT;
  }

  private static long seconds(double days) {
    return (long) (days * 1440) * 60;
  }

  private static String digits(long number, int width) {
    String text = Long.toString(number);
    return "0".repeat(Math.max(0, width - text.length())) + text;
  }
}
