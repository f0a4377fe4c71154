package millrace.analytics.episode;

import java.util.Optional;
import java.util.OptionalInt;

/**
 * An episode of acute kidney injury (methods 5).
 *
 * @param span its extent, reference and evidence
 * @param origin where it began
 * @param stage its highest stage before closing
 * @param peakResult index of its first highest result; empty when it has none
 * @param transientCourse closed within 48 h
 * @param prolonged not closed within 7 d
 * @param outcome at discharge; empty when the origin is outside
 */
public record Episode(
    Span span,
    Origin origin,
    int stage,
    OptionalInt peakResult,
    boolean transientCourse,
    boolean prolonged,
    Optional<Outcome> outcome) {}
