package millrace.etl.record;

/** A value of a coded column. */
public interface Word {
  /** The value as the extract writes it. */
  String word();
}
