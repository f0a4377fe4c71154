package millrace.analytics.mart;

import java.time.Instant;
import java.util.Optional;

/**
 * An administration to such a patient.
 *
 * @param patientId identifier in the extract
 * @param startedAt start
 * @param endedAt end
 * @param drug code in the extract
 * @param drugName name in the extract; may be empty
 * @param route route
 * @param dose dose and unit as text; may be empty
 * @param basis administered or ordered
 * @param agent agent of the watchlist whose code matches
 * @param drugClass its class
 * @param exposing matches the watchlist by code and route, and counts
 * @param note why it is not exposing: not watched, route not counted, ordered only; empty when it
 *     is
 * @param lagSeconds lag of the agent; 0 when none
 * @param lookBackSeconds look-back of the agent; 0 when none
 * @param file source file
 * @param line source line
 */
public record DoseLine(
    String patientId,
    Instant startedAt,
    Optional<Instant> endedAt,
    String drug,
    String drugName,
    String route,
    String dose,
    String basis,
    Optional<String> agent,
    Optional<String> drugClass,
    boolean exposing,
    String note,
    long lagSeconds,
    long lookBackSeconds,
    String file,
    long line) {}
