package millrace.sampledata;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CompletionException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.IntConsumer;
import millrace.sampledata.course.RiskTally;
import millrace.sampledata.person.AdmissionCounts;
import millrace.sampledata.truth.InjuryRows;
import millrace.sampledata.truth.TruthReport;
import millrace.sampledata.write.Buffers;
import millrace.sampledata.write.Descriptor;
import millrace.sampledata.write.ExtractTable;
import millrace.sampledata.write.HospitalRows;
import millrace.sampledata.write.PartFile;

/** Makes an extract and its truth. */
public final class ExtractGenerator {
  private final GenerationOptions options;
  private final AdmissionCounts counts;
  private final Parts parts;

  /**
   * A generator.
   *
   * @param options what to make, and where
   */
  public ExtractGenerator(GenerationOptions options) {
    this.options = options;
    this.counts = new AdmissionCounts(options.seed(), options.admissions());
    this.parts = Parts.of(counts.patients());
  }

  /**
   * Number of parts, for the progress.
   *
   * @return files per table
   */
  public int parts() {
    return parts.count();
  }

  /**
   * Makes everything.
   *
   * @param partDone told the number of finished parts after each
   * @return rows written, without those of units and code map
   * @throws IOException when a file cannot be written
   */
  public long generate(IntConsumer partDone) throws IOException {
    OutputFolder folder = OutputFolder.prepare(options.out());
    long rows = 0;
    RiskTally tally = new RiskTally();
    ExecutorService workers = Executors.newFixedThreadPool(options.threads());
    try (Writer injuries =
        Files.newBufferedWriter(
            folder.truth().resolve("truth_injuries.csv"), StandardCharsets.UTF_8)) {
      injuries.write(InjuryRows.HEADER);
      List<Future<PartTruth>> pending = submit(workers, folder.extract());
      for (int part = 0; part < pending.size(); part++) {
        PartTruth made = join(pending.get(part));
        pending.set(part, null);
        tally.addAll(made.tally());
        injuries.write(made.injuryLines());
        rows += made.rows();
        partDone.accept(part + 1);
      }
    } finally {
      workers.shutdownNow();
    }
    writeHospital(folder.extract());
    String truth = TruthReport.text(options.admissions(), options.seed(), tally);
    Files.writeString(folder.truth().resolve("truth.json"), truth);
    return rows;
  }

  private List<Future<PartTruth>> submit(ExecutorService workers, Path folder) {
    ThreadLocal<PartMaker> makers =
        ThreadLocal.withInitial(() -> new PartMaker(options.seed(), counts));
    List<Future<PartTruth>> pending = new ArrayList<>(parts.count());
    for (int part = 0; part < parts.count(); part++) {
      int number = part;
      pending.add(
          workers.submit(() -> makers.get().make(parts, number, folder, options.packing())));
    }
    return pending;
  }

  private void writeHospital(Path folder) throws IOException {
    Buffers buffers = new Buffers();
    HospitalRows.write(buffers);
    for (ExtractTable table : List.of(ExtractTable.UNITS, ExtractTable.CODE_MAP)) {
      new PartFile(table, 1, options.packing()).write(folder, buffers.of(table));
    }
    Descriptor.write(folder, parts.count(), options.packing());
  }

  private static PartTruth join(Future<PartTruth> part) throws IOException {
    try {
      return part.get();
    } catch (ExecutionException failure) {
      if (failure.getCause() instanceof IOException cause) {
        throw cause;
      }
      throw new CompletionException(failure.getCause());
    } catch (InterruptedException stopped) {
      Thread.currentThread().interrupt();
      throw new UncheckedIOException(
          new IOException("interrupted while making the extract", stopped));
    }
  }
}
