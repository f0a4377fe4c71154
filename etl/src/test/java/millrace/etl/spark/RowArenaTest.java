package millrace.etl.spark;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import millrace.etl.contract.ContractTable;
import millrace.etl.parse.RawRow;
import millrace.etl.record.SourceLine;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.Example;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.IntRange;

/** Rows packed by key and unpacked again. */
class RowArenaTest {
  private static final int TABLE = ContractTable.RESULTS.ordinal();

  /** A row, and how many lines it stands below the one before. */
  private record Written(String key, String text, int below) {}

  @Provide
  Arbitrary<List<Written>> rows() {
    return Combinators.combine(
            Arbitraries.of("P1", "P2", "P3", "\u00B5", ""),
            Arbitraries.strings().withCharRange('\u0020', '\u017F').ofMaxLength(200),
            Arbitraries.integers().between(1, 70_000))
        .as(Written::new)
        .list()
        .ofMaxSize(30);
  }

  private static void add(RowArena arena, String key, String text, int line) {
    byte[] source = ("<" + text + ">").getBytes(StandardCharsets.UTF_8);
    byte[] keyBytes = (key + "|").getBytes(StandardCharsets.UTF_8);
    arena.add(line, source, 1, source.length - 1, keyBytes, 0, keyBytes.length - 1);
  }

  private static Map<String, List<String>> unpacked(RowArena arena, int file) {
    Map<String, List<String>> rows = new LinkedHashMap<>();
    for (RowArena.Keyed block : arena.packed(TABLE, file)) {
      Map<ContractTable, List<RawRow>> target = new LinkedHashMap<>();
      target.put(ContractTable.RESULTS, new ArrayList<>());
      PatientBlock.unpack(block.block(), target);
      rows.put(
          block.key(),
          target.get(ContractTable.RESULTS).stream().map(r -> r.source() + r.text()).toList());
    }
    return rows;
  }

  @Property(tries = 300)
  void packedRowsComeBackByKeyWithTheirPlaces(
      @ForAll("rows") List<Written> rows, @ForAll @IntRange(max = 40_000) int file) {
    RowArena arena = new RowArena();
    Map<String, List<String>> expected = new LinkedHashMap<>();
    int line = 1;
    for (Written row : rows) {
      line += row.below();
      add(arena, row.key(), row.text(), line);
      expected
          .computeIfAbsent(row.key(), k -> new ArrayList<>())
          .add(new SourceLine(file, line) + row.text());
    }

    assertEquals(expected, unpacked(arena, file));
  }

  @Example
  void moreKeysAndTextThanTheFirstRoomFit() {
    RowArena arena = new RowArena();
    String text = "x".repeat(40);
    for (int i = 0; i < 60_000; i++) {
      add(arena, "P" + i % 20_000, text + i, i + 2);
    }
    Map<String, List<String>> rows = unpacked(arena, 0);

    assertEquals(20_000, rows.size());
    assertEquals(
        List.of(
            new SourceLine(0, 9) + text + "7",
            new SourceLine(0, 20_009) + text + "20007",
            new SourceLine(0, 40_009) + text + "40007"),
        rows.get("P7"));
  }

  @Example
  void anEmptyArenaHasNoBlock() {
    assertEquals(List.of(), new RowArena().packed(TABLE, 0));
  }
}
