package millrace.sampledata.write;

import millrace.sampledata.scenario.CareUnit;
import millrace.sampledata.scenario.Drug;

/** The tables that do not depend on patients. */
public final class HospitalRows {
  /** Name of the invented hospital. */
  public static final String SITE = "Saltreach General";

  private HospitalRows() {}

  /**
   * Writes units and code map.
   *
   * @param buffers where to
   */
  public static void write(Buffers buffers) {
    RowBuffer units = buffers.of(ExtractTable.UNITS);
    for (CareUnit unit : CareUnit.values()) {
      units.begin(0).plain(unit.id()).text(unit.title()).plain(unit.kind().word()).text(SITE).end();
    }
    units
        .begin(0)
        .plain(CareUnit.MED_1.id())
        .text("Heron Ward (name until 2028)")
        .plain("medical")
        .text(SITE)
        .end();
    units.begin(0).plain("DAY").text("Day Surgery").plain("day-case").text(SITE).end();
    RowBuffer map = buffers.of(ExtractTable.CODE_MAP);
    map.begin(0).plain("results").plain("BIO-CREA").plain("loinc").plain("14682-9");
    map.text("Creatinine, serum, West laboratory").end();
    for (Drug drug : Drug.values()) {
      if (drug.mapped()) {
        map.begin(0)
            .plain("administrations")
            .plain(drug.localCode())
            .plain("atc")
            .plain(drug.atc());
        map.text(drug.title()).end();
      }
    }
  }
}
