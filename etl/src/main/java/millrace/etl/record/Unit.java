package millrace.etl.record;

/**
 * A unit of the hospital.
 *
 * @param unitId identifier in the extract
 * @param name name
 * @param kind kind
 */
public record Unit(String unitId, String name, UnitKind kind) implements java.io.Serializable {}
