package org.crossreach.screen;

/** The median of some numbers, found by selection: the numbers are only sorted as far as needed. */
final class Median {

  private Median() {}

  /**
   * Median of the first numbers of an array, the mean of the two middle ones when they are even.
   *
   * @param values reordered by the call; none of the first {@code size} is NaN
   * @param size how many of them count
   * @return NaN of none
   */
  static double of(double[] values, int size) {
    if (size == 0) {
      return Double.NaN;
    }
    int middle = size / 2;
    double upper = select(values, size, middle);
    if (size % 2 == 1) {
      return upper;
    }
    double lower = values[0];
    for (int i = 1; i < middle; i++) {
      lower = Math.max(lower, values[i]);
    }
    return 0.5 * (lower + upper);
  }

  /** Puts the number of a rank in its place, none greater before and none smaller after it. */
  private static double select(double[] values, int size, int rank) {
    int low = 0;
    int high = size - 1;
    while (high - low > 12) {
      double pivot = middleOf(values[low], values[(low + high) >>> 1], values[high]);
      int i = low - 1;
      int j = high + 1;
      while (true) {
        do {
          i++;
        } while (values[i] < pivot);
        do {
          j--;
        } while (values[j] > pivot);
        if (i >= j) {
          break;
        }
        double swap = values[i];
        values[i] = values[j];
        values[j] = swap;
      }
      if (rank <= j) {
        high = j;
      } else {
        low = j + 1;
      }
    }
    sort(values, low, high);
    return values[rank];
  }

  private static void sort(double[] values, int low, int high) {
    for (int i = low + 1; i <= high; i++) {
      double value = values[i];
      int j = i - 1;
      while (j >= low && values[j] > value) {
        values[j + 1] = values[j];
        j--;
      }
      values[j + 1] = value;
    }
  }

  private static double middleOf(double a, double b, double c) {
    return Math.max(Math.min(a, b), Math.min(Math.max(a, b), c));
  }
}
