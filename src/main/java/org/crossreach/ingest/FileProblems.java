package org.crossreach.ingest;

import java.util.ArrayList;
import java.util.List;
import org.crossreach.survey.Problem;
import org.crossreach.survey.UnusableInput;

/**
 * Collects the problems of one file.
 *
 * <p>The first {@value #LISTED} are listed, the rest is counted in one last entry, so that a file
 * in which every number is wrong is still answered with a page and not with a book. Not to be
 * shared between threads.
 */
public final class FileProblems {

  /** Number of problems of one file that are listed one by one. */
  public static final int LISTED = 20;

  private final String file;
  private final List<Problem> listed = new ArrayList<>();
  private long count;

  /**
   * Starts without problems.
   *
   * @param file the file, as the user knows it
   */
  public FileProblems(String file) {
    this.file = file;
  }

  /** The file, as the user knows it. */
  public String file() {
    return file;
  }

  /** Whether there is no problem so far. */
  public boolean isEmpty() {
    return count == 0;
  }

  /**
   * Adds a problem; the parameters are those of {@link Problem}.
   *
   * @param line line in the file, from 1; 0 when the problem has none
   * @param place column name or JSON path, may be empty
   * @param found what was found
   * @param expected what was expected
   * @param remedy what to do, may be empty
   */
  public void add(long line, String place, String found, String expected, String remedy) {
    if (count++ < LISTED) {
      int shownLine = (int) Math.min(line, Integer.MAX_VALUE);
      listed.add(
          new Problem(file, shownLine, Quoted.plain(place), found, expected, Quoted.plain(remedy)));
    }
  }

  /** Number of problems so far, to come back to by {@link #takeBack}. */
  long count() {
    return count;
  }

  /** Forgets every problem after the first ones. */
  void takeBack(long earlierCount) {
    count = earlierCount;
    while (listed.size() > count) {
      listed.remove(listed.size() - 1);
    }
  }

  /** The problems, the uncounted rest as one last entry. */
  public List<Problem> list() {
    List<Problem> all = new ArrayList<>(listed);
    if (count > LISTED) {
      all.add(
          new Problem(
              file,
              0,
              "",
              (count - LISTED) + " more problems, " + count + " in all",
              "none",
              "correct the listed ones first"));
    }
    return all;
  }

  /**
   * Ends the reading of the file when there is any problem.
   *
   * @throws UnusableInput with every problem
   */
  public void throwIfAny() throws UnusableInput {
    if (count > 0) {
      throw new UnusableInput(list());
    }
  }
}
