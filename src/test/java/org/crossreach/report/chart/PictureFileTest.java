package org.crossreach.report.chart;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Font;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.Base64;
import java.util.Locale;
import java.util.TimeZone;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import javax.imageio.ImageIO;
import org.crossreach.agreement.Result;
import org.crossreach.report.Units;
import org.junit.jupiter.api.Test;

/** A picture is a file of its own that any program can read, the same in every locale. */
class PictureFileTest {

  private static PictureFile file() throws Exception {
    Result result = River.usual().result();
    return new PictureFile(
        Charts.ofPass(result, result.reduction().passes().get(0), Units.SI).get(1));
  }

  @Test
  void isTwiceAsFineAsAScreen() throws Exception {
    BufferedImage image = ImageIO.read(new ByteArrayInputStream(file().png()));
    assertEquals(1080, image.getWidth());
    assertEquals(0xFFFFFFFF, image.getRGB(0, 0));
  }

  @Test
  void keepsThePixelsOfImages() throws Exception {
    BufferedImage image = new BufferedImage(37, 11, BufferedImage.TYPE_BYTE_INDEXED);
    for (int y = 0; y < 11; y++) {
      for (int x = 0; x < 37; x++) {
        image.getRaster().setSample(x, y, 0, (x * 31 + y * 17) % 200);
      }
    }
    BufferedImage back = ImageIO.read(new ByteArrayInputStream(PngEncoder.encode(image, 72)));
    for (int y = 0; y < 11; y++) {
      for (int x = 0; x < 37; x++) {
        assertEquals(image.getRGB(x, y), back.getRGB(x, y));
      }
    }
  }

  @Test
  void keepsTitleAndNumbersAsText() throws Exception {
    String svg = new String(file().svg(), StandardCharsets.UTF_8);
    assertTrue(svg.contains(">Velocity normal to the section<"));
    assertTrue(svg.contains(">Normal velocity (m/s)<"));
  }

  @Test
  void carriesTheLettersThatItUses() throws Exception {
    String svg = new String(file().svg(), StandardCharsets.UTF_8);
    Matcher fonts =
        Pattern.compile("font-family:\"([^\"]+)\";src:url\\(data:font/ttf;base64,([^)]+)\\)")
            .matcher(svg);
    int count = 0;
    while (fonts.find()) {
      byte[] font = Base64.getDecoder().decode(fonts.group(2));
      Font read = Font.createFont(Font.TRUETYPE_FONT, new ByteArrayInputStream(font));
      assertEquals(fonts.group(1), read.getFamily());
      assertEquals(-1, read.canDisplayUpTo("elocity"));
      count++;
    }
    assertEquals(2, count, "regular text and a title");
    assertTrue(svg.length() < 150_000, svg.length() + " characters");
  }

  @Test
  void isTheSameInEveryLocaleAndZone() throws Exception {
    byte[] svg = file().svg();
    byte[] png = file().png();
    Locale locale = Locale.getDefault();
    TimeZone zone = TimeZone.getDefault();
    try {
      Locale.setDefault(Locale.forLanguageTag("ar-EG-u-nu-arab"));
      TimeZone.setDefault(TimeZone.getTimeZone("Pacific/Chatham"));
      assertArrayEquals(svg, file().svg());
      assertArrayEquals(png, file().png());
    } finally {
      Locale.setDefault(locale);
      TimeZone.setDefault(zone);
    }
  }
}
