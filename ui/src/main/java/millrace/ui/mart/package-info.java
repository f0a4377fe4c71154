/** The one reader of the mart: DuckDB on the Parquet files of the served run. */
package millrace.ui.mart;
