package dev.holdfast.check.rule;

import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Rule;
import dev.holdfast.check.StudyView;
import dev.holdfast.plan.Quantity;
import dev.holdfast.plan.Source;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;

/**
 * {@code source-incomplete}: a source lacks the field that would let a reader check it, or an
 * effect rests on nothing but a convention such as "medium".
 */
final class SourceIncomplete implements Rule {
  /** By kind of source, fields of which one must be given. */
  private static final Map<String, List<String>> WANTED =
      Map.of(
          "published-study", List.of("cite", "doi", "pmid", "isbn"),
          "meta-analysis", List.of("cite", "doi", "pmid", "studies"),
          "pilot-data", List.of("file", "cite", "doi"),
          "own-records", List.of("reason", "file", "cite"),
          "smallest-worthwhile", List.of("reason", "cite", "doi"),
          "expert-judgement", List.of("who", "reason"),
          "regulation", List.of("cite"),
          "assumption", List.of("reason"));

  @Override
  public List<Finding> look(StudyView view) {
    List<Finding> found = new ArrayList<>();
    Set<String> effects = new LinkedHashSet<>();
    Assumed.of(view).forEach(each -> each.figure().quantity().ifPresent(effects::add));
    for (Quantity quantity : view.plan().quantities().values()) {
      quantity
          .source()
          .ifPresent(source -> look(quantity, source, effects.contains(quantity.name()), found));
    }
    return found;
  }

  private static void look(
      Quantity quantity, Source source, boolean isEffect, List<Finding> found) {
    List<String> wanted = WANTED.getOrDefault(source.kind(), List.of());
    boolean given = wanted.isEmpty() || wanted.stream().anyMatch(source.fields()::containsKey);
    if (!given) {
      found.add(
          Finding.of(
              FindingKind.SOURCE_INCOMPLETE,
              "quantities." + quantity.name(),
              source.place(),
              "The source of '"
                  + quantity.name()
                  + "' is of kind "
                  + source.kind()
                  + " and gives none of "
                  + wanted.stream().collect(Collectors.joining(", "))
                  + ".",
              "add " + wanted.get(0)));
    } else if (isEffect && source.kind().equals("convention")) {
      found.add(
          Finding.of(
              FindingKind.SOURCE_INCOMPLETE,
              "quantities." + quantity.name(),
              source.place(),
              "'"
                  + quantity.name()
                  + "' rests on a convention alone, which says nothing of this study's effect.",
              "give the smallest effect worth finding, or an estimate with its source"));
    }
  }
}
