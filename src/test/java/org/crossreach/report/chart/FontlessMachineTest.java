package org.crossreach.report.chart;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.TimeUnit;
import org.crossreach.report.Units;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Pictures come out the same on a machine without any font. */
class FontlessMachineTest {

  /** Draws a picture in a process of its own and tells how many bytes it has. */
  public static final class Drawing {
    public static void main(String[] files) throws Exception {
      var result = River.usual().result();
      var pass = result.reduction().passes().get(0);
      var picture = new PictureFile(Charts.ofPass(result, pass, Units.SI).get(1));
      Files.write(Path.of(files[0]), picture.svg());
      Files.write(Path.of(files[1]), picture.png());
    }
  }

  @Test
  void drawsWithoutAnyFont(@TempDir Path folder) throws Exception {
    Path nothing = Files.createDirectory(folder.resolve("nothing"));
    Path configuration = folder.resolve("fonts.conf");
    Files.writeString(
        configuration,
        "<?xml version=\"1.0\"?><fontconfig><dir>" + nothing + "</dir></fontconfig>");
    Path svg = folder.resolve("picture.svg");
    Path png = folder.resolve("picture.png");
    ProcessBuilder child =
        new ProcessBuilder(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-cp",
                System.getProperty("java.class.path"),
                Drawing.class.getName(),
                svg.toString(),
                png.toString())
            .redirectErrorStream(true);
    child.environment().put("FONTCONFIG_FILE", configuration.toString());
    child.environment().remove("DISPLAY");
    Process process = child.start();
    String words = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    assertTrue(process.waitFor(60, TimeUnit.SECONDS), "still drawing");
    assertEquals(0, process.exitValue(), words);
    Drawing.main(
        new String[] {
          folder.resolve("here.svg").toString(), folder.resolve("here.png").toString()
        });
    assertEquals(-1, Files.mismatch(svg, folder.resolve("here.svg")));
    assertTrue(Files.size(png) > 20_000);
  }
}
