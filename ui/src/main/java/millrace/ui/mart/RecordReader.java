package millrace.ui.mart;

import java.lang.reflect.Constructor;
import java.lang.reflect.ParameterizedType;
import java.lang.reflect.RecordComponent;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import millrace.analytics.mart.Columns;

/** Reads rows of a result set as records whose components name the columns. */
final class RecordReader<R extends Record> {
  private final RecordComponent[] components;
  private final List<String> names;
  private final Constructor<R> constructor;

  RecordReader(Class<R> type) {
    components = type.getRecordComponents();
    names = Columns.of(type);
    try {
      constructor =
          type.getDeclaredConstructor(
              Arrays.stream(components).map(RecordComponent::getType).toArray(Class<?>[]::new));
    } catch (NoSuchMethodException e) {
      throw new IllegalStateException("a record without its constructor", e);
    }
  }

  /** What to select, instants as microseconds so that no session zone can move them. */
  String columns() {
    return IntStream.range(0, names.size())
        .mapToObj(i -> isInstant(components[i]) ? "epoch_us(" + name(i) + ")" : name(i))
        .collect(Collectors.joining(", "));
  }

  private String name(int i) {
    return '"' + names.get(i) + '"';
  }

  R read(ResultSet row) throws SQLException {
    Object[] values = new Object[components.length];
    for (int i = 0; i < values.length; i++) {
      values[i] = value(row, i + 1, components[i]);
    }
    try {
      return constructor.newInstance(values);
    } catch (ReflectiveOperationException e) {
      throw new IllegalStateException("a row that is no " + constructor.getName(), e);
    }
  }

  private static boolean isInstant(RecordComponent component) {
    return component.getType() == Instant.class
        || component.getType() == Optional.class && inner(component) == Instant.class;
  }

  private static Object inner(RecordComponent component) {
    return ((ParameterizedType) component.getGenericType()).getActualTypeArguments()[0];
  }

  private static Object value(ResultSet row, int at, RecordComponent component)
      throws SQLException {
    Class<?> type = component.getType();
    if (type == Optional.class) {
      Object value = plain(row, at, (Class<?>) inner(component));
      return row.wasNull() ? Optional.empty() : Optional.ofNullable(value);
    }
    if (type == OptionalLong.class) {
      long value = row.getLong(at);
      return row.wasNull() ? OptionalLong.empty() : OptionalLong.of(value);
    }
    if (type == OptionalDouble.class) {
      double value = row.getDouble(at);
      return row.wasNull() ? OptionalDouble.empty() : OptionalDouble.of(value);
    }
    return plain(row, at, type);
  }

  private static Object plain(ResultSet row, int at, Class<?> type) throws SQLException {
    if (type == String.class) {
      return row.getString(at);
    }
    if (type == Instant.class) {
      return Instant.EPOCH.plus(row.getLong(at), ChronoUnit.MICROS);
    }
    if (type == long.class) {
      return row.getLong(at);
    }
    if (type == int.class) {
      return row.getInt(at);
    }
    if (type == double.class) {
      return row.getDouble(at);
    }
    if (type == boolean.class) {
      return row.getBoolean(at);
    }
    throw new IllegalStateException("no reading of " + type);
  }
}
