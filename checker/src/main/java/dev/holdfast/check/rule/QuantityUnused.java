package dev.holdfast.check.rule;

import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Rule;
import dev.holdfast.check.StudyView;
import java.util.List;

/** {@code quantity-unused}: nothing in the plan refers to a quantity. */
final class QuantityUnused implements Rule {
  @Override
  public List<Finding> look(StudyView view) {
    return view.reading().unusedQuantities().stream()
        .map(name -> view.plan().quantities().get(name))
        .map(
            quantity ->
                Finding.of(
                    FindingKind.QUANTITY_UNUSED,
                    "quantities." + quantity.name(),
                    quantity.place(),
                    "Nothing refers to the quantity '" + quantity.name() + "'.",
                    "name it where its figure is used",
                    "leave it out"))
        .toList();
  }
}
