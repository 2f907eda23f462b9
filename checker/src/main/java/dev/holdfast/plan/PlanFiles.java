package dev.holdfast.plan;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;

/** Finds plan files by their names, and fetches their bytes. */
public final class PlanFiles {
  /** Bytes that are read of a file at most: one more than a plan may have. */
  public static final int MOST_READ = TreeReader.LARGEST_FILE + 1;

  private PlanFiles() {}

  /** Why a path gave no plan file. */
  public enum Cause {
    /** Nothing is there. */
    ABSENT,
    /** A folder below which no file has the name of a plan. */
    WITHOUT_PLAN,
    /** A file or folder that could not be read, or neither of the two. */
    UNREADABLE
  }

  /**
   * A path that gave no plan file.
   *
   * @param path the path as it is reported
   * @param cause why
   * @param message a sentence about it, path included
   */
  public record Failure(String path, Cause cause, String message) {
    @Override
    public String toString() {
      return message;
    }
  }

  /**
   * What a search came to.
   *
   * @param files the plan files, each once, sorted by the bytes of their reported paths
   * @param failures what gave none, in the order of the paths that were given
   */
  public record Found(List<Path> files, List<Failure> failures) {}

  /** Whether a file name is that of a plan. */
  public static boolean isPlan(String name) {
    return name.equals("study-plan.yaml")
        || name.equals("study-plan.yml")
        || name.endsWith(".study-plan.yaml")
        || name.endsWith(".study-plan.yml");
  }

  /**
   * Searches files and folders, folders with all below them but hidden ones. Links to folders are
   * not followed below the folders that are named. A file that is named is taken whatever its name.
   */
  public static Found find(List<Path> paths) {
    Map<String, Path> files = new TreeMap<>(PlanFiles::byBytes);
    Set<Path> known = new HashSet<>();
    List<Failure> failures = new ArrayList<>();
    for (Path path : paths) {
      if (Files.isRegularFile(path)) {
        add(path, files, known);
      } else if (Files.isDirectory(path)) {
        search(path, failures).forEach(each -> add(each, files, known));
      } else if (Files.exists(path, LinkOption.NOFOLLOW_LINKS)) {
        failures.add(
            failure(path, Cause.UNREADABLE, "is neither a file nor a folder that can be read"));
      } else {
        failures.add(failure(path, Cause.ABSENT, "does not exist"));
      }
    }
    return new Found(List.copyOf(files.values()), List.copyOf(failures));
  }

  /** Takes a file that is not already taken, by whatever path. */
  private static void add(Path file, Map<String, Path> files, Set<Path> known) {
    if (known.add(file.toAbsolutePath().normalize())) {
      files.put(shown(file), file);
    }
  }

  private static List<Path> search(Path folder, List<Failure> failures) {
    List<Path> found = new ArrayList<>();
    int before = failures.size();
    try {
      Files.walkFileTree(
          folder,
          new SimpleFileVisitor<>() {
            @Override
            public FileVisitResult preVisitDirectory(Path each, BasicFileAttributes attributes) {
              boolean hidden =
                  !each.equals(folder) && each.getFileName().toString().startsWith(".");
              return hidden ? FileVisitResult.SKIP_SUBTREE : FileVisitResult.CONTINUE;
            }

            @Override
            public FileVisitResult visitFile(Path each, BasicFileAttributes attributes) {
              if (isPlan(each.getFileName().toString()) && Files.isRegularFile(each)) {
                found.add(each);
              }
              return FileVisitResult.CONTINUE;
            }

            @Override
            public FileVisitResult visitFileFailed(Path each, IOException e) {
              failures.add(unreadable(each, e));
              return FileVisitResult.CONTINUE;
            }
          });
    } catch (IOException e) {
      failures.add(unreadable(folder, e));
    }
    if (found.isEmpty() && failures.size() == before) {
      failures.add(
          failure(
              folder,
              Cause.WITHOUT_PLAN,
              "holds no plan (study-plan.yaml, study-plan.yml, *.study-plan.yaml or"
                  + " *.study-plan.yml)"));
    }
    return found;
  }

  /**
   * The bytes of a plan file. Of a file that is too large to be a plan no more is read than shows
   * that it is.
   *
   * @throws IOException if the file cannot be read
   */
  public static byte[] bytes(Path file) throws IOException {
    try (InputStream in = Files.newInputStream(file)) {
      return in.readNBytes(MOST_READ);
    }
  }

  /** A failure to read a file or folder. */
  public static Failure unreadable(Path path, IOException e) {
    if (e instanceof NoSuchFileException) {
      return failure(path, Cause.ABSENT, "does not exist");
    }
    return failure(
        path,
        Cause.UNREADABLE,
        e instanceof AccessDeniedException
            ? "may not be read with the present rights"
            : "cannot be read (" + e.getClass().getSimpleName() + ")");
  }

  /** A path as it is reported: with {@code /} between its parts, whatever the system. */
  public static String shown(Path path) {
    Path plain = path.normalize();
    String text = plain.toString().replace(plain.getFileSystem().getSeparator(), "/");
    return text.isEmpty() ? "." : text;
  }

  private static Failure failure(Path path, Cause cause, String what) {
    return new Failure(shown(path), cause, shown(path) + " " + what);
  }

  private static int byBytes(String one, String other) {
    return Arrays.compareUnsigned(
        one.getBytes(StandardCharsets.UTF_8), other.getBytes(StandardCharsets.UTF_8));
  }
}
