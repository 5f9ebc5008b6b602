package org.crossreach.settings;

/**
 * Ensembles that are to be left out.
 *
 * @param pass name of the pass, for example {@code pass-01}
 * @param fromEnsemble first ensemble number left out
 * @param toEnsemble last ensemble number left out
 * @param reason why, never empty
 */
public record Exclusion(String pass, long fromEnsemble, long toEnsemble, String reason) {

  public Exclusion {
    if (toEnsemble < fromEnsemble) {
      throw new IllegalArgumentException(
          "toEnsemble " + toEnsemble + " is before fromEnsemble " + fromEnsemble);
    }
    if (reason.isBlank()) {
      throw new IllegalArgumentException("reason must say why the ensembles are left out");
    }
  }
}
