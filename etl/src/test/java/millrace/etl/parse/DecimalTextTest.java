package millrace.etl.parse;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.IntStream;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.Tuple;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class DecimalTextTest {
  private static final long NANOMOLES_IN_MG_DL = 88_400;
  private static final BigDecimal LARGEST = BigDecimal.valueOf(Long.MAX_VALUE);
  private static final BigDecimal LOWEST = BigDecimal.valueOf(Long.MIN_VALUE);

  private static boolean read(DecimalText number, String text) {
    byte[] bytes = ("7" + text + "7").getBytes(StandardCharsets.UTF_8);
    return number.read(bytes, 1, bytes.length - 1);
  }

  private static DecimalText of(String text) {
    DecimalText number = new DecimalText();
    assertTrue(read(number, text), text);
    return number;
  }

  private static long nanomoles(String milligramsPerDecilitre) {
    return of(milligramsPerDecilitre).timesRounded(NANOMOLES_IN_MG_DL);
  }

  /** Negative or not, short and long, with or without point, digits before it, and exponent. */
  @Provide
  Arbitrary<String> numbers() {
    Arbitrary<String> sign =
        Arbitraries.frequencyOf(
            Tuple.of(3, Arbitraries.just("")),
            Tuple.of(2, Arbitraries.just("-")),
            Tuple.of(1, Arbitraries.just("+")));
    Arbitrary<String> digits = Arbitraries.strings().numeric().ofMaxLength(22);
    Arbitrary<String> fraction =
        Arbitraries.oneOf(
            Arbitraries.just(""),
            Arbitraries.strings().numeric().ofMaxLength(18).map(f -> "." + f),
            Arbitraries.of(".5", ".05", ".0005", ".49", ".50", ".499999999999"));
    Arbitrary<String> exponent =
        Arbitraries.frequencyOf(
            Tuple.of(5, Arbitraries.just("")),
            Tuple.of(1, Arbitraries.integers().between(-30, 30).map(e -> "e" + e)),
            Tuple.of(1, Arbitraries.integers().between(0, 9).map(e -> "E+" + e)));
    return Combinators.combine(sign, digits, fraction, exponent)
        .as((s, d, f, e) -> s + d + f + e)
        .filter(
            text ->
                text.matches(".*\\d.*") && text.matches("[-+]?(\\d+\\.?\\d*|\\.\\d+)(e.*|E.*)?"));
  }

  @Provide
  Arbitrary<Long> factors() {
    return Arbitraries.oneOf(
        Arbitraries.of(1L, 1_000L, 8_840L, 88_400L, 1_000_000L, 1_000_000_000L, 10_000_000_000L),
        Arbitraries.longs().between(1, 10_000_000_000L));
  }

  @Property(tries = 3_000)
  void timesRoundedIsHalfUpOfTheExactProduct(
      @ForAll("numbers") String text, @ForAll("factors") long factor) {
    BigDecimal exact =
        new BigDecimal(text).multiply(BigDecimal.valueOf(factor)).setScale(0, RoundingMode.HALF_UP);
    DecimalText number = of(text);

    assertEquals(0, new BigDecimal(text).compareTo(number.value()));
    if (exact.compareTo(LOWEST) < 0 || exact.compareTo(LARGEST) > 0) {
      assertThrows(ArithmeticException.class, () -> number.timesRounded(factor));
    } else {
      assertEquals(exact.longValueExact(), number.timesRounded(factor));
    }
  }

  @ParameterizedTest
  @CsvSource({
    "0.5, 1, 1",
    "-0.5, 1, -1",
    "0.49999, 1, 0",
    "-0.49999, 1, 0",
    "1.5, 1, 2",
    "2.5, 1, 3",
    "-2.5, 1, -3",
    ".25, 10, 3",
    "5., 2, 10",
    "-0, 9, 0",
    "007, 1, 7",
    "1e2, 3, 300",
    "999999999999999, 10000, 9999999999999990000",
    "922337203685477.5, 10000, 9223372036854775000"
  })
  void roundsHalfUp(String text, long factor, String product) {
    if (new BigDecimal(product).compareTo(LARGEST) > 0) {
      assertThrows(ArithmeticException.class, () -> of(text).timesRounded(factor));
    } else {
      assertEquals(Long.parseLong(product), of(text).timesRounded(factor));
    }
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "-",
        "+",
        ".",
        "-.",
        "--1",
        "1-",
        "1.2.3",
        "1,5",
        "1 5",
        "0x1F",
        "NaN",
        "Infinity",
        "1e",
        "e5",
        "1e+",
        "12a",
        "\u0661",
        "\uFF11",
        "1e2147483647",
        "1e-101",
        "1e101",
        "1e99999999999",
        "positive",
        "1/2",
        "12345678901234567x"
      })
  void refuses(String text) {
    assertFalse(read(new DecimalText(), text));
  }

  @Test
  void refusesANumberOfMoreThanAHundredDigits() {
    assertFalse(read(new DecimalText(), "1".repeat(101)));
    assertEquals("1".repeat(100), of("1".repeat(100)).value().toPlainString());
  }

  @Test
  void aLongNumberIsForgottenAtTheNextText() {
    DecimalText number = of("12345678901234567890.5");
    assertTrue(read(number, "1.25"));

    assertEquals(125, number.timesRounded(100));
  }

  /** Methods 1: two-decimal mg/dL are exact. */
  @Test
  void everyTwoDecimalCreatinineInMilligramsIsWholeNanomoles() {
    for (int hundredths = 0; hundredths <= 10_000; hundredths++) {
      String text = BigDecimal.valueOf(hundredths, 2).toPlainString();

      assertEquals(hundredths * 884L, nanomoles(text));
      assertEquals(
          0,
          of(text)
              .value()
              .multiply(BigDecimal.valueOf(NANOMOLES_IN_MG_DL))
              .compareTo(BigDecimal.valueOf(nanomoles(text))));
    }
  }

  /** Methods 1: a rise printed as 0.3 mg/dL is 26,520 nmol/L. */
  @Test
  void threeTenthsOfAMilligramAre26520Nanomoles() {
    assertEquals(26_520, nanomoles("0.3"));
    assertEquals(353_600, nanomoles("4.0"));
  }

  private static List<BigDecimal> tenths(int from, int to, int step) {
    return IntStream.iterate(from, t -> t <= to, t -> t + step)
        .mapToObj(t -> BigDecimal.valueOf(t, 1))
        .toList();
  }

  /**
   * Domain reference 1.4, binary floating point trap: of the 57 pairs (x, x + 0.3) with x from 0.3
   * to 5.9, 33 miss a rise of 0.3 in doubles.
   */
  @Test
  void thePairsThatDoublesMissRiseByExactlyThreeTenths() {
    List<BigDecimal> lower = tenths(3, 59, 1);
    BigDecimal rise = new BigDecimal("0.3");
    long missedByDoubles =
        lower.stream().filter(x -> x.add(rise).doubleValue() - x.doubleValue() < 0.3).count();

    assertEquals(57, lower.size());
    assertEquals(33, missedByDoubles);
    for (BigDecimal x : lower) {
      assertEquals(26_520, nanomoles(x.add(rise).toString()) - nanomoles(x.toString()));
    }
  }

  /** Domain reference 1.4: 61 of the 199 pairs (x, 1.5 x) up to 39.8 fail in doubles. */
  @Test
  void thePairsThatDoublesMissReachOneAndAHalfExactly() {
    List<BigDecimal> lower = tenths(2, 398, 2);
    BigDecimal ratio = new BigDecimal("1.5");
    long missedByDoubles =
        lower.stream().filter(x -> x.multiply(ratio).doubleValue() < 1.5 * x.doubleValue()).count();

    assertEquals(199, lower.size());
    assertEquals(61, missedByDoubles);
    for (BigDecimal x : lower) {
      assertEquals(3 * nanomoles(x.toString()), 2 * nanomoles(x.multiply(ratio).toPlainString()));
    }
  }
}
