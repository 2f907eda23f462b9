package dev.holdfast.plan;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Consumer;

/**
 * Checks what the schema cannot say of a plan that is valid against it: names that must be found in
 * another section, and tables whose rows must be of equal length.
 */
final class References {
  private final Node root;
  private final List<PlanProblem> problems = new ArrayList<>();

  private References(Node root) {
    this.root = root;
  }

  /** What is wrong, in the order of the file. */
  static List<PlanProblem> problems(Node root) {
    References references = new References(root);
    references.check();
    return List.copyOf(references.problems);
  }

  private void check() {
    Set<String> outcomes = keys("/outcomes").keySet();
    Map<String, Node.Entry> analyses = keys("/analyses");
    analyses.forEach(
        (name, entry) -> {
          String pointer = entry.keyPlace().pointer();
          text(pointer + "/outcome", word -> refer(word, outcomes, "outcome"));
          table(pointer + "/effect/cells");
          items(pointer + "/cases")
              .forEach(each -> table(each.place().pointer() + "/effect/cells"));
        });
    keys("/families")
        .values()
        .forEach(entry -> family(entry.keyPlace().pointer(), analyses.keySet()));
  }

  private void family(String pointer, Set<String> analyses) {
    items(pointer + "/of").forEach(each -> referTo(each, analyses, "analysis"));
    List<String> members =
        items(pointer + "/of").stream().map(each -> ((Node.Scalar) each).text()).toList();
    if (!analyses.containsAll(members)) {
      return; // The members themselves are in doubt; what refers to them would be noise.
    }
    String member = "analysis of this family";
    for (String section : List.of("levels", "weights", "transitions")) {
      keys(pointer + "/" + section)
          .forEach((name, entry) -> refer(name, entry.keyPlace(), members, member));
    }
    keys(pointer + "/transitions")
        .values()
        .forEach(
            from ->
                keys(from.keyPlace().pointer())
                    .forEach((name, entry) -> refer(name, entry.keyPlace(), members, member)));
    items(pointer + "/order").forEach(each -> referTo(each, members, member));
    items(pointer + "/tiers")
        .forEach(
            tier -> items(tier.place().pointer()).forEach(each -> referTo(each, members, member)));
    table(pointer + "/correlations");
  }

  private void referTo(Node node, Collection<String> known, String what) {
    refer((Node.Scalar) node, known, what);
  }

  private void refer(Node.Scalar word, Collection<String> known, String what) {
    refer(word.text(), word.place(), known, what);
  }

  private void refer(String word, Place place, Collection<String> known, String what) {
    if (!known.contains(word)) {
      String remedy =
          Nearest.to(word, known)
              .map(near -> "Did you mean " + Quoted.text(near) + "?")
              .orElse(
                  known.isEmpty()
                      ? "The plan has none; add it."
                      : "Known: "
                          + FaultWording.listed(Nearest.first(6, word, known), known)
                          + ".");
      problems.add(
          new PlanProblem("No " + what + " is named " + Quoted.text(word) + ".", remedy, place));
    }
  }

  /** Every row of a table is as long as the first. */
  private void table(String pointer) {
    List<Node> rows = items(pointer);
    for (Node row : rows) {
      int wanted = ((Node.Sequence) rows.get(0)).items().size();
      int found = ((Node.Sequence) row).items().size();
      if (found != wanted) {
        problems.add(
            new PlanProblem(
                "This row holds " + found + " figures, the first row " + wanted + ".",
                "Give every row the same number of figures.",
                row.place()));
      }
    }
  }

  private void text(String pointer, Consumer<Node.Scalar> visit) {
    if (Nodes.at(root, pointer).orElse(null) instanceof Node.Scalar scalar) {
      visit.accept(scalar);
    }
  }

  private Map<String, Node.Entry> keys(String pointer) {
    return Nodes.at(root, pointer).orElse(null) instanceof Node.Mapping mapping
        ? mapping.entries()
        : Map.of();
  }

  private List<Node> items(String pointer) {
    return Nodes.at(root, pointer).orElse(null) instanceof Node.Sequence sequence
        ? sequence.items()
        : List.of();
  }
}
