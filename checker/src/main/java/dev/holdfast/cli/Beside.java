package dev.holdfast.cli;

import dev.holdfast.plan.PlanFiles;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.CopyOption;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;

/** Writes a file beside its place and moves it there, so that nobody meets half of it. */
final class Beside {
  private Beside() {}

  /**
   * Writes a file over what was there. Behind a link the file that it leads to is replaced; what is
   * no file, such as a pipe, is written to.
   *
   * @throws UnusableException if it cannot be written
   */
  static void replace(Path file, String text) {
    try {
      Path place = Files.isSymbolicLink(file) ? file.toRealPath() : file;
      if (Files.exists(place) && !Files.isRegularFile(place)) {
        Files.write(place, bytes(text), StandardOpenOption.WRITE);
      } else {
        move(place, text, StandardCopyOption.REPLACE_EXISTING);
      }
    } catch (IOException e) {
      throw unwritten(file, e);
    }
  }

  /**
   * Writes a file where there is none, with the folders above it.
   *
   * @throws UnusableException if something is there, or it cannot be written
   */
  static void create(Path file, String text) {
    try {
      Files.createDirectories(file.toAbsolutePath().getParent());
      move(file, text);
    } catch (IOException e) {
      throw unwritten(file, e);
    }
  }

  private static void move(Path place, String text, CopyOption... options) throws IOException {
    String name = "." + place.getFileName() + "." + ProcessHandle.current().pid() + ".part";
    Path beside = place.toAbsolutePath().resolveSibling(name);
    try {
      Files.write(beside, bytes(text), StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE);
      Files.move(beside, place, options);
    } finally {
      Files.deleteIfExists(beside);
    }
  }

  private static byte[] bytes(String text) {
    return text.getBytes(StandardCharsets.UTF_8);
  }

  private static UnusableException unwritten(Path file, IOException e) {
    String shown = PlanFiles.shown(file);
    if (e instanceof FileAlreadyExistsException) {
      return new UnusableException(shown + " exists; name another file, or move it away");
    }
    String why =
        e instanceof NoSuchFileException
            ? "its folder does not exist"
            : e.getClass().getSimpleName();
    return new UnusableException(shown + " could not be written (" + why + ")");
  }
}
