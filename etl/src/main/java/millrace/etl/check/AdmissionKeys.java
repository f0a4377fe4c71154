package millrace.etl.check;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import millrace.etl.contract.ContractTable;
import millrace.etl.parse.RawRow;
import millrace.etl.parse.WallClock;
import millrace.etl.record.Patient;
import millrace.etl.record.SourceLine;

/**
 * The only check that looks beyond one patient: which rows of {@code admissions} repeat an id. Each
 * patient's rows become claims; the claims of one id are then settled together. Not for several
 * threads.
 */
public final class AdmissionKeys {
  /**
   * A row of admissions that broke no rule before repeated-key.
   *
   * @param admissionId its key
   * @param patientId its patient
   * @param source where it stands
   * @param valid whether it breaks no later rule either
   */
  public record Claim(String admissionId, String patientId, SourceLine source, boolean valid) {}

  /**
   * The claims of one id, settled.
   *
   * @param kept patient of the row that is kept; empty for none
   * @param repeated rows that repeat the key of the kept one
   */
  public record Settled(Optional<String> kept, List<SourceLine> repeated) {}

  private final CheckContext context;
  private final PatientRows patientRows = new PatientRows();
  private final TableSieve<Patient> patients;
  private final TableSieve<Claim> claims;

  /** Claims against that extract; its repeated admissions are not known yet. */
  public AdmissionKeys(CheckContext context) {
    this.context = context;
    WallClock clock = new WallClock(context.cover().zone());
    Findings ignored = new Findings();
    Accounting unused = new Accounting();
    patients =
        new TableSieve<>(
            ContractTable.PATIENTS, patientRows, context.layouts(), clock, ignored, unused);
    claims =
        new TableSieve<>(
            ContractTable.ADMISSIONS,
            new ClaimRows(context, ignored),
            context.layouts(),
            clock,
            ignored,
            unused);
  }

  /** The claims of one patient's rows of {@code patients} and {@code admissions}. */
  public List<Claim> claims(Map<ContractTable, List<RawRow>> rows) {
    List<Quarantined> aside = new ArrayList<>();
    patientRows.startGroup();
    List<Patient> found =
        patients.sift(rows.getOrDefault(ContractTable.PATIENTS, List.of()), Person.UNKNOWN, aside);
    if (found.isEmpty()) {
      return List.of();
    }
    Person person = Person.of(found.get(0), context.cover().zone());
    return claims.sift(rows.getOrDefault(ContractTable.ADMISSIONS, List.of()), person, aside);
  }

  /** Settles all claims of one id: the first valid row is kept, later ones repeat its key. */
  public static Settled settle(List<Claim> ofOneId) {
    List<Claim> ordered = new ArrayList<>(ofOneId);
    ordered.sort(Comparator.comparing(Claim::source));
    Optional<String> kept = Optional.empty();
    List<SourceLine> repeated = new ArrayList<>();
    for (Claim claim : ordered) {
      if (kept.isPresent()) {
        repeated.add(claim.source());
      } else if (claim.valid()) {
        kept = Optional.of(claim.patientId());
      }
    }
    return new Settled(kept, repeated);
  }

  /** Rows of admissions as claims. */
  private static final class ClaimRows implements RowKind<Claim> {
    private static final int PATIENT_ID = ContractTable.ADMISSIONS.column("patient_id");
    private final AdmissionRows rows;

    ClaimRows(CheckContext context, Findings findings) {
      rows = new AdmissionRows(context, findings);
    }

    @Override
    public Broken broken(ParsedRow row, Person person) {
      return null;
    }

    @Override
    public Claim keep(ParsedRow row, Person person) {
      return new Claim(
          AdmissionRows.id(row),
          row.text(PATIENT_ID),
          row.source,
          rows.brokenAfterKey(row, person) == null);
    }
  }
}
