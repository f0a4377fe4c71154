package millrace.etl.normalise;

import java.io.Serializable;
import java.util.Map;
import java.util.Optional;

/**
 * What the local codes of an extract stand for.
 *
 * @param analytes LOINC code of each local analyte
 * @param drugs ATC code of each local drug
 */
public record CodeMap(Map<String, String> analytes, Map<String, String> drugs)
    implements Serializable {
  /** Copies the maps. */
  public CodeMap {
    analytes = Map.copyOf(analytes);
    drugs = Map.copyOf(drugs);
  }

  /** The LOINC code of a local analyte, or empty. */
  public Optional<String> loinc(String local) {
    return Optional.ofNullable(analytes.get(local));
  }

  /** The ATC code of a local drug, or empty. */
  public Optional<String> atc(String local) {
    return Optional.ofNullable(drugs.get(local));
  }
}
