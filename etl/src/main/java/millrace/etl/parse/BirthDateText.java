package millrace.etl.parse;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads a birth date: a date, a month (taken as its 15th) or a year (taken as 1 July). */
public final class BirthDateText {
  private static final Pattern FORM = Pattern.compile("(\\d{4})(?:-(\\d{2})(?:-(\\d{2}))?)?");
  private static final int MIDDLE_OF_MONTH = 15;
  private static final int JULY = 7;

  private BirthDateText() {}

  /** The date, or empty when the text is none. */
  public static Optional<LocalDate> read(String text) {
    Matcher form = FORM.matcher(text);
    if (!form.matches()) {
      return Optional.empty();
    }
    try {
      int year = Integer.parseInt(form.group(1));
      if (form.group(2) == null) {
        return Optional.of(LocalDate.of(year, JULY, 1));
      }
      int month = Integer.parseInt(form.group(2));
      return Optional.of(
          LocalDate.of(
              year,
              month,
              form.group(3) == null ? MIDDLE_OF_MONTH : Integer.parseInt(form.group(3))));
    } catch (DateTimeException e) {
      return Optional.empty();
    }
  }
}
