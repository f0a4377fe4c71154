package millrace.sampledata.person;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;

/** Every patient has an admission, and all admissions have a patient. */
final class AdmissionCountsTest {
  @Property
  void numbersRunFromNoneToAll(
      @ForAll long seed, @ForAll @IntRange(min = 1, max = 3000) int admissions) {
    AdmissionCounts counts = new AdmissionCounts(seed, admissions);
    long[] numbers = counts.firstNumbers(0, counts.patients());
    assertEquals(0, numbers[0]);
    assertEquals(admissions, numbers[numbers.length - 1]);
    for (int patient = 0; patient + 1 < numbers.length; patient++) {
      long own = numbers[patient + 1] - numbers[patient];
      assertTrue(own >= 1 && own <= 4, "patient " + patient + " has " + own);
    }
  }

  @Property
  void partsAgreeWithTheWhole(
      @ForAll long seed,
      @ForAll @IntRange(min = 400, max = 3000) int admissions,
      @ForAll @IntRange(min = 1, max = 250) int cut) {
    AdmissionCounts counts = new AdmissionCounts(seed, admissions);
    long patients = counts.patients();
    long[] whole = counts.firstNumbers(0, patients);
    assertArrayEquals(
        Arrays.copyOfRange(whole, cut, whole.length), counts.firstNumbers(cut, patients));
    assertArrayEquals(Arrays.copyOf(whole, cut + 1), counts.firstNumbers(0, cut));
  }
}
