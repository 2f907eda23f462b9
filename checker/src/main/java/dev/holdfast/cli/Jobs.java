package dev.holdfast.cli;

import dev.holdfast.history.GitException;
import dev.holdfast.history.GitRepository;
import dev.holdfast.plan.PlanFiles;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * The plans that a run checks.
 *
 * @param jobs the plans, in the order in which they are reported
 * @param failures why some could not be had, as sentences
 */
record Jobs(List<Job> jobs, List<String> failures) {
  private static final String HEAD = "HEAD";

  /** The plans in files and below folders. */
  static Jobs inFiles(List<Path> paths) {
    PlanFiles.Found found = PlanFiles.find(paths);
    return new Jobs(
        found.files().stream().map(file -> job(file, Optional.empty())).toList(),
        found.failures().stream().map(PlanFiles.Failure::message).toList());
  }

  /** The same, with what each was at a revision of the repository around the first path. */
  static Jobs inFilesSince(List<Path> paths, String revision, Map<String, String> environment)
      throws GitException {
    GitRepository repository = GitRepository.around(folder(paths.get(0)), environment);
    Map<String, String> blobs = repository.filesAt(repository.commit(revision));
    PlanFiles.Found found = PlanFiles.find(paths);
    List<String> failures = new ArrayList<>();
    found.failures().forEach(failure -> failures.add(failure.message()));
    Map<Path, String> before = new LinkedHashMap<>();
    for (Path file : found.files()) {
      Optional<String> inside = inside(repository.root(), file);
      if (inside.isEmpty()) {
        failures.add(
            PlanFiles.shown(file)
                + " lies outside the repository of the first path and cannot be compared with "
                + revision);
      } else if (blobs.containsKey(inside.get())) {
        before.put(file, blobs.get(inside.get()));
      }
    }
    Map<String, byte[]> contents =
        repository.blobs(new HashSet<>(before.values()), PlanFiles.MOST_READ);
    List<Job> jobs = new ArrayList<>();
    for (Path file : found.files()) {
      jobs.add(
          job(
              file,
              Optional.ofNullable(before.get(file))
                  .map(blob -> new Job.Before(contents.get(blob), revision))));
    }
    return new Jobs(jobs, failures);
  }

  /** The plans of the index that differ from the last commit, with what they were there. */
  static Jobs staged(Map<String, String> environment) throws GitException {
    GitRepository repository = GitRepository.around(Path.of(""), environment);
    List<GitRepository.Staged> plans =
        repository.staged().stream()
            .filter(
                each -> PlanFiles.isPlan(each.path().substring(each.path().lastIndexOf('/') + 1)))
            .toList();
    Set<String> ids = new HashSet<>();
    for (GitRepository.Staged plan : plans) {
      ids.add(plan.blob());
      plan.before().ifPresent(ids::add);
    }
    Map<String, byte[]> contents = repository.blobs(ids, PlanFiles.MOST_READ);
    return new Jobs(
        plans.stream()
            .map(
                plan ->
                    new Job(
                        plan.path(),
                        () -> contents.get(plan.blob()),
                        plan.before().map(blob -> new Job.Before(contents.get(blob), HEAD))))
            .toList(),
        List.of());
  }

  private static Job job(Path file, Optional<Job.Before> before) {
    return new Job(PlanFiles.shown(file), () -> PlanFiles.bytes(file), before);
  }

  private static Path folder(Path path) {
    Path parent = path.toAbsolutePath().getParent();
    return Files.isDirectory(path) || parent == null ? path.toAbsolutePath() : parent;
  }

  /** The path of a file below a root, links followed. */
  private static Optional<String> inside(Path root, Path file) {
    try {
      Path real = file.toRealPath();
      Path top = root.toRealPath();
      return real.startsWith(top)
          ? Optional.of(PlanFiles.shown(top.relativize(real)))
          : Optional.empty();
    } catch (IOException e) {
      return Optional.empty();
    }
  }
}
