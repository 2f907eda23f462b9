package dev.holdfast.cli;

import dev.holdfast.plan.PlanFiles;
import dev.holdfast.plan.PlanReader;
import dev.holdfast.plan.PlanReading;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;

/** Reads one plan, for commands that work on a single one. */
final class PlanSource {
  private PlanSource() {}

  /**
   * Reads a plan.
   *
   * @param path a plan file, or a folder that holds one
   * @throws UnusableException if there is none, or more than one, or it cannot be read
   */
  static PlanReading read(PlanReader reader, Path path) {
    PlanFiles.Found found = PlanFiles.find(List.of(path));
    if (!found.failures().isEmpty()) {
      throw new UnusableException(found.failures().get(0).message());
    }
    if (found.files().size() > 1) {
      throw new UnusableException(
          PlanFiles.shown(path)
              + " holds "
              + found.files().size()
              + " plans; name one, such as "
              + PlanFiles.shown(found.files().get(0)));
    }
    Path file = found.files().get(0);
    try {
      return reader.read(PlanFiles.shown(file), PlanFiles.bytes(file));
    } catch (IOException e) {
      throw new UnusableException(PlanFiles.unreadable(file, e).message());
    }
  }
}
