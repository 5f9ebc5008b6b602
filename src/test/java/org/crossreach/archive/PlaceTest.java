package org.crossreach.archive;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What cannot be written leaves what was there, and stops the run whichever way it is thrown. */
class PlaceTest {

  @TempDir Path folder;

  @Test
  void stopsAndKeepsTheEarlierFileWhenAWriterHidesAFullDisk() throws IOException {
    Files.writeString(folder.resolve("passes.csv"), "earlier");
    CannotKeep stop =
        assertThrows(
            CannotKeep.class,
            () ->
                new Place(folder)
                    .write(
                        "passes.csv",
                        stream -> {
                          stream.write('x');
                          throw new UncheckedIOException(new IOException("No space left"));
                        }));
    assertTrue(stop.getMessage().contains("No space left"), stop.getMessage());
    assertEquals("earlier", Files.readString(folder.resolve("passes.csv")));
    try (Stream<Path> files = Files.list(folder)) {
      assertEquals(List.of(folder.resolve("passes.csv")), files.toList());
    }
  }

  @Test
  void saysInWordsWhyAPlaceCannotBe() throws IOException {
    Path file = Files.writeString(folder.resolve("index.json"), "earlier");
    CannotKeep stop = assertThrows(CannotKeep.class, () -> new Place(file).open());
    assertEquals(
        file + ": this exists already; nothing half-written was left under a final name",
        stop.getMessage());
  }
}
