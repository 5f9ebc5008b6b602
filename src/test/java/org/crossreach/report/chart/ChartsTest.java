package org.crossreach.report.chart;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import javax.xml.parsers.DocumentBuilderFactory;
import org.crossreach.agreement.Result;
import org.crossreach.evidence.Comparer;
import org.crossreach.report.Units;
import org.crossreach.settings.BottomLaw;
import org.crossreach.settings.Settings;
import org.crossreach.settings.TopLaw;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every picture of the list can be drawn from any result that the reduction gives, however odd, in
 * the bundled fonts only, with quantity and unit at every axis.
 */
class ChartsTest {

  private static final ChartStyle STYLE = ChartStyle.standard();
  private static final Pattern FONT = Pattern.compile("font-family: \"([^\"]*)\"");
  private static final Pattern TEXT = Pattern.compile("<text[^>]*>([^<]*)</text>");

  /** Pictures whose rows have names, so that one axis is enough. */
  private static final Set<String> ROWS = Set.of("passes", "hidden-cells", "combinations");

  private static Stream<River> oddRivers() {
    return Stream.of(
        River.usual(),
        /* three ensembles */ new River(3, 18, 0, 1),
        /* two ensembles */ new River(2, 24, 0, 1),
        /* standing water */ new River(50, 24, 0, 0),
        /* noise alone */ new River(50, 24, 0.3, 0),
        /* water that flows upstream */ new River(120, 24, 0.05, -1),
        /* a trickle */ new River(120, 24, 0, 1e-7),
        /* a torrent */ new River(120, 24, 0, 40));
  }

  private static List<Picture> pictures(Result result, Units units) throws Exception {
    List<Picture> all = new ArrayList<>(Charts.ofMeasurement(result, units));
    all.addAll(
        Charts.ofComparison(
            new Comparer(1)
                .compare(result.reduction().measurement(), result.reduction().settings()),
            units));
    for (var pass : result.reduction().passes()) {
      all.addAll(Charts.ofPass(result, pass, units));
    }
    return all;
  }

  /** The picture as SVG, without the letters that stand for its pixels. */
  private static String svg(Picture picture) {
    return new String(new PictureFile(picture, STYLE).svg(), StandardCharsets.UTF_8)
        .replaceAll("base64,[A-Za-z0-9+/=]*", "");
  }

  @ParameterizedTest
  @MethodSource("oddRivers")
  void drawsWhateverTheReductionGives(River river) throws Exception {
    for (Units units : Units.values()) {
      for (Picture picture : pictures(river.result(), units)) {
        String svg = svg(picture);
        assertFalse(svg.contains("NaN"), picture.name());
        assertFalse(svg.contains("Infinity"), picture.name());
        assertFalse(
            svg.replaceAll(">[^<]*</text>", "").contains("–"), picture.name() + " draws nowhere");
        DocumentBuilderFactory.newInstance()
            .newDocumentBuilder()
            .parse(new ByteArrayInputStream(svg.getBytes(StandardCharsets.UTF_8)));
      }
    }
  }

  @Test
  void drawsEveryLaw() throws Exception {
    for (TopLaw top : TopLaw.values()) {
      for (BottomLaw bottom : BottomLaw.values()) {
        Settings settings = Settings.defaults().withTop(top).withBottom(bottom);
        for (Picture picture : pictures(River.usual().result(settings), Units.SI)) {
          assertFalse(svg(picture).contains("NaN"), picture.name());
        }
      }
    }
  }

  @Test
  void usesNoFontThatTheMachineWouldHaveToHave() throws Exception {
    for (Picture picture : pictures(River.usual().result(), Units.SI)) {
      Matcher fonts = FONT.matcher(svg(picture));
      int count = 0;
      while (fonts.find()) {
        assertTrue(fonts.group(1).startsWith("Roboto"), picture.name() + ": " + fonts.group(1));
        count++;
      }
      assertTrue(count > 5, picture.name() + " has hardly any text");
    }
  }

  @Test
  void showsOnlyCharactersOfTheBundledFont() throws Exception {
    for (Picture picture : pictures(River.usual().result(), Units.US)) {
      Matcher texts = TEXT.matcher(svg(picture));
      while (texts.find()) {
        assertEquals(-1, Face.REGULAR.size(7).canDisplayUpTo(texts.group(1)), texts.group(1));
      }
    }
  }

  @Test
  void namesQuantityAndUnitAtEveryAxis() throws Exception {
    Result result = River.usual().result();
    for (Units units : Units.values()) {
      String length = units == Units.SI ? "(m)" : "(ft)";
      for (Picture picture : pictures(result, units)) {
        List<String> texts = texts(svg(picture));
        long axes = texts.stream().filter(text -> text.matches(".+ \\([^)]+\\)")).count();
        assertTrue(axes >= (ROWS.contains(picture.name()) ? 1 : 2), picture.name() + ": " + texts);
        if (picture instanceof VelocitySection) {
          assertTrue(texts.contains("Depth below the surface " + length), texts.toString());
          assertTrue(texts.contains("Distance from the left bank " + length), texts.toString());
        }
      }
    }
  }

  private static List<String> texts(String svg) {
    List<String> all = new ArrayList<>();
    Matcher texts = TEXT.matcher(svg);
    while (texts.find()) {
      all.add(texts.group(1));
    }
    return all;
  }

  @Test
  void describesEveryPictureInWords() throws Exception {
    for (River river : oddRivers().toList()) {
      for (Picture picture : pictures(river.result(), Units.SI)) {
        String words = picture.description();
        assertTrue(words.length() > 40 && words.endsWith("."), words);
        assertFalse(words.contains("NaN"), words);
      }
    }
  }
}
