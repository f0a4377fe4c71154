package millrace.etl.spark;

import java.util.List;
import millrace.etl.check.Accounting;
import millrace.etl.check.CheckContext;
import millrace.etl.check.Findings;
import millrace.etl.check.Quarantined;
import millrace.etl.contract.ExtractDescriptor;
import org.apache.spark.broadcast.Broadcast;
import org.apache.spark.sql.Dataset;
import org.apache.spark.sql.Row;

/**
 * An extract opened for reading.
 *
 * @param descriptor what its descriptor says
 * @param files its files, in the descriptor's order; a row's file index points here
 * @param fingerprint SHA-256 over the paths and fingerprints of all files
 * @param context what the check of a patient needs
 * @param findings what was found odd in the tables that belong to no patient
 * @param accounting accounts of those tables
 * @param quarantine their broken rows
 * @param patientBlocks all other rows, packed by patient and sorted by patient within each
 *     partition; to be read through {@link PatientStream}
 */
public record ReadExtract(
    ExtractDescriptor descriptor,
    List<ExtractFile> files,
    String fingerprint,
    Broadcast<CheckContext> context,
    Findings findings,
    Accounting accounting,
    List<Quarantined> quarantine,
    Dataset<Row> patientBlocks) {}
