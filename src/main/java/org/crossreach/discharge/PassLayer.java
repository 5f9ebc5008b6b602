package org.crossreach.discharge;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.crossreach.motion.Track;
import org.crossreach.screen.Screen;
import org.crossreach.screen.ScreenedPass;
import org.crossreach.section.Line;
import org.crossreach.section.Section;
import org.crossreach.settings.SectionLine;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.Note;
import org.crossreach.survey.Pass;
import org.crossreach.survey.Problem;
import org.crossreach.survey.UnusableInput;

/** Screens the passes of one measurement and lays them on their lines. */
final class PassLayer {

  /** A boat that ends nearer than this to its start has not crossed anything (m). */
  private static final double SHORTEST_CROSSING_M = 0.5;

  private final Measurement measurement;
  private final Settings settings;
  private final int threads;
  private final List<Note> notes = new ArrayList<>();
  private final List<Problem> problems = new ArrayList<>();

  PassLayer(Measurement measurement, Settings settings, int threads) {
    this.measurement = measurement;
    this.settings = settings;
    this.threads = threads;
  }

  /** A pass with its track. */
  private record Tracked(Pass pass, ScreenedPass screened, Track track) {
    Line ownLine() {
      return Line.along(track, pass.startBank());
    }
  }

  LaidMeasurement lay() throws UnusableInput {
    List<Tracked> sound = new ArrayList<>();
    for (Tracked each : Workers.map(measurement.passes(), threads, this::track)) {
      Optional<Problem> obstacle = obstacle(each);
      if (obstacle.isEmpty()) {
        sound.add(each);
      } else if (each.pass().used()) {
        problems.add(obstacle.get());
      } else {
        notes.add(new Note(Note.Level.CAUTION, "pass-not-reduced", obstacle.get().toString()));
      }
    }
    if (problems.isEmpty() && sound.stream().noneMatch(each -> each.pass().used())) {
      problems.add(
          new Problem(
              "measurement.json",
              0,
              "passes",
              "no pass that is to be used",
              "at least one pass with \"use\": true",
              "choose the passes to use"));
    }
    if (!problems.isEmpty()) {
      throw new UnusableInput(problems);
    }
    return laid(sound);
  }

  private Tracked track(Pass pass) {
    Screen screen = new Screen(measurement.instrument(), measurement.water(), settings);
    ScreenedPass screened = screen.apply(pass.name(), pass.ensembles());
    return new Tracked(pass, screened, Track.of(screened));
  }

  /** What keeps a pass from being laid, if anything. */
  private static Optional<Problem> obstacle(Tracked tracked) {
    ScreenedPass screened = tracked.screened();
    String file = tracked.pass().file();
    int last = screened.size() - 1;
    if (screened.usableEnsembles() == 0) {
      return Optional.of(
          new Problem(
              file,
              0,
              "",
              "no usable ensemble among " + screened.size(),
              "at least one with usable cells and a depth",
              "see which screen rejects the cells, or leave the pass out with \"use\": false"));
    }
    if (last < 1 || Double.isNaN(tracked.track().madeGoodM())) {
      return Optional.of(
          new Problem(
              file,
              0,
              "",
              "no boat velocity in any ensemble, or a single ensemble",
              "a boat that crosses the river",
              "leave the pass out with \"use\": false"));
    }
    if (tracked.track().madeGoodM() < SHORTEST_CROSSING_M) {
      return Optional.of(
          new Problem(
              file,
              0,
              "",
              "a boat that ends "
                  + Math.round(100 * tracked.track().madeGoodM())
                  + " cm from its start",
              "a crossing of at least 0.5 m",
              "leave the pass out with \"use\": false"));
    }
    return Optional.empty();
  }

  private LaidMeasurement laid(List<Tracked> sound) {
    Line common = settings.section().kind() == SectionLine.Kind.COMMON ? commonLine(sound) : null;
    List<LaidPass> passes = new ArrayList<>();
    for (Tracked each : sound) {
      Line line =
          switch (settings.section().kind()) {
            case EACH_PASS -> each.ownLine();
            case COMMON -> common;
            case AZIMUTH -> each.ownLine().turnedTo(settings.section().azimuthDeg());
          };
      passes.add(
          new LaidPass(
              each.pass(),
              Section.of(each.screened(), each.track(), line, each.pass().startBank())));
    }
    return new LaidMeasurement(measurement, passes, notes);
  }

  /** Direction of the sum of the used passes' ways from left to right. */
  private static Line commonLine(List<Tracked> sound) {
    double east = 0;
    double north = 0;
    for (Tracked each : sound) {
      if (each.pass().used()) {
        double length = each.track().madeGoodM();
        east += length * each.ownLine().east();
        north += length * each.ownLine().north();
      }
    }
    return Line.ofVector(east, north);
  }
}
