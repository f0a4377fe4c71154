package millrace.etl.check;

import java.io.Serializable;
import java.util.List;
import java.util.Map;
import java.util.Set;
import millrace.etl.contract.Cover;
import millrace.etl.contract.FileLayout;
import millrace.etl.normalise.CodeMap;
import millrace.etl.normalise.KeySet;
import millrace.etl.record.SourceLine;
import millrace.etl.record.Unit;

/**
 * What the check of one patient needs to know of the extract as a whole.
 *
 * @param cover what the extract covers
 * @param layouts layout of each file, by its index
 * @param units kept units by id
 * @param codes the code map
 * @param admissions ids of all kept admissions
 * @param repeatedAdmissions rows of admissions whose id an earlier kept row has
 */
public record CheckContext(
    Cover cover,
    List<FileLayout> layouts,
    Map<String, Unit> units,
    CodeMap codes,
    KeySet admissions,
    Set<SourceLine> repeatedAdmissions)
    implements Serializable {}
