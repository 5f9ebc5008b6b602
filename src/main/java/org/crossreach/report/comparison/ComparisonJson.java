package org.crossreach.report.comparison;

import java.io.IOException;
import java.io.OutputStream;
import java.util.List;
import java.util.Locale;
import org.crossreach.discharge.PassDischarge;
import org.crossreach.evidence.Choice;
import org.crossreach.evidence.Comparison;
import org.crossreach.evidence.Prediction;
import org.crossreach.evidence.Verdict;
import org.crossreach.notation.JsonText;
import org.crossreach.report.ProgramVersion;
import org.crossreach.report.SettingsJson;
import org.crossreach.settings.ExponentRule;

/** Comparisons as JSON, {@code crossreach-comparison/1}. */
public final class ComparisonJson {

  /** Name and version of the format. */
  public static final String FORMAT = "crossreach-comparison/1";

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
            json.object(
                "program",
                () -> {
                  json.text("name", ProgramVersion.NAME);
                  json.text("version", ProgramVersion.read());
                });
            json.objects("measurements", comparisons, each -> measurement(each, json));
          });
    }
  }

  private static void measurement(Comparison comparison, JsonText json) throws IOException {
    json.text("id", comparison.measurement().id());
    json.object("settings", () -> SettingsJson.members(comparison.settings(), json));
    json.objects("choices", comparison.choices(), each -> choice(each, json));
    json.objects(
        "passes",
        comparison.chosen().result().reduction().passes(),
        (PassDischarge each) -> pass(comparison, each, json));
    json.object("top", () -> verdict(comparison.top(), json));
    json.object("bottom", () -> verdict(comparison.bottom(), json));
    Choice favoured = comparison.favoured();
    json.object(
        "favoured",
        () -> {
          combination(favoured, json);
          json.number("change_pct", favoured.changePct());
        });
    json.text("conclusion", comparison.conclusion());
  }

  private static void combination(Choice choice, JsonText json) throws IOException {
    json.text("top", choice.settings().top().key());
    json.text("bottom", choice.settings().bottom().key());
    json.text("exponent_rule", choice.settings().exponent().rule().key());
  }

  private static void choice(Choice choice, JsonText json) throws IOException {
    combination(choice, json);
    json.number("mean_m3s", choice.discharge().mean());
    json.number("change_pct", choice.changePct());
    json.number("sd_m3s", choice.discharge().sd());
    json.number("cov_pct", choice.discharge().covPct());
    json.number("top_share_pct", choice.topSharePct());
    json.number("bottom_share_pct", choice.bottomSharePct());
    json.object("top_hidden", () -> prediction(choice.top(), json));
    json.object("bottom_hidden", () -> prediction(choice.bottom(), json));
  }

  private static void prediction(Prediction prediction, JsonText json) throws IOException {
    json.number("bias_pct", prediction.biasPct());
    json.number("standard_error_pct", prediction.standardErrorPct());
    json.number("scatter_pct", prediction.scatterPct());
    json.whole("blocks", prediction.blocks().size());
  }

  private static void pass(Comparison comparison, PassDischarge pass, JsonText json)
      throws IOException {
    int place = comparison.chosen().result().reduction().passes().indexOf(pass);
    json.text("name", pass.pass().name());
    json.number("total_m3s", pass.totalM3s());
    var fit = comparison.exponents().get(ExponentRule.FIT_PASS).passes().get(place).fit();
    json.number("fitted_exponent", fit.isPresent() ? fit.get().value() : Double.NaN);
    json.number("top_hidden_bias_pct", comparison.chosen().top().passBiasPct().get(place));
    json.number("bottom_hidden_bias_pct", comparison.chosen().bottom().passBiasPct().get(place));
  }

  private static void verdict(Verdict verdict, JsonText json) throws IOException {
    json.text("finding", verdict.finding().name().toLowerCase(Locale.ROOT).replace('_', '-'));
    json.text("chosen", verdict.chosen().candidate().label());
    json.text("best", verdict.best().candidate().label());
    json.text("sentence", verdict.sentence());
  }
}
