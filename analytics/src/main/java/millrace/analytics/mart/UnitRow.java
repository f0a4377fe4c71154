package millrace.analytics.mart;

/**
 * A unit of the hospital.
 *
 * @param unitId identifier in the extract
 * @param name name
 * @param kind kind of unit, a word of the contract
 */
public record UnitRow(String unitId, String name, String kind) {}
