package dev.holdfast.cli;

import dev.holdfast.check.Checker;
import dev.holdfast.check.PlanReport;
import dev.holdfast.plan.PlanFiles;
import dev.holdfast.plan.PlanReader;
import dev.holdfast.plan.PlanReading;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;

/** Checks many plans on several threads. One that cannot be read does not stop the others. */
final class Checks {
  private final PlanReader reader;
  private final Checker checker;
  private final int threads;

  Checks(PlanReader reader, Checker checker, int threads) {
    this.reader = reader;
    this.checker = checker;
    this.threads = threads;
  }

  /**
   * What a run came to.
   *
   * @param reports in the order of the plans
   * @param failures why some plans could not be read, as sentences
   * @param faults faults of the program, one a plan that met one
   */
  record Outcome(
      List<PlanReport> reports, List<String> failures, List<IllegalStateException> faults) {}

  Outcome of(List<Job> jobs) {
    ExecutorService pool =
        Executors.newFixedThreadPool(Math.max(1, Math.min(threads, jobs.size())));
    try {
      List<Future<PlanReport>> pending = new ArrayList<>();
      for (Job job : jobs) {
        pending.add(pool.submit(() -> check(job)));
      }
      List<PlanReport> reports = new ArrayList<>();
      List<String> failures = new ArrayList<>();
      List<IllegalStateException> faults = new ArrayList<>();
      for (int i = 0; i < pending.size(); i++) {
        try {
          reports.add(pending.get(i).get());
        } catch (ExecutionException e) {
          String path = jobs.get(i).path();
          if (e.getCause() instanceof IOException unreadable) {
            failures.add(PlanFiles.unreadable(Path.of(path), unreadable).message());
          } else {
            faults.add(new IllegalStateException(path + ": " + e.getCause(), e.getCause()));
          }
        }
      }
      return new Outcome(reports, failures, faults);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new UnusableException("interrupted; not every plan was checked");
    } finally {
      pool.shutdownNow();
    }
  }

  private PlanReport check(Job job) throws IOException {
    PlanReading reading = reader.read(job.path(), job.content().read());
    if (job.before().isEmpty()) {
      return checker.check(reading);
    }
    Job.Before before = job.before().get();
    return checker.check(reading, reader.read(job.path(), before.bytes()), before.revision());
  }
}
