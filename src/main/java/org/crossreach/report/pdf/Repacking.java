package org.crossreach.report.pdf;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.util.Collections;
import java.util.IdentityHashMap;
import java.util.Set;
import org.apache.pdfbox.cos.COSArray;
import org.apache.pdfbox.cos.COSBase;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.cos.COSObject;
import org.apache.pdfbox.cos.COSStream;
import org.crossreach.report.chart.PortableDeflate;

/**
 * Compresses the streams of a document anew, so that they are the same bytes whatever the
 * platform's own compression is. Metadata stay plain, and what was packed by us already is left
 * alone.
 */
final class Repacking {

  private final Set<COSBase> seen = Collections.newSetFromMap(new IdentityHashMap<>());

  private Repacking() {}

  /** Works through everything that hangs on an object. */
  static void repack(COSBase root) throws IOException {
    new Repacking().walk(root);
  }

  private void walk(COSBase base) throws IOException {
    if (base instanceof COSObject reference) {
      walk(reference.getObject());
    } else if (base instanceof COSArray array && seen.add(array)) {
      for (COSBase each : array) {
        walk(each);
      }
    } else if (base instanceof COSDictionary dictionary && seen.add(dictionary)) {
      for (COSBase each : dictionary.getValues()) {
        walk(each);
      }
      if (dictionary instanceof COSStream stream) {
        repackStream(stream);
      }
    }
  }

  private static void repackStream(COSStream stream) throws IOException {
    COSName subtype = stream.getCOSName(COSName.SUBTYPE);
    boolean packed =
        COSName.IMAGE.equals(subtype)
            || stream.containsKey(COSName.PARAMS)
            || stream.containsKey(COSName.N);
    if (packed || COSName.METADATA.equals(stream.getCOSName(COSName.TYPE))) {
      return;
    }
    byte[] plain;
    try (InputStream decoded = stream.createInputStream()) {
      plain = decoded.readAllBytes();
    }
    try (OutputStream raw = stream.createRawOutputStream()) {
      raw.write(PortableDeflate.compress(plain));
    }
    stream.setItem(COSName.FILTER, COSName.FLATE_DECODE);
    stream.removeItem(COSName.DECODE_PARMS);
  }
}
