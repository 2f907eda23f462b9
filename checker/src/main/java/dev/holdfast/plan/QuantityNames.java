package dev.holdfast.plan;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** The quantities of a plan, and the places where their names stand for their values. */
final class QuantityNames {
  private final Node root;
  private final Set<Node.Scalar> uses;
  private final Map<String, Optional<Node.Scalar>> values = new LinkedHashMap<>();
  private final boolean readable;

  /**
   * @param root a plan, valid or not
   * @param uses the texts that stand where a number may
   */
  QuantityNames(Node root, List<Node.Scalar> uses) {
    this.root = root;
    this.uses = new LinkedHashSet<>(uses);
    Optional<Node> section = Nodes.at(root, "/quantities");
    readable = section.isEmpty() || section.get() instanceof Node.Mapping;
    if (section.orElse(null) instanceof Node.Mapping quantities) {
      quantities.entries().forEach((name, entry) -> values.put(name, value(entry.value())));
    }
  }

  private static Optional<Node.Scalar> value(Node quantity) {
    return quantity instanceof Node.Mapping mapping
            && mapping.get("value") instanceof Node.Scalar value
            && value.kind() == Node.Scalar.Kind.NUMBER
        ? Optional.of(value)
        : Optional.empty();
  }

  private Optional<Node.Scalar> valueOf(Node.Scalar name) {
    return values.getOrDefault(name.text(), Optional.empty());
  }

  /** Whether a text stands where a number may. */
  boolean isUse(Node.Scalar text) {
    return uses.contains(text);
  }

  /** The value of a quantity as it is written; the name must be known to have one. */
  String value(String name) {
    return values.get(name).orElseThrow().text();
  }

  /**
   * Names that no quantity has.
   *
   * @param told problems already found; a place among them is left alone
   */
  List<PlanProblem> unknown(List<PlanProblem> told) {
    if (!readable) {
      return List.of();
    }
    Set<Place> toldPlaces = new HashSet<>();
    told.forEach(problem -> toldPlaces.add(problem.place()));
    List<PlanProblem> problems = new ArrayList<>();
    for (Node.Scalar use : uses) {
      if (!values.containsKey(use.text()) && !toldPlaces.contains(use.place())) {
        problems.add(
            new PlanProblem(
                "No quantity is named " + Quoted.text(use.text()) + ".",
                Nearest.to(use.text(), values.keySet())
                    .map(near -> "Did you mean " + Quoted.text(near) + "?")
                    .orElse("Add it under quantities, or write a number."),
                use.place()));
      }
    }
    return problems;
  }

  /**
   * Leaves out the faults that one wrong value of a quantity has at every further use.
   *
   * @param faults what is wrong with the resolved plan
   */
  List<Fault> firstUses(List<Fault> faults) {
    Set<String> told = new HashSet<>();
    return faults.stream()
        .sorted(Comparator.comparing(fault -> Nodes.valuePlace(root, fault.pointer())))
        .filter(
            fault ->
                !(Nodes.at(root, fault.pointer()).orElse(null) instanceof Node.Scalar scalar)
                    || !uses.contains(scalar)
                    || valueOf(scalar).isEmpty()
                    || told.add(scalar.text()))
        .toList();
  }

  /** Names of the quantities that nothing refers to, in the order of the file. */
  Set<String> unused() {
    Set<String> unused = new LinkedHashSet<>(values.keySet());
    uses.forEach(use -> unused.remove(use.text()));
    return Collections.unmodifiableSet(unused);
  }

  /** The plan with the value of a quantity wherever its name stands for it. */
  Node resolved() {
    Map<String, Node.Scalar> byPointer = new LinkedHashMap<>();
    uses.forEach(
        use ->
            valueOf(use)
                .ifPresent(
                    value ->
                        byPointer.put(
                            use.place().pointer(),
                            new Node.Scalar(value.kind(), value.text(), use.place()))));
    return replaced(root, byPointer);
  }

  private static Node replaced(Node node, Map<String, Node.Scalar> byPointer) {
    if (node instanceof Node.Mapping mapping) {
      Map<String, Node.Entry> entries = new LinkedHashMap<>();
      mapping
          .entries()
          .forEach(
              (key, entry) ->
                  entries.put(
                      key, new Node.Entry(entry.keyPlace(), replaced(entry.value(), byPointer))));
      return new Node.Mapping(entries, mapping.place());
    }
    if (node instanceof Node.Sequence sequence) {
      return new Node.Sequence(
          sequence.items().stream().map(item -> replaced(item, byPointer)).toList(),
          sequence.place());
    }
    return byPointer.getOrDefault(node.place().pointer(), (Node.Scalar) node);
  }
}
