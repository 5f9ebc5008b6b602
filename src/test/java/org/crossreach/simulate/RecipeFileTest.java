package org.crossreach.simulate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.regex.Pattern;
import org.crossreach.survey.UnusableInput;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** A recipe that cannot be made is refused with the place, and the page knows every fault. */
class RecipeFileTest {

  private static String sample() throws Exception {
    return Files.readString(Path.of("sample-transects/tern-landing-0418.recipe.json"));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "\"seed\": 418 | \"sead\": 418 | sead",
        "\"skew_deg\": 6 | \"skew_deg\": 200 | river.skew_deg",
        "\"frame\": \"earth\" | \"frame\": \"water\" | profiler.frame",
        "\"station_m\": 9, | \"station_m\": -9, | river.bed",
        "\"left_edge_m\": 4.5, | | boat.left_edge_m"
      })
  void refusesWithThePlace(String good, String bad, String place) throws Exception {
    String text = sample().replaceFirst(Pattern.quote(good), bad == null ? "" : bad);
    UnusableInput refusal =
        assertThrows(UnusableInput.class, () -> RecipeFile.parse(text, "a.recipe.json"));
    assertEquals(place, refusal.problems().get(0).place(), refusal.getMessage());
    assertEquals("a.recipe.json", refusal.problems().get(0).file());
  }

  @Test
  void thePageNamesEveryFault() throws Exception {
    String page = Files.readString(Path.of("formats/recipe.md"));
    for (Fault fault : Fault.values()) {
      assertTrue(page.contains(fault.key()), fault.key());
    }
  }
}
