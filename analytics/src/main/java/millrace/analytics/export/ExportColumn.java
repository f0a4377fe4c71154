package millrace.analytics.export;

/**
 * A column of an export.
 *
 * @param name its name in the CSV
 * @param source column of the published table
 * @param format how it is printed
 */
public record ExportColumn(String name, String source, Format format) {
  static ExportColumn plain(String name) {
    return new ExportColumn(name, name, Format.PLAIN);
  }

  static ExportColumn of(String name, String source, Format format) {
    return new ExportColumn(name, source, format);
  }
}
