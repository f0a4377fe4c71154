package millrace.sampledata.write;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import millrace.sampledata.scenario.Calendar;

/** The {@code datapackage.json} of the extract. */
public final class Descriptor {
  private static final String DESCRIPTION =
      "Every person, place and event in this extract is invented. It was made by a program from a seed, with effects of"
          + " drugs and of low blood pressure planted in it, and it describes no real hospital.";

  private Descriptor() {}

  /**
   * Writes the descriptor.
   *
   * @param folder folder of the extract
   * @param parts number of parts of each table
   * @param packing which files are compressed
   * @throws IOException when writing fails
   */
  public static void write(Path folder, int parts, Packing packing) throws IOException {
    Json json = new Json();
    json.object();
    json.field("profile", "data-package").field("name", "saltreach-general-invented");
    json.field(
        "title", "Saltreach General (an invented hospital): kidney injury surveillance extract");
    json.field("description", DESCRIPTION);
    json.key("surveillance").object();
    json.field("site", HospitalRows.SITE).field("zone", Calendar.ZONE.getId());
    json.field("covers_from", Calendar.COVERS_FROM.toString());
    json.field("covers_to", Calendar.COVERS_TO.toString()).close();
    json.key("resources").array();
    for (ExtractTable table : ExtractTable.values()) {
      resource(json, table, table.single() ? 1 : parts, packing);
    }
    json.close().close();
    Files.write(folder.resolve("datapackage.json"), json.text().getBytes(StandardCharsets.UTF_8));
  }

  private static void resource(Json json, ExtractTable table, int parts, Packing packing) {
    List<String> paths = new ArrayList<>(parts);
    for (int part = 1; part <= parts; part++) {
      paths.add(new PartFile(table, part, packing).name());
    }
    json.object().field("name", table.word()).field("profile", "tabular-data-resource");
    json.key("path").array();
    paths.forEach(json::value);
    json.close();
    json.field("format", "csv").field("encoding", "utf-8");
    json.key("schema").object().key("fields").array();
    for (String column : table.columns()) {
      json.object().field("name", column).field("type", "string").close();
    }
    json.close().close().close();
  }
}
