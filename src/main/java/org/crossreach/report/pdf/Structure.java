package org.crossreach.report.pdf;

import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.cos.COSArray;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.cos.COSInteger;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.cos.COSString;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;

/**
 * What the pieces of the pages are, in reading order: the structure tree of a tagged PDF (ISO
 * 32000-1, 14.7).
 */
final class Structure {

  private static final COSName PARENT_TREE_NEXT_KEY = COSName.getPDFName("ParentTreeNextKey");

  private final COSDictionary root = new COSDictionary();
  private final Element document;

  /** For each page the elements of its marked pieces, by number. */
  private final List<COSArray> parents = new ArrayList<>();

  Structure() {
    root.setItem(COSName.TYPE, COSName.getPDFName("StructTreeRoot"));
    document = new Element("Document", root);
    root.setItem(COSName.K, document.dictionary);
  }

  /** The element that holds everything. */
  Element document() {
    return document;
  }

  /** One element of the tree. */
  final class Element {
    private final COSDictionary dictionary = new COSDictionary();
    private final COSArray kids = new COSArray();
    private COSDictionary page;

    private Element(String type, COSDictionary parent) {
      dictionary.setItem(COSName.TYPE, COSName.getPDFName("StructElem"));
      dictionary.setItem(COSName.S, COSName.getPDFName(type));
      dictionary.setItem(COSName.P, parent);
      dictionary.setItem(COSName.K, kids);
    }

    /** Adds an element inside this one, after what is there. */
    Element add(String type) {
      Element child = new Element(type, dictionary);
      kids.add(child.dictionary);
      return child;
    }

    /** Says in words what cannot be read. */
    Element alternative(String text) {
      dictionary.setItem(COSName.ALT, text(text));
      return this;
    }

    /** Gives the true text where the shown one stands in for it. */
    Element actualText(String text) {
      dictionary.setItem(COSName.ACTUAL_TEXT, text(text));
      return this;
    }

    /** Says that a heading of a table stands above its column. */
    Element headsColumn() {
      COSDictionary attributes = new COSDictionary();
      attributes.setItem(COSName.O, COSName.getPDFName("Table"));
      attributes.setItem(COSName.getPDFName("Scope"), COSName.getPDFName("Column"));
      dictionary.setItem(COSName.A, attributes);
      return this;
    }

    /** Says where a figure stands on its page (pt, from the lower left corner). */
    Element box(double left, double low, double right, double high) {
      COSArray box = new COSArray();
      for (double side : new double[] {left, low, right, high}) {
        box.add(COSInteger.get(Math.round(side)));
      }
      COSDictionary attributes = new COSDictionary();
      attributes.setItem(COSName.O, COSName.getPDFName("Layout"));
      attributes.setItem(COSName.getPDFName("Placement"), COSName.getPDFName("Block"));
      attributes.setItem(COSName.BBOX, box);
      dictionary.setItem(COSName.A, attributes);
      return this;
    }

    /** Takes in the next marked piece of a page and returns its number there. */
    int mark(PDPage on, int pageNumber) {
      COSArray ofPage = parents.get(pageNumber);
      int number = ofPage.size();
      ofPage.add(dictionary);
      if (page == null) {
        page = on.getCOSObject();
        dictionary.setItem(COSName.PG, page);
      }
      if (page == on.getCOSObject()) {
        kids.add(COSInteger.get(number));
      } else {
        COSDictionary elsewhere = new COSDictionary();
        elsewhere.setDirect(true);
        elsewhere.setItem(COSName.TYPE, COSName.getPDFName("MCR"));
        elsewhere.setItem(COSName.PG, on.getCOSObject());
        elsewhere.setInt(COSName.MCID, number);
        kids.add(elsewhere);
      }
      return number;
    }
  }

  private static COSString text(String text) {
    return new COSString(text);
  }

  /** Makes room for the marked pieces of a new page. */
  void addPage(PDPage page) {
    page.getCOSObject().setInt(COSName.STRUCT_PARENTS, parents.size());
    page.getCOSObject().setItem(COSName.getPDFName("Tabs"), COSName.S);
    parents.add(new COSArray());
  }

  /** Hangs the tree into a document; nothing may be added afterwards. */
  void attach(PDDocument pdf) {
    COSArray numbers = new COSArray();
    for (int p = 0; p < parents.size(); p++) {
      numbers.add(COSInteger.get(p));
      numbers.add(parents.get(p));
    }
    COSDictionary parentTree = new COSDictionary();
    parentTree.setItem(COSName.NUMS, numbers);
    root.setItem(COSName.PARENT_TREE, parentTree);
    root.setInt(PARENT_TREE_NEXT_KEY, parents.size());
    COSDictionary catalog = pdf.getDocumentCatalog().getCOSObject();
    catalog.setItem(COSName.STRUCT_TREE_ROOT, root);
    COSDictionary marks = new COSDictionary();
    marks.setBoolean(COSName.getPDFName("Marked"), true);
    catalog.setItem(COSName.MARK_INFO, marks);
  }
}
