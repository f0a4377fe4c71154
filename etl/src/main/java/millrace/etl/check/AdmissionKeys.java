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
   * A row of admissions with a key.
   *
   * @param admissionId its key
   * @param patientId its patient; may be empty when the row is not valid
   * @param source where it stands
   * @param valid whether it breaks no rule but perhaps repeated-key
   */
  public record Claim(String admissionId, String patientId, SourceLine source, boolean valid) {}

  /**
   * The claims of one id, settled.
   *
   * @param kept patient of the row that is kept; empty for none
   * @param repeated rows that repeat the key of an earlier one
   */
  public record Settled(Optional<String> kept, List<SourceLine> repeated) {}

  private final CheckContext context;
  private final PatientRows patientRows = new PatientRows();
  private final TableSieve<Patient> patients;
  private final ClaimRows claimRows;
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
    claimRows = new ClaimRows(context, ignored);
    claims =
        new TableSieve<>(
            ContractTable.ADMISSIONS, claimRows, context.layouts(), clock, ignored, unused);
  }

  /** The claims of one patient's rows of {@code patients} and {@code admissions}. */
  public List<Claim> claims(Map<ContractTable, List<RawRow>> rows) {
    List<Quarantined> aside = new ArrayList<>();
    patientRows.startGroup();
    List<Patient> found =
        patients.sift(rows.getOrDefault(ContractTable.PATIENTS, List.of()), Person.UNKNOWN, aside);
    Person person =
        found.isEmpty() ? Person.UNKNOWN : Person.of(found.get(0), context.cover().zone());
    List<Claim> all = new ArrayList<>();
    claimRows.brokenInto(all);
    all.addAll(claims.sift(rows.getOrDefault(ContractTable.ADMISSIONS, List.of()), person, aside));
    return all;
  }

  /**
   * Settles all claims of one id: later rows repeat the key of the first, which is kept if it is
   * valid.
   */
  public static Settled settle(List<Claim> ofOneId) {
    List<Claim> ordered = new ArrayList<>(ofOneId);
    ordered.sort(Comparator.comparing(Claim::source));
    if (ordered.isEmpty()) {
      return new Settled(Optional.empty(), List.of());
    }
    Claim first = ordered.get(0);
    Optional<String> kept = first.valid() ? Optional.of(first.patientId()) : Optional.empty();
    List<SourceLine> repeated = ordered.stream().skip(1).map(Claim::source).toList();
    return new Settled(kept, repeated);
  }

  /** Rows of admissions as claims, broken ones too. */
  private static final class ClaimRows implements RowKind<Claim> {
    private final AdmissionRows rows;
    private List<Claim> broken = new ArrayList<>();

    ClaimRows(CheckContext context, Findings findings) {
      rows = new AdmissionRows(context, findings);
    }

    void brokenInto(List<Claim> target) {
      broken = target;
    }

    @Override
    public Broken broken(ParsedRow row, Person person) {
      return rows.broken(row, person);
    }

    @Override
    public Claim keep(ParsedRow row, Person person) {
      return claim(row, true);
    }

    @Override
    public void sawBroken(ParsedRow row) {
      if (!AdmissionRows.id(row).isEmpty()) {
        broken.add(claim(row, false));
      }
    }

    private static Claim claim(ParsedRow row, boolean valid) {
      return new Claim(AdmissionRows.id(row), row.text(PATIENT_ID), row.source, valid);
    }

    private static final int PATIENT_ID = ContractTable.ADMISSIONS.column("patient_id");
  }
}
