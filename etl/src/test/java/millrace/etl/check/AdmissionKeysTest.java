package millrace.etl.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import millrace.etl.record.SourceLine;
import net.jqwik.api.Example;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;

class AdmissionKeysTest {
  private static AdmissionKeys.Claim claim(String patient, int file, int line, boolean valid) {
    return new AdmissionKeys.Claim("A1", patient, new SourceLine(file, line), valid);
  }

  @Property(tries = 100)
  void theFirstClaimOfTheExtractStandsHoweverTheyArrive(@ForAll Random random) {
    List<AdmissionKeys.Claim> claims =
        new ArrayList<>(
            List.of(
                claim("P1", 3, 9, true),
                claim("P2", 3, 40, true),
                claim("P3", 4, 2, false),
                claim("P1", 5, 2, true)));
    Collections.shuffle(claims, random);

    assertEquals(
        new AdmissionKeys.Settled(
            Optional.of("P1"),
            List.of(new SourceLine(3, 40), new SourceLine(4, 2), new SourceLine(5, 2))),
        AdmissionKeys.settle(claims));
  }

  @Example
  void aBrokenFirstClaimKeepsNone() {
    assertEquals(
        new AdmissionKeys.Settled(Optional.empty(), List.of(new SourceLine(1, 3))),
        AdmissionKeys.settle(List.of(claim("P1", 1, 2, false), claim("P2", 1, 3, true))));
  }

  @Example
  void withoutClaimsNoneIsKept() {
    assertEquals(
        new AdmissionKeys.Settled(Optional.empty(), List.of()), AdmissionKeys.settle(List.of()));
  }
}
