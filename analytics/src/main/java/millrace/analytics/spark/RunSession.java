package millrace.analytics.spark;

import java.util.Optional;
import org.apache.spark.SparkConf;
import org.apache.spark.sql.SparkSession;

/** A Spark session with the settings that the program fixes in code. */
public final class RunSession {
  private RunSession() {}

  /**
   * Starts a session.
   *
   * @param master master the caller names; without one that of spark-submit, else all local cores
   */
  public static SparkSession start(Optional<String> master) {
    SparkConf conf = new SparkConf();
    conf.setAppName("Millrace");
    if (master.isPresent()) {
      conf.setMaster(master.get());
    } else if (!conf.contains("spark.master")) {
      conf.setMaster("local[*]");
    }
    if (conf.get("spark.master").startsWith("local")) {
      conf.set("spark.driver.host", "127.0.0.1");
      conf.set("spark.driver.bindAddress", "127.0.0.1");
    }
    conf.set("spark.ui.enabled", "false");
    conf.set("spark.sql.session.timeZone", "UTC");
    conf.set("spark.sql.datetime.java8API.enabled", "true");
    conf.set("spark.sql.shuffle.partitions", "4");
    conf.set("spark.sql.adaptive.enabled", "false");
    // A file for each part of the patients from each part of a table would be tens of thousands of
    // files.
    conf.set("spark.shuffle.sort.bypassMergeThreshold", "1");
    conf.set("spark.sql.shuffle.orderIndependentChecksum.enabled", "false");
    conf.set("spark.sql.inMemoryColumnarStorage.compressed", "false");
    conf.set("spark.serializer", "org.apache.spark.serializer.JavaSerializer");
    return SparkSession.builder().config(conf).getOrCreate();
  }
}
