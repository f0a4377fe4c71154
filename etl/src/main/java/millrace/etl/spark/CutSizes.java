package millrace.etl.spark;

/**
 * Into what sizes an extract is cut. They change how the work is spread, and never a result.
 *
 * @param splitBytes text of a plain file that one task reads
 * @param bucketBytes text of the whole extract behind one part of the patients; the number of parts
 *     is a matter of the extract alone, so that the mart's files are the same on every machine
 */
public record CutSizes(long splitBytes, long bucketBytes) {
  /** The sizes of a run. */
  public static final CutSizes DEFAULT = new CutSizes(32L << 20, 96L << 20);
}
