package millrace.etl.spark;

import java.io.Serializable;
import millrace.etl.contract.ContractTable;
import millrace.etl.parse.FileSurvey;

/**
 * A surveyed file of an extract.
 *
 * @param table its table
 * @param path its path inside the extract
 * @param survey what the look through it told
 */
public record ExtractFile(ContractTable table, String path, FileSurvey survey)
    implements Serializable {}
