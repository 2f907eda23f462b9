package dev.holdfast.numeric;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.math.MathContext;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;
import java.util.stream.IntStream;

/** Reference values from a file of the test resources, read by column name. */
final class ReferenceTable {
  private final String name;
  private final List<Row> rows;

  private ReferenceTable(String name, List<Row> rows) {
    this.name = name;
    this.rows = rows;
  }

  static ReferenceTable read(String name) {
    List<String> lines = lines("/reference/" + name + ".csv");
    String[] header = lines.get(0).split(",");
    List<Row> rows = new ArrayList<>();
    for (String line : lines.subList(1, lines.size())) {
      String[] cells = line.split(",");
      rows.add(
          new Row(
              IntStream.range(0, header.length)
                  .boxed()
                  .collect(Collectors.toMap(i -> header[i], i -> cells[i]))));
    }
    return new ReferenceTable(name, rows);
  }

  private static List<String> lines(String resource) {
    try (InputStream in = ReferenceTable.class.getResourceAsStream(resource);
        BufferedReader reader =
            new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8))) {
      return reader.lines().filter(line -> !line.startsWith("#")).toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  String name() {
    return name;
  }

  List<Row> rows() {
    return rows;
  }

  /** One line of the file. */
  record Row(Map<String, String> cells) {
    double number(String column) {
      return Double.parseDouble(cells.get(column));
    }

    String text(String column) {
      return cells.get(column);
    }

    /** The relative error of a value against a column, formed in decimals. */
    double error(double value, String column) {
      if (!Double.isFinite(value)) {
        return Double.POSITIVE_INFINITY;
      }
      BigDecimal reference = new BigDecimal(cells.get(column));
      return new BigDecimal(value)
          .subtract(reference)
          .divide(reference, MathContext.DECIMAL64)
          .abs()
          .doubleValue();
    }

    /** The relative error on the smaller of two columns that add to one. */
    double errorOfSmaller(
        String first,
        ToDoubleFunction<Row> ofFirst,
        String second,
        ToDoubleFunction<Row> ofSecond) {
      return number(first) < 0.5
          ? error(ofFirst.applyAsDouble(this), first)
          : error(ofSecond.applyAsDouble(this), second);
    }
  }
}
