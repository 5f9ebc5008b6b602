package org.crossreach.report.comparison;

import java.io.IOException;
import java.io.OutputStream;
import java.util.List;
import org.crossreach.evidence.CandidateEvidence;
import org.crossreach.evidence.Combination;
import org.crossreach.evidence.CombinationResult;
import org.crossreach.evidence.Comparison;
import org.crossreach.evidence.PassEvidence;
import org.crossreach.evidence.ZoneEvidence;
import org.crossreach.notation.JsonText;
import org.crossreach.profile.ExponentFit;
import org.crossreach.report.ProgramVersion;
import org.crossreach.report.SettingsJson;

/** Writes comparisons of laws as JSON. */
public final class ComparisonJson {

  /** Name and version of the format. */
  public static final String FORMAT = "crossreach-comparison/1";

  /** Name of the file. */
  public static final String FILE = "comparison.json";

  private ComparisonJson() {}

  /**
   * Writes comparisons.
   *
   * @param comparisons one for each measurement
   * @param target receives UTF-8; it is left open
   */
  public static void write(List<Comparison> comparisons, OutputStream target) throws IOException {
    try (JsonText json = new JsonText(target)) {
      json.object(
          () -> {
            json.text("format", FORMAT);
            ProgramVersion.write(ProgramVersion.read(), json);
            json.objects("measurements", comparisons, each -> measurement(each, json));
          });
    }
  }

  private static void measurement(Comparison comparison, JsonText json) throws IOException {
    json.text("id", comparison.chosen().reduction().measurement().id());
    json.objects(
        "inputs",
        comparison.chosen().reduction().measurement().inputs(),
        each -> {
          json.text("file", each.file());
          json.text("sha256", each.sha256());
        });
    json.object(
        "settings", () -> SettingsJson.members(comparison.chosen().reduction().settings(), json));
    json.object(
        "verdict",
        () -> {
          json.text("kind", comparison.verdict().kind().key());
          choices(comparison.verdict().combination(), json);
          json.number("change_pct", comparison.verdict().changePct());
          json.text("sentence", comparison.verdict().sentence());
        });
    json.objects(
        "combinations", comparison.combinations(), each -> combination(comparison, each, json));
    json.object(
        "evidence",
        () -> {
          json.whole("columns", comparison.columns());
          json.object("exponent_fit", () -> fit(comparison.exponent(), json));
          json.object("top", () -> zone(comparison.top(), json));
          json.object("bottom", () -> zone(comparison.bottom(), json));
        });
    json.objects("passes", comparison.passes(), each -> pass(each, json));
  }

  private static void choices(Combination combination, JsonText json) throws IOException {
    json.text("top", combination.top().key());
    json.text("bottom", combination.bottom().key());
    json.text("exponent_rule", combination.rule().key());
  }

  private static void combination(Comparison comparison, CombinationResult result, JsonText json)
      throws IOException {
    choices(result.combination(), json);
    json.flag("chosen", result.combination().equals(comparison.chosenCombination()));
    json.number("mean_m3s", result.dischargeM3s().mean());
    json.number("change_pct", result.changePct());
    json.number("sd_m3s", result.dischargeM3s().sd());
    json.number("cov_pct", result.dischargeM3s().covPct());
    json.number("top_share_pct", result.topPct());
    json.number("bottom_share_pct", result.bottomPct());
    json.number("expected_error_pct", result.expectedErrorPct());
    json.objects(
        "passes",
        result.reduction().passes(),
        pass -> {
          json.text("name", pass.pass().name());
          json.number("exponent", pass.exponent());
          json.number("top_m3s", pass.zones().top());
          json.number("bottom_m3s", pass.zones().bottom());
          json.number("total_m3s", pass.totalM3s());
        });
  }

  private static void fit(ExponentFit fit, JsonText json) throws IOException {
    json.number("value", fit.value());
    json.numbers("ci95", fit.low95(), fit.high95());
    json.whole("columns", fit.columns());
    if (fit.refusal().isPresent()) {
      json.text("refusal", fit.refusal().get());
    } else {
      json.nothing("refusal");
    }
  }

  private static void zone(ZoneEvidence zone, JsonText json) throws IOException {
    if (zone.law().isPresent()) {
      json.text("law", zone.law().get());
    } else {
      json.nothing("law");
    }
    json.objects("ranked", zone.ranked(), each -> candidate(each, json));
  }

  private static void candidate(CandidateEvidence evidence, JsonText json) throws IOException {
    json.text("law", evidence.candidate().law());
    if (evidence.candidate().rule().isPresent()) {
      json.text("exponent_rule", evidence.candidate().rule().get().key());
    } else {
      json.nothing("exponent_rule");
    }
    json.number("bias_pct", evidence.biasPct());
    json.number("half95_pct", evidence.half95Pct());
    json.number("scatter_pct", evidence.scatterPct());
    json.flag("equal_to_best", evidence.equal());
  }

  private static void pass(PassEvidence pass, JsonText json) throws IOException {
    json.text("name", pass.pass());
    json.flag("used", pass.used());
    json.whole("columns", pass.columns());
    json.object("exponent_fit", () -> fit(pass.exponent(), json));
    json.object("top", () -> zone(pass.top(), json));
    json.object("bottom", () -> zone(pass.bottom(), json));
  }
}
