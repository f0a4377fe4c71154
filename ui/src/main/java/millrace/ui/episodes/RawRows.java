package millrace.ui.episodes;

import com.vaadin.flow.component.html.Section;
import java.time.Duration;
import java.time.Instant;
import java.util.List;
import java.util.OptionalDouble;
import millrace.analytics.mart.DoseLine;
import millrace.analytics.mart.PressureLine;
import millrace.analytics.mart.ReplacementLine;
import millrace.analytics.mart.ResultLine;
import millrace.analytics.mart.StayLine;
import millrace.ui.page.DataTable;
import millrace.ui.page.Html;
import millrace.ui.page.Say;

/** The rows behind an episode, each with the line of the file it came from. */
final class RawRows {
  private static final Duration BEFORE = Duration.ofHours(48);

  private RawRows() {}

  static Section of(EpisodeData data, Creatinine unit, Clock clock) {
    List<DoseLine> doses = data.dosesShown();
    Instant windowStart = data.episode().onsetAt().minus(BEFORE);
    List<PressureLine> pressures =
        data.pressures().stream()
            .filter(p -> !p.measuredAt().isBefore(windowStart))
            .filter(p -> !p.measuredAt().isAfter(data.episode().onsetAt()))
            .toList();
    Section section =
        Html.section(
            "The rows behind it",
            "Each with the file of the extract and the line in it.",
            results(data, unit, clock),
            Html.fold(Say.count(doses.size(), "dose"), doses(doses, clock)),
            Html.fold(
                Say.count(pressures.size(), "pressure") + " in the 48 hours before onset",
                pressures(pressures, clock)),
            Html.fold(Say.count(data.stays().size(), "unit stay"), stays(data, clock)));
    if (!data.replacements().isEmpty()) {
      section.add(
          Html.fold(
              Say.count(data.replacements().size(), "kidney replacement"),
              replacements(data, clock)));
    }
    return section;
  }

  private static String source(String file, long line) {
    return file + " : " + Say.count(line);
  }

  private static DataTable results(EpisodeData data, Creatinine unit, Clock clock) {
    DataTable table =
        new DataTable(
            "Creatinine results",
            6,
            "collected",
            "creatinine, " + unit.unit(),
            "against reference",
            "decision",
            "setting",
            "source");
    for (ResultLine r : data.results()) {
      long v = r.nanomolesPerLitre();
      table.row(
          clock.full(r.collectedAt()),
          unit.say(v),
          data.episode().referenceNanomolesPerLitre().isEmpty()
              ? "–"
              : Creatinine.times(v, data.episode().referenceNanomolesPerLitre().getAsLong())
                  + " ×, "
                  + unit.rise(data.episode().referenceNanomolesPerLitre().getAsLong(), v),
          decision(data, r),
          r.setting(),
          source(r.file(), r.line()));
    }
    return table;
  }

  /** What the rules made of a result. */
  static String decision(EpisodeData data, ResultLine r) {
    if (!r.state().equals("used")) {
      return r.state();
    }
    boolean onset = r.collectedAt().equals(data.episode().onsetAt());
    boolean peak = data.episode().peakAt().filter(r.collectedAt()::equals).isPresent();
    if (onset || peak) {
      return onset && peak ? "onset, peak" : onset ? "onset" : "peak";
    }
    if (data.episode().closedAt().filter(r.collectedAt()::equals).isPresent()) {
      return "closes";
    }
    return data.inside(r.collectedAt()) ? "inside" : "–";
  }

  private static DataTable doses(List<DoseLine> doses, Clock clock) {
    DataTable table =
        new DataTable(
            "Doses", 8, "start", "end", "drug", "route", "dose", "agent", "exposes", "source");
    for (DoseLine d : doses) {
      table.row(
          clock.full(d.startedAt()),
          d.endedAt().map(clock::full).orElse("–"),
          NotLinked.drug(d),
          d.route(),
          d.dose(),
          d.agent().orElse("–"),
          d.exposing() ? "yes" : "no: " + d.note(),
          source(d.file(), d.line()));
    }
    return table;
  }

  private static DataTable pressures(List<PressureLine> pressures, Clock clock) {
    DataTable table =
        new DataTable(
            "Blood pressures",
            1,
            "measured",
            "systolic",
            "diastolic",
            "mean used, mmHg",
            "method",
            "decision",
            "holds, min",
            "source");
    for (PressureLine p : pressures) {
      table.row(
          clock.full(p.measuredAt()),
          whole(p.systolic()),
          whole(p.diastolic()),
          whole(p.map()),
          p.method(),
          p.setAside() ? "set aside" : p.low() ? "low" : "–",
          Long.toString(Duration.ofSeconds(p.holdSeconds()).toMinutes()),
          source(p.file(), p.line()));
    }
    return table;
  }

  private static String whole(OptionalDouble value) {
    return value.isEmpty() ? "–" : Say.days(value.getAsDouble());
  }

  private static DataTable stays(EpisodeData data, Clock clock) {
    DataTable table = new DataTable("Unit stays", 4, "unit", "from", "to", "source");
    for (StayLine s : data.stays()) {
      table.row(
          data.units().getOrDefault(s.unitId(), s.unitId()),
          clock.full(s.enteredAt()),
          s.leftAt().map(clock::full).orElse("open"),
          source(s.file(), s.line()));
    }
    return table;
  }

  private static DataTable replacements(EpisodeData data, Clock clock) {
    DataTable table =
        new DataTable(
            "Kidney replacements",
            6,
            "from",
            "to",
            "modality",
            "purpose",
            "masked until",
            "source");
    for (ReplacementLine r : data.replacements()) {
      table.row(
          clock.full(r.startedAt()),
          r.endedAt().map(clock::full).orElse("not recorded"),
          r.modality(),
          r.purpose(),
          clock.full(r.maskedUntil()),
          source(r.file(), r.line()));
    }
    return table;
  }
}
