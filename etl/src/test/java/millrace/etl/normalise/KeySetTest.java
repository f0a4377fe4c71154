package millrace.etl.normalise;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Set;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;

class KeySetTest {
  private static KeySet of(Set<String> ids) {
    return KeySet.of(ids.stream().mapToLong(KeySet::hash).toArray());
  }

  @Property(tries = 300)
  void holdsItsIdentifiersAndNoOthers(@ForAll Set<String> ids, @ForAll String another) {
    KeySet keys = of(ids);

    for (String id : ids) {
      assertEquals(true, keys.contains(id));
    }
    assertEquals(ids.contains(another), keys.contains(another));
  }

  @Property(tries = 300)
  void identifiersAreComparedExactly(@ForAll String id) {
    KeySet keys = of(Set.of(id));

    assertEquals(false, keys.contains(id + " "));
    assertEquals(false, keys.contains("0" + id));
  }
}
