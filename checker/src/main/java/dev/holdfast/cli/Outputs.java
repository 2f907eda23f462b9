package dev.holdfast.cli;

import dev.holdfast.check.PlanReport;
import dev.holdfast.plan.Nearest;
import dev.holdfast.report.JsonReport;
import dev.holdfast.report.Paint;
import dev.holdfast.report.TextReport;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The outputs asked for, as {@code KIND} or {@code KIND=FILE}. */
final class Outputs {
  private static final String TEXT = "text";
  private static final String JSON = "json";
  private static final List<String> KINDS = List.of(TEXT, JSON);

  private record Output(String kind, Optional<Path> file) {}

  private final List<Output> outputs = new ArrayList<>();

  /**
   * Outputs by their words; text if there are none.
   *
   * @throws UnusableException if a kind is unknown, or two would mix
   */
  Outputs(List<String> words) {
    for (String word : words.isEmpty() ? List.of(TEXT) : words) {
      outputs.add(output(word));
    }
    if (outputs.stream().filter(output -> output.file().isEmpty()).count() > 1) {
      throw new UnusableException("two outputs would mix; give one of them a file, as json=FILE");
    }
  }

  private static Output output(String word) {
    int equals = word.indexOf('=');
    String kind = equals < 0 ? word : word.substring(0, equals);
    if (!KINDS.contains(kind)) {
      throw new UnusableException(
          "there is no output of kind '"
              + kind
              + "'; "
              + Nearest.to(kind, KINDS)
                  .map(near -> "did you mean '" + near + "'?")
                  .orElse("there are " + String.join(" and ", KINDS)));
    }
    String file = equals < 0 ? "" : word.substring(equals + 1);
    if (equals >= 0 && file.isEmpty()) {
      throw new UnusableException("the output " + word + " names no file");
    }
    return new Output(kind, equals < 0 ? Optional.empty() : Optional.of(Path.of(file)));
  }

  /** Whether a program reads one of them, so that every figure is wanted. */
  boolean isComplete() {
    return outputs.stream().anyMatch(output -> output.kind().equals(JSON));
  }

  /**
   * Writes all of them; one that cannot be written does not stop the others.
   *
   * @return why some were not written, as sentences
   */
  List<String> write(
      List<PlanReport> reports, Console console, Paint paint, TextReport.Extent extent) {
    List<String> failures = new ArrayList<>();
    for (Output output : outputs) {
      Paint own = output.file().isPresent() ? Paint.none() : paint;
      String text =
          output.kind().equals(JSON)
              ? new JsonReport().write(reports)
              : new TextReport(own, extent).write(reports);
      try {
        output
            .file()
            .ifPresentOrElse(file -> Beside.replace(file, text), () -> console.print(text));
      } catch (UnusableException e) {
        failures.add(e.getMessage());
      }
    }
    return failures;
  }
}
