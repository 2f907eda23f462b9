package dev.holdfast.plan;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/** Reads plan files. One instance serves any number of threads. */
public final class PlanReader {
  private final Schemas schemas;
  private final TreeReader trees = new TreeReader();
  private final SchemaCheck check;
  private final FigurePlaces figurePlaces;

  /** A reader over the schemas of the program. */
  public PlanReader(Schemas schemas) {
    this.schemas = schemas;
    check = new SchemaCheck(schemas);
    figurePlaces = new FigurePlaces(schemas, check);
  }

  /**
   * Reads a plan. Whatever the bytes are, the answer is a reading and no exception.
   *
   * @param path the file's path as it will be reported, with {@code /} between its parts
   * @param bytes its content
   * @return the plan, or why the content is none; never both
   */
  public PlanReading read(String path, byte[] bytes) {
    TreeReader.Tree tree = trees.read(bytes);
    if (tree.root().isEmpty()) {
      return invalid(path, tree.problems());
    }
    Node root = tree.root().get();
    QuantityNames names = new QuantityNames(root, figurePlaces.named(root));
    List<PlanProblem> problems = problems(root, names);
    if (!problems.isEmpty()) {
      return invalid(path, problems);
    }
    Plan plan = new PlanBuilder(root, names).plan();
    return new PlanReading(path, Optional.of(plan), List.of(), names.unused());
  }

  /**
   * What is wrong. The plan is held against the schema with the values of quantities in place of
   * their names, so that a value must lie within the bounds of every place where it is used.
   */
  private List<PlanProblem> problems(Node root, QuantityNames names) {
    Node resolved = names.resolved();
    FaultWording wording = new FaultWording(schemas, root, resolved);
    List<PlanProblem> problems =
        new ArrayList<>(wording.problems(names.firstUses(check.faults(resolved.json()))));
    problems.addAll(names.unknown(problems));
    if (problems.isEmpty()) {
      problems.addAll(References.problems(root));
    }
    return problems;
  }

  private static PlanReading invalid(String path, Collection<PlanProblem> problems) {
    return new PlanReading(
        path,
        Optional.empty(),
        problems.stream()
            .distinct()
            .sorted(Comparator.comparing(PlanProblem::place).thenComparing(PlanProblem::message))
            .toList(),
        Set.of());
  }
}
