package dev.holdfast.design;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

class BibliographyTest {
  @Test
  void everyMethodCitesAnEntryAndEveryEntryIsCited() {
    Set<String> cited =
        CellExamples.cells().stream()
            .flatMap(cell -> cell.methods().stream())
            .map(Method::reference)
            .collect(Collectors.toCollection(TreeSet::new));
    assertEquals(cited, Bibliography.standard().keys());
  }
}
