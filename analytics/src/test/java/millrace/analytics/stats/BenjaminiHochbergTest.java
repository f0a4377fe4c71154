package millrace.analytics.stats;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Size;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class BenjaminiHochbergTest {
  // Benjamini and Hochberg 1995, section 4.
  private static final double[] PAPER = {
    0.0001, 0.0004, 0.0019, 0.0095, 0.0201, 0.0278, 0.0298, 0.0344, 0.0459, 0.3240, 0.4262, 0.5719,
    0.6528, 0.7590, 1.0000
  };

  static Stream<String> sets() {
    return GoldenTable.read("p_adjust.csv").rows().map(row -> row.text("set")).distinct();
  }

  private static List<GoldenTable.Row> rows(String set) {
    return GoldenTable.read("p_adjust.csv")
        .rows()
        .filter(row -> row.text("set").equals(set))
        .toList();
  }

  @ParameterizedTest
  @MethodSource("sets")
  void valuesAreThoseOfRInTheOrderGiven(String set) {
    List<GoldenTable.Row> rows = rows(set);

    double[] found =
        BenjaminiHochberg.qValues(rows.stream().mapToDouble(row -> row.number("p")).toArray());

    assertEquals(rows.size(), found.length);
    for (int i = 0; i < found.length; i++) {
      Closeness.assertRelative(rows.get(i).number("bh"), found[i], 1e-13);
    }
  }

  @Test
  void thePaperRejectsFourOfFifteenAtFivePercent() {
    double[] found = BenjaminiHochberg.qValues(PAPER);

    assertEquals(4, Arrays.stream(found).filter(q -> q <= 0.05).count());
    assertEquals(0.0095, found[2], 1e-12);
    assertEquals(0.035625, found[3], 1e-12);
    assertEquals(0.0603, found[4], 1e-12);
  }

  @Test
  void noValueGivesNoValue() {
    assertArrayEquals(new double[0], BenjaminiHochberg.qValues(new double[0]));
  }

  @Test
  void leavesItsInputAsItWas() {
    double[] given = {0.8, 0.02, 0.03};

    BenjaminiHochberg.qValues(given);

    assertArrayEquals(new double[] {0.8, 0.02, 0.03}, given);
  }

  @ParameterizedTest
  @ValueSource(doubles = {-1e-9, 1.0000001, Double.NaN})
  void refusesWhatIsNoProbability(double value) {
    assertThrows(
        IllegalArgumentException.class,
        () -> BenjaminiHochberg.qValues(new double[] {0.5, value, 0.1}));
  }

  @Property(tries = 300)
  void qIsAtLeastPAndKeepsItsOrderAndItsTies(
      @ForAll @Size(min = 1, max = 40) List<@DoubleRange(min = 0, max = 1) Double> values) {
    double[] p = values.stream().mapToDouble(value -> Math.round(value * 50) / 50.0).toArray();
    double[] q = BenjaminiHochberg.qValues(p);

    for (int i = 0; i < p.length; i++) {
      assertTrue(q[i] >= p[i] && q[i] <= 1, "q " + q[i] + " of p " + p[i]);
      for (int j = 0; j < p.length; j++) {
        assertTrue(p[i] == p[j] ? q[i] == q[j] : p[i] > p[j] || q[i] <= q[j]);
      }
    }
  }
}
