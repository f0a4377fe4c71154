package millrace.analytics.spark;

import java.lang.invoke.MethodHandle;
import java.lang.invoke.MethodHandles;
import java.lang.reflect.RecordComponent;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import millrace.analytics.mart.Columns;
import org.apache.hadoop.conf.Configuration;
import org.apache.parquet.conf.ParquetConfiguration;
import org.apache.parquet.hadoop.api.WriteSupport;
import org.apache.parquet.io.api.Binary;
import org.apache.parquet.io.api.RecordConsumer;
import org.apache.parquet.schema.LogicalTypeAnnotation;
import org.apache.parquet.schema.LogicalTypeAnnotation.TimeUnit;
import org.apache.parquet.schema.MessageType;
import org.apache.parquet.schema.PrimitiveType.PrimitiveTypeName;
import org.apache.parquet.schema.Type;
import org.apache.parquet.schema.Types;

/**
 * Published rows as Parquet rows: one column per record component, optional ones nullable, times in
 * microseconds UTC.
 *
 * @param <T> row type, a record
 */
final class RecordWriteSupport<T extends Record> extends WriteSupport<T> {
  private static final long MICROS = 1_000_000;

  private final MessageType schema;
  private final List<String> names;
  private final MethodHandle[] accessors;

  /** The last text of each column: ids and files repeat from row to row. */
  private final String[] lastTexts;

  private final Binary[] lastBinaries;
  private RecordConsumer consumer;

  RecordWriteSupport(Class<T> rowType) {
    RecordComponent[] components = rowType.getRecordComponents();
    names = Columns.of(rowType);
    accessors = new MethodHandle[components.length];
    lastTexts = new String[components.length];
    lastBinaries = new Binary[components.length];
    List<Type> fields = new ArrayList<>();
    for (int i = 0; i < components.length; i++) {
      fields.add(field(components[i], names.get(i)));
      accessors[i] = accessor(components[i]);
    }
    schema = new MessageType(rowType.getSimpleName(), fields);
  }

  /** Abstract still, though the other one is called. */
  @SuppressWarnings("deprecation")
  @Override
  public WriteContext init(Configuration configuration) {
    return new WriteContext(schema, Map.of());
  }

  @Override
  public WriteContext init(ParquetConfiguration configuration) {
    return new WriteContext(schema, Map.of());
  }

  @Override
  public void prepareForWrite(RecordConsumer recordConsumer) {
    consumer = recordConsumer;
  }

  @Override
  public void write(T row) {
    consumer.startMessage();
    for (int i = 0; i < accessors.length; i++) {
      Object value = value(accessors[i], row);
      if (value != null) {
        consumer.startField(names.get(i), i);
        put(i, value);
        consumer.endField(names.get(i), i);
      }
    }
    consumer.endMessage();
  }

  private void put(int column, Object value) {
    if (value instanceof String text) {
      if (!text.equals(lastTexts[column])) {
        lastTexts[column] = text;
        lastBinaries[column] = Binary.fromString(text);
      }
      consumer.addBinary(lastBinaries[column]);
    } else if (value instanceof Long number) {
      consumer.addLong(number);
    } else if (value instanceof Integer number) {
      consumer.addInteger(number);
    } else if (value instanceof Double number) {
      consumer.addDouble(number);
    } else if (value instanceof Boolean flag) {
      consumer.addBoolean(flag);
    } else {
      consumer.addLong(Math.multiplyExact(((Instant) value).getEpochSecond(), MICROS));
    }
  }

  private static Object value(MethodHandle accessor, Object row) {
    Object value;
    try {
      value = accessor.invokeExact(row);
    } catch (Throwable e) {
      throw new IllegalStateException("cannot read a published row", e);
    }
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

  private static MethodHandle accessor(RecordComponent component) {
    try {
      MethodHandle handle = MethodHandles.publicLookup().unreflect(component.getAccessor());
      return handle.asType(
          handle.type().changeReturnType(Object.class).changeParameterType(0, Object.class));
    } catch (IllegalAccessException e) {
      throw new IllegalStateException("row types are public records", e);
    }
  }

  private static Type field(RecordComponent component, String name) {
    String type = component.getGenericType().getTypeName();
    boolean optional = type.contains("Optional");
    if (type.contains(Instant.class.getName())) {
      return (optional
              ? Types.optional(PrimitiveTypeName.INT64)
              : Types.required(PrimitiveTypeName.INT64))
          .as(LogicalTypeAnnotation.timestampType(true, TimeUnit.MICROS))
          .named(name);
    }
    if (type.contains(String.class.getName())) {
      return (optional
              ? Types.optional(PrimitiveTypeName.BINARY)
              : Types.required(PrimitiveTypeName.BINARY))
          .as(LogicalTypeAnnotation.stringType())
          .named(name);
    }
    PrimitiveTypeName primitive =
        switch (type) {
          case "long", "java.util.OptionalLong" -> PrimitiveTypeName.INT64;
          case "double", "java.util.OptionalDouble" -> PrimitiveTypeName.DOUBLE;
          case "int" -> PrimitiveTypeName.INT32;
          case "boolean" -> PrimitiveTypeName.BOOLEAN;
          default -> throw new IllegalStateException("no column type for " + component);
        };
    return (optional ? Types.optional(primitive) : Types.required(primitive)).named(name);
  }
}
