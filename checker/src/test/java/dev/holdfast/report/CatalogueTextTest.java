package dev.holdfast.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.holdfast.design.Bibliography;
import dev.holdfast.design.Cell;
import dev.holdfast.design.InputSpec;
import dev.holdfast.design.Method;
import dev.holdfast.design.Scale;
import dev.holdfast.design.catalogue.Catalogue;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class CatalogueTextTest {
  private static final Catalogue CATALOGUE = Catalogue.standard();
  private static final CatalogueText TEXT = new CatalogueText(CATALOGUE, Bibliography.standard());

  static List<Cell> cells() {
    return CATALOGUE.cells();
  }

  @Test
  void theGridHasEveryCellOnceForEachOfItsScales() {
    List<String> words =
        TEXT.grid().lines().flatMap(line -> Arrays.stream(line.split(" +"))).toList();
    CATALOGUE.cells().stream()
        .map(cell -> cell.key().test())
        .distinct()
        .forEach(
            test ->
                assertEquals(
                    CATALOGUE.cells().stream()
                        .filter(cell -> cell.key().test().equals(test))
                        .mapToLong(cell -> cell.scales().size())
                        .sum(),
                    words.stream().filter(test::equals).count(),
                    test));
  }

  @Test
  void theGridFitsATerminalOfAHundredAndTenColumns() {
    assertTrue(TEXT.grid().lines().allMatch(line -> line.length() <= 110), TEXT.grid());
    assertTrue(TEXT.grid().lines().noneMatch(line -> line.endsWith(" ")));
  }

  @ParameterizedTest
  @MethodSource("cells")
  void aCellHasItsInputsMethodsAndReferences(Cell cell) {
    String text = TEXT.cell(cell);
    assertTrue(text.startsWith(cell.key() + "\n\n"), text);
    assertTrue(text.contains(cell.question()), text);
    for (Scale scale : cell.scales()) {
      assertTrue(text.contains(scale.word()), scale.word());
    }
    for (InputSpec input : cell.inputs()) {
      assertTrue(text.lines().anyMatch(line -> line.startsWith("  " + input.name())), text);
    }
    for (Method method : cell.methods()) {
      assertTrue(text.contains("  " + method.key() + " "), text);
      assertTrue(text.contains(Bibliography.standard().entry(method.reference())), text);
    }
    assertTrue(text.lines().noneMatch(line -> line.endsWith(" ")), text);
  }
}
