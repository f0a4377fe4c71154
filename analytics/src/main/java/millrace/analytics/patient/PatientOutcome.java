package millrace.analytics.patient;

import java.util.List;
import millrace.analytics.mart.AdmissionRow;
import millrace.analytics.mart.DoseLine;
import millrace.analytics.mart.EpisodeRow;
import millrace.analytics.mart.GradualRiseRow;
import millrace.analytics.mart.LinkRow;
import millrace.analytics.mart.PressureLine;
import millrace.analytics.mart.QuarantineRow;
import millrace.analytics.mart.ReplacementLine;
import millrace.analytics.mart.ResultLine;
import millrace.analytics.mart.StayLine;

/** The published rows of one patient. The ids of episodes are not given yet. */
public record PatientOutcome(
    List<AdmissionRow> admissions,
    List<EpisodeRow> episodes,
    List<GradualRiseRow> gradualRises,
    List<LinkRow> links,
    List<QuarantineRow> quarantine,
    List<ResultLine> results,
    List<DoseLine> doses,
    List<PressureLine> pressures,
    List<StayLine> stays,
    List<ReplacementLine> replacements) {}
