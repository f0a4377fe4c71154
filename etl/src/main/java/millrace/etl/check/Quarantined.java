package millrace.etl.check;

import millrace.etl.contract.ContractTable;
import millrace.etl.record.SourceLine;

/**
 * A row set apart because it broke a rule.
 *
 * @param table its table
 * @param source where it stands
 * @param broken what it broke
 * @param raw its text
 */
public record Quarantined(ContractTable table, SourceLine source, Broken broken, String raw)
    implements java.io.Serializable {}
