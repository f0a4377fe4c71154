package millrace.etl.contract;

import java.util.List;

/**
 * What {@code datapackage.json} says of an extract.
 *
 * @param site short name of the hospital
 * @param title title of the package; may be empty
 * @param description description of the package; may be empty
 * @param cover zone and dates
 * @param resources the files of each table, in the descriptor's order
 * @param unknownResources names of resources that the contract does not have
 */
public record ExtractDescriptor(
    String site,
    String title,
    String description,
    Cover cover,
    List<Resource> resources,
    List<String> unknownResources) {

  /**
   * A table of the extract.
   *
   * @param table table of the contract
   * @param paths its files inside the extract's folder, in order
   */
  public record Resource(ContractTable table, List<String> paths) {}
}
