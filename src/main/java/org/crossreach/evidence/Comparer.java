package org.crossreach.evidence;

import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.crossreach.agreement.Result;
import org.crossreach.agreement.Spread;
import org.crossreach.discharge.Exponents;
import org.crossreach.discharge.LaidMeasurement;
import org.crossreach.discharge.Reducer;
import org.crossreach.discharge.Reduction;
import org.crossreach.discharge.Workers;
import org.crossreach.discharge.ZoneDischarge;
import org.crossreach.profile.ColumnFit;
import org.crossreach.profile.ExponentFit;
import org.crossreach.profile.HiddenCells;
import org.crossreach.profile.LawTrial;
import org.crossreach.profile.Zone;
import org.crossreach.settings.ExponentRule;
import org.crossreach.settings.Settings;
import org.crossreach.survey.Measurement;
import org.crossreach.survey.UnusableInput;

/**
 * Compares every combination of laws and exponent rule on one measurement: it is screened, laid on
 * its lines and integrated once for all.
 *
 * @param threads how many passes are worked on side by side, at least 1
 */
public record Comparer(int threads) {

  private static final List<Candidate> CANDIDATES = Candidate.all();

  /** Works on as many passes side by side as there are processors. */
  public static Comparer onAllProcessors() {
    return new Comparer(Runtime.getRuntime().availableProcessors());
  }

  /**
   * Compares.
   *
   * @param measurement what was recorded
   * @param settings the chosen settings
   * @throws UnusableInput as {@link Reducer#reduce}
   */
  public Comparison compare(Measurement measurement, Settings settings) throws UnusableInput {
    return compare(new Reducer(threads).lay(measurement, settings), settings);
  }

  /** Compares what else could have been made of a measurement that is reduced already. */
  public Comparison compare(Reduction reduction) {
    return compare(reduction.laid(), reduction.settings());
  }

  private Comparison compare(LaidMeasurement laid, Settings settings) {
    List<ColumnFit> columns = Exponents.columns(laid, threads);
    Fits fits = new Fits(Exponents.passFits(columns, threads), Exponents.fitToAll(laid, columns));
    Map<ExponentRule, Exponents> exponents = fits.exponents(laid, settings.exponent().value());
    List<Combination> combinations = Combination.all();
    List<Reduction> reductions =
        new Reducer(threads)
            .integrate(
                laid,
                combinations.stream().map(each -> each.in(settings)).toList(),
                combinations.stream().map(each -> exponents.get(each.rule())).toList());
    Result chosen = Result.of(reductions.get(combinations.indexOf(Combination.of(settings))));
    return new Judgement(chosen, reductions, hidden(laid, columns, exponents), fits)
        .comparison(laid);
  }

  private List<HiddenCells> hidden(
      LaidMeasurement laid, List<ColumnFit> columns, Map<ExponentRule, Exponents> exponents) {
    List<Integer> places = IntStream.range(0, columns.size()).boxed().toList();
    return Workers.map(
        places,
        threads,
        place ->
            HiddenCells.of(
                laid.passes().get(place).section(),
                columns.get(place).direction(),
                trials(place, exponents)));
  }

  private static List<LawTrial> trials(int place, Map<ExponentRule, Exponents> exponents) {
    List<LawTrial> trials = new ArrayList<>();
    for (Candidate each : CANDIDATES) {
      Exponents rule = exponents.get(each.rule().orElse(ExponentRule.FIXED));
      trials.add(new LawTrial(each.zone(), each.velocityLaw(), rule.passes().get(place).value()));
    }
    return trials;
  }

  /** Every fitted exponent. */
  private record Fits(List<ExponentFit> passes, ExponentFit all) {

    Map<ExponentRule, Exponents> exponents(LaidMeasurement laid, double fixed) {
      Map<ExponentRule, Exponents> exponents = new EnumMap<>(ExponentRule.class);
      exponents.put(ExponentRule.FIXED, Exponents.fixed(laid, fixed));
      exponents.put(ExponentRule.FIT_PASS, Exponents.fitted(passes, fixed));
      exponents.put(
          ExponentRule.FIT_ALL, Exponents.fitted(Collections.nCopies(passes.size(), all), fixed));
      return exponents;
    }
  }

  /** Puts together what was found. */
  private record Judgement(
      Result chosen, List<Reduction> reductions, List<HiddenCells> hidden, Fits fits) {

    Comparison comparison(LaidMeasurement laid) {
      List<HiddenCells> used = new ArrayList<>();
      List<PassEvidence> passes = new ArrayList<>();
      for (int p = 0; p < hidden.size(); p++) {
        boolean counts = laid.passes().get(p).pass().used();
        if (counts) {
          used.add(hidden.get(p));
        }
        Resamples alone = new Resamples(CANDIDATES, List.of(hidden.get(p)));
        passes.add(
            new PassEvidence(
                laid.passes().get(p).pass().name(),
                counts,
                fits.passes().get(p),
                hidden.get(p).columns(),
                zone(Zone.TOP, alone),
                zone(Zone.BOTTOM, alone)));
      }
      Resamples all = new Resamples(CANDIDATES, used);
      List<CombinationResult> results = new ArrayList<>();
      for (Reduction each : reductions) {
        results.add(result(each, all));
      }
      ZoneEvidence top = zone(Zone.TOP, all);
      ZoneEvidence bottom = zone(Zone.BOTTOM, all);
      return new Comparison(
          chosen,
          results,
          fits.all(),
          all.columns(),
          top,
          bottom,
          passes,
          new Judge(all, results, top, bottom, Combination.of(chosen.reduction().settings()))
              .verdict());
    }

    private ZoneEvidence zone(Zone zone, Resamples resamples) {
      return ZoneEvidence.of(zone, resamples, share(zone, chosen.summary().zones()));
    }

    private CombinationResult result(Reduction reduction, Resamples resamples) {
      Spread spread =
          Spread.of(reduction.used().stream().mapToDouble(each -> each.totalM3s()).toArray());
      ZoneDischarge zones =
          ZoneDischarge.mean(reduction.used().stream().map(each -> each.zones()).toList());
      Combination combination = Combination.of(reduction.settings());
      double top = share(Zone.TOP, zones);
      double bottom = share(Zone.BOTTOM, zones);
      return new CombinationResult(
          combination,
          reduction,
          spread,
          chosen.summary().dischargeM3s().deviationPct(spread.mean()),
          top,
          bottom,
          Judge.error(
              resamples.biasPct(CANDIDATES.indexOf(combination.atTop())),
              top,
              resamples.biasPct(CANDIDATES.indexOf(combination.atBottom())),
              bottom));
    }

    private static double share(Zone zone, ZoneDischarge zones) {
      double part = zone == Zone.TOP ? zones.top() : zones.bottom();
      return 100 * Math.abs(part / zones.total());
    }
  }
}
