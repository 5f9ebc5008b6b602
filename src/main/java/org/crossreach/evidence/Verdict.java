package org.crossreach.evidence;

/**
 * What the evidence says about the chosen combination.
 *
 * @param kind the verdict in a word
 * @param combination the combination to be used: the chosen one unless the evidence favours another
 * @param changePct what that would change of the mean discharge (%)
 * @param sentence the verdict and its reason for a person
 */
public record Verdict(Kind kind, Combination combination, double changePct, String sentence) {

  /** The verdict in a word. */
  public enum Kind {
    /** Nothing speaks against the chosen combination. */
    KEEP("keep"),
    /** Another combination is better. */
    CHANGE("change"),
    /** The evidence cannot tell. */
    CANNOT_TELL("cannot-tell");

    private final String key;

    Kind(String key) {
      this.key = key;
    }

    /** Name in results, lower case with hyphens. */
    public String key() {
      return key;
    }
  }
}
