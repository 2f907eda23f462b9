package dev.holdfast.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class WrittenNumberTest {
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        ".5 | 0.5",
        "-.5 | -0.5",
        "+3 | 3",
        "010 | 10",
        "00.5 | 0.5",
        "1_000 | 1000",
        "5% | 0.05",
        "12.5 % | 0.125",
        "1,5 | 1.5",
        "0,025 | 0.025",
        "1,021.5 | 1021.5",
        "1 000 | 1000",
        "1'000'000 | 1000000",
        "1,000 | 1000 or 1.000",
        "1,000,000 | 1000000",
        "0.5 | 0.5",
        "5. | 5.",
        "1e5 | 1e5",
        "+.5e3 | 0.5e3"
      })
  void aSpellingThatReadersUnderstandDifferentlyHasAPlainForm(String text, String plain) {
    assertEquals(Optional.of(plain), WrittenNumber.meantBy(text));
  }

  @ParameterizedTest
  @ValueSource(strings = {"", ".", "%", "score-sd", "1.2.3", "5 min", "1e999", "_", "--1", "0x1F"})
  void whatIsNoNumberHasNone(String text) {
    assertEquals(Optional.empty(), WrittenNumber.meantBy(text));
  }

  @ParameterizedTest
  @CsvSource({
    "0.90,2",
    "0.9,1",
    "12,0",
    "12.,0",
    "1e3,0",
    "1.5e3,0",
    "1.5e-3,4",
    "100e-2,2",
    "-0.050,3"
  })
  void decimalsAreThoseWrittenWithTheExponentTakenIntoAccount(String written, int decimals) {
    assertEquals(decimals, WrittenNumber.decimals(written));
  }

  @ParameterizedTest
  @ValueSource(strings = {"0", "-0", "0.0e5", "1e308", "4.9e-324", "1e0005", "1E+3", "0e-9"})
  void aNumberThatADoubleHoldsIsUsable(String written) {
    assertTrue(WrittenNumber.isUsable(written));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "1e309",
        "1e-400",
        "1e99999999999",
        "0e99999999999",
        "0e-99999999999",
        ".inf",
        ".5",
        "+1",
        "01",
        "1_0",
        "",
        "-"
      })
  void aNumberThatADoubleLosesIsNot(String written) {
    assertFalse(WrittenNumber.isUsable(written));
  }

  @Property
  void everyFiniteDoubleIsUsableAsJavaWritesIt(@ForAll double value) {
    assertTrue(WrittenNumber.isUsable(Double.toString(value)));
  }
}
