package millrace.analytics.spark;

import java.io.Serializable;
import java.lang.reflect.RecordComponent;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import millrace.analytics.mart.Columns;
import org.apache.spark.sql.Row;
import org.apache.spark.sql.RowFactory;
import org.apache.spark.sql.types.DataType;
import org.apache.spark.sql.types.DataTypes;
import org.apache.spark.sql.types.StructType;

/**
 * Published rows as Spark rows: one column per record component, optional ones nullable. Spark's
 * own encoders take a record for an empty row without an error.
 *
 * @param <T> row type, a record
 */
public final class RowCodec<T extends Record> implements Serializable {
  private static final long serialVersionUID = 1L;

  private final Class<T> rowType;
  private transient RecordComponent[] components;

  /** A codec of a row type. */
  public RowCodec(Class<T> rowType) {
    this.rowType = rowType;
  }

  /** The columns of the row type. */
  public StructType schema() {
    StructType schema = new StructType();
    List<String> names = Columns.of(rowType);
    RecordComponent[] parts = components();
    for (int i = 0; i < parts.length; i++) {
      schema = schema.add(names.get(i), type(parts[i]), isOptional(parts[i]));
    }
    return schema;
  }

  /** A published row as a Spark row. */
  public Row encode(T row) {
    RecordComponent[] parts = components();
    Object[] values = new Object[parts.length];
    try {
      for (int i = 0; i < parts.length; i++) {
        values[i] = plain(parts[i].getAccessor().invoke(row));
      }
    } catch (ReflectiveOperationException e) {
      throw new IllegalStateException("cannot read a component of " + rowType.getSimpleName(), e);
    }
    return RowFactory.create(values);
  }

  /** Published rows as Spark rows. */
  public List<Row> encodeAll(List<T> rows) {
    return rows.stream().map(this::encode).toList();
  }

  private RecordComponent[] components() {
    if (components == null) {
      components = rowType.getRecordComponents();
    }
    return components;
  }

  private static boolean isOptional(RecordComponent part) {
    Class<?> type = part.getType();
    return type == Optional.class || type == OptionalLong.class || type == OptionalDouble.class;
  }

  private static DataType type(RecordComponent part) {
    String type = part.getGenericType().getTypeName();
    if (type.equals("long") || type.endsWith("OptionalLong")) {
      return DataTypes.LongType;
    }
    if (type.equals("double") || type.endsWith("OptionalDouble")) {
      return DataTypes.DoubleType;
    }
    if (type.contains(Instant.class.getName())) {
      return DataTypes.TimestampType;
    }
    return switch (type) {
      case "int" -> DataTypes.IntegerType;
      case "boolean" -> DataTypes.BooleanType;
      case "java.lang.String", "java.util.Optional<java.lang.String>" -> DataTypes.StringType;
      default -> throw new IllegalStateException("no column type for " + part);
    };
  }

  private static Object plain(Object value) {
    if (value instanceof Optional<?> optional) {
      return optional.orElse(null);
    }
    if (value instanceof OptionalLong optional) {
      return optional.isPresent() ? optional.getAsLong() : null;
    }
    if (value instanceof OptionalDouble optional) {
      return optional.isPresent() ? optional.getAsDouble() : null;
    }
    return value;
  }
}
