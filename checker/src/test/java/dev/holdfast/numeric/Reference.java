package dev.holdfast.numeric;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Rows of a reference file: values computed to thirty digits by two routes, with provenance. */
public final class Reference {
  private Reference() {}

  /** One row, by column. */
  public record Row(Map<String, String> columns) {
    public double number(String column) {
      return Double.parseDouble(columns.get(column));
    }

    public String text(String column) {
      return columns.get(column);
    }
  }

  /** All rows of a file under {@code /reference}. */
  public static List<Row> rows(String name) {
    try (BufferedReader reader =
        new BufferedReader(
            new InputStreamReader(
                Reference.class.getResourceAsStream("/reference/" + name),
                StandardCharsets.UTF_8))) {
      List<Row> rows = new ArrayList<>();
      String[] header = null;
      for (String line = reader.readLine(); line != null; line = reader.readLine()) {
        if (line.startsWith("#") || line.isBlank()) {
          continue;
        }
        String[] cells = line.split(",", -1);
        if (header == null) {
          header = cells;
        } else {
          Map<String, String> columns = new LinkedHashMap<>();
          for (int i = 0; i < header.length; i++) {
            columns.put(header[i], cells[i]);
          }
          rows.add(new Row(columns));
        }
      }
      return rows;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
