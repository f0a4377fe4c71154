package millrace.etl.contract;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Reads {@code datapackage.json} of an extract. */
public final class DescriptorReader {
  /** Name of the descriptor in the extract's folder. */
  public static final String FILE = "datapackage.json";

  private static final String OWN = "surveillance";

  private DescriptorReader() {}

  /**
   * Reads and checks the descriptor.
   *
   * @param folder folder of the extract
   * @throws ContractException if the folder, the descriptor, a property, a required table or a file
   *     is missing or wrong
   */
  public static ExtractDescriptor read(Path folder) {
    if (!Files.isDirectory(folder)) {
      throw new ContractException(
          folder
              + " is no folder; name the folder that holds "
              + FILE
              + " and the tables of the extract");
    }
    Path file = folder.resolve(FILE);
    if (!Files.isRegularFile(file)) {
      throw new ContractException(
          folder
              + " has no "
              + FILE
              + "; an extract is a folder of CSV tables described by that file");
    }
    JsonNode root = parse(file);
    List<ExtractDescriptor.Resource> resources = new ArrayList<>();
    List<String> unknown = new ArrayList<>();
    for (JsonNode resource : root.path("resources")) {
      Optional<ContractTable> table = ContractTable.named(resource.path("name").asText());
      if (table.isPresent()) {
        refuseTwice(file, resources, table.get());
        resources.add(
            new ExtractDescriptor.Resource(
                table.get(), paths(file, folder, resource, table.get())));
      } else {
        unknown.add(resource.path("name").asText());
      }
    }
    refuseMissing(file, resources);
    return new ExtractDescriptor(
        required(file, root, "site"),
        root.path("title").asText(""),
        root.path("description").asText(""),
        cover(file, root),
        List.copyOf(resources),
        List.copyOf(unknown));
  }

  private static JsonNode parse(Path file) {
    try {
      JsonNode root = JsonMapper.builder().build().readTree(Files.readAllBytes(file));
      if (root == null || !root.isObject()) {
        throw new ContractException(
            file + " is no JSON object; write it as a Frictionless Data Package");
      }
      return root;
    } catch (JsonProcessingException e) {
      String where =
          e.getLocation() == null
              ? ""
              : ", line "
                  + e.getLocation().getLineNr()
                  + ", column "
                  + e.getLocation().getColumnNr();
      throw new ContractException(file + where + " is no readable JSON; mend the descriptor", e);
    } catch (IOException e) {
      throw new ContractException(file + " cannot be read; check its permissions", e);
    }
  }

  private static String required(Path file, JsonNode root, String property) {
    String text = root.path(OWN).path(property).asText("").strip();
    if (text.isEmpty()) {
      throw new ContractException(
          file + " has no " + OWN + "." + property + "; add it to the descriptor");
    }
    return text;
  }

  private static Cover cover(Path file, JsonNode root) {
    String zoneName = required(file, root, "zone");
    ZoneId zone;
    try {
      zone = ZoneId.of(zoneName);
    } catch (DateTimeException e) {
      throw new ContractException(
          file
              + ": "
              + OWN
              + ".zone is "
              + zoneName
              + ", which is no IANA zone; write one such as Europe/Dublin or UTC",
          e);
    }
    LocalDate from = date(file, root, "covers_from");
    LocalDate to = date(file, root, "covers_to");
    if (!from.isBefore(to)) {
      throw new ContractException(
          file
              + ": covers_from "
              + from
              + " is not before covers_to "
              + to
              + "; covers_to is the day after the last one");
    }
    return new Cover(zone, from, to);
  }

  private static LocalDate date(Path file, JsonNode root, String property) {
    String text = required(file, root, property);
    try {
      return LocalDate.parse(text);
    } catch (DateTimeException e) {
      throw new ContractException(
          file
              + ": "
              + OWN
              + "."
              + property
              + " is "
              + text
              + ", which is no date; write it as YYYY-MM-DD",
          e);
    }
  }

  private static List<String> paths(
      Path file, Path folder, JsonNode resource, ContractTable table) {
    refuseOtherForms(file, resource, table);
    List<String> paths = new ArrayList<>();
    JsonNode path = resource.path("path");
    if (path.isTextual()) {
      paths.add(path.asText());
    }
    for (JsonNode part : path) {
      paths.add(part.asText());
    }
    if (paths.isEmpty()) {
      throw new ContractException(
          file + ": the resource " + table.tableName() + " has no path; name its file or files");
    }
    for (String part : paths) {
      Path inside = folder.resolve(part).normalize();
      if (part.contains("://") || !inside.startsWith(folder.normalize())) {
        throw new ContractException(
            file
                + ": the path "
                + part
                + " of "
                + table.tableName()
                + " leads out of the extract; put the file inside it");
      }
      if (!Files.isRegularFile(inside)) {
        throw new ContractException(
            file
                + " names "
                + part
                + " for "
                + table.tableName()
                + ", and there is no such file; add it or mend the path");
      }
    }
    return List.copyOf(paths);
  }

  private static void refuseOtherForms(Path file, JsonNode resource, ContractTable table) {
    String encoding = resource.path("encoding").asText("utf-8").toLowerCase(Locale.ROOT);
    if (!encoding.equals("utf-8") && !encoding.equals("utf8") && !encoding.equals("us-ascii")) {
      throw new ContractException(
          file
              + ": the encoding of "
              + table.tableName()
              + " is "
              + encoding
              + "; export the table as UTF-8");
    }
    String delimiter = resource.path("dialect").path("delimiter").asText(",");
    if (!delimiter.equals(",")) {
      throw new ContractException(
          file
              + ": the delimiter of "
              + table.tableName()
              + " is not a comma; export the table with commas");
    }
  }

  private static void refuseTwice(
      Path file, List<ExtractDescriptor.Resource> resources, ContractTable table) {
    if (resources.stream().anyMatch(r -> r.table() == table)) {
      throw new ContractException(
          file
              + " describes "
              + table.tableName()
              + " twice; list all its files in one resource's path");
    }
  }

  private static void refuseMissing(Path file, List<ExtractDescriptor.Resource> resources) {
    for (ContractTable table : ContractTable.values()) {
      if (table.required() && resources.stream().noneMatch(r -> r.table() == table)) {
        throw new ContractException(
            file
                + " has no resource "
                + table.tableName()
                + "; the contract requires that table: add it to the extract");
      }
    }
  }
}
