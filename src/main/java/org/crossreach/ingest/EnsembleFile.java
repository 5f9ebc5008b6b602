package org.crossreach.ingest;

import java.util.List;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.InputFile;
import org.crossreach.survey.Note;

/**
 * An ensemble CSV that was read.
 *
 * @param ensembles what it holds
 * @param input its name and the digest of its bytes
 * @param notes what is worth saying about it, may be empty
 */
public record EnsembleFile(Ensembles ensembles, InputFile input, List<Note> notes) {

  public EnsembleFile {
    notes = List.copyOf(notes);
  }
}
