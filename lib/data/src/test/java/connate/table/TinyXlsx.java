package connate.table;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;

/** Writes the smallest XLSX file that holds what a test needs (ECMA-376 part 1, chapter 18). */
final class TinyXlsx {

  private static final String MAIN =
      " xmlns=\"http://schemas.openxmlformats.org/spreadsheetml/2006/main\"";
  private static final String TYPE = "application/vnd.openxmlformats-officedocument.spreadsheetml.";
  private static final String REL =
      "http://schemas.openxmlformats.org/officeDocument/2006/relationships";

  private final Map<String, String> parts = new LinkedHashMap<>();
  private final StringBuilder sheets = new StringBuilder();
  private final StringBuilder relations = new StringBuilder();
  private final StringBuilder types = new StringBuilder();
  private String properties = "";
  private int count;

  TinyXlsx from1904() {
    properties = "<workbookPr date1904=\"1\"/>";
    return this;
  }

  /** Adds a sheet of rows as they stand in the file. */
  TinyXlsx sheet(String name, String rows) {
    count++;
    sheets.append(
        "<sheet name=\"" + name + "\" sheetId=\"" + count + "\" r:id=\"r" + count + "\"/>");
    relations.append("<Relationship Id=\"r" + count + "\" Type=\"" + REL + "/worksheet\"");
    relations.append(" Target=\"worksheets/sheet" + count + ".xml\"/>");
    types.append("<Override PartName=\"/xl/worksheets/sheet" + count + ".xml\"");
    types.append(" ContentType=\"" + TYPE + "worksheet+xml\"/>");
    part(
        "xl/worksheets/sheet" + count + ".xml",
        "<worksheet" + MAIN + "><sheetData>" + rows + "</sheetData></worksheet>");
    return this;
  }

  TinyXlsx part(String name, String content) {
    parts.put(name, content);
    return this;
  }

  /** A row of a line number and cells: text, a bare number, or a number with {@code #style}. */
  static String row(int line, String... cells) {
    StringBuilder out = new StringBuilder("<row r=\"" + line + "\">");
    for (int i = 0; i < cells.length; i++) {
      out.append(cell(Sheet.name(i) + line, cells[i]));
    }
    return out.append("</row>").toString();
  }

  private static String cell(String at, String text) {
    if (text.isEmpty()) {
      return "";
    }
    String[] parts = text.split("#style");
    if (parts[0].matches("-?[0-9.]+(E-?\\d+)?")) {
      String style = parts.length > 1 ? " s=\"" + parts[1] + "\"" : "";
      return "<c r=\"" + at + "\"" + style + "><v>" + parts[0] + "</v></c>";
    }
    if (text.startsWith("#")) {
      return "<c r=\"" + at + "\" t=\"e\"><v>" + text + "</v></c>";
    }
    return "<c r=\"" + at + "\" t=\"inlineStr\"><is><t>" + text + "</t></is></c>";
  }

  byte[] bytes() {
    part("xl/styles.xml", styles());
    part("xl/workbook.xml", workbook());
    part(
        "xl/_rels/workbook.xml.rels",
        "<Relationships xmlns=\"http://schemas.openxmlformats.org/package/2006/relationships\">"
            + relations
            + "</Relationships>");
    part(
        "[Content_Types].xml",
        "<Types xmlns=\"http://schemas.openxmlformats.org/package/2006/content-types\">"
            + ("<Override PartName=\"/xl/workbook.xml\" ContentType=\""
                + TYPE
                + "sheet.main+xml\"/>")
            + ("<Override PartName=\"/xl/styles.xml\" ContentType=\"" + TYPE + "styles+xml\"/>")
            + types
            + "</Types>");
    return zip(parts);
  }

  private String workbook() {
    return "<workbook"
        + MAIN
        + " xmlns:r=\""
        + REL
        + "\">"
        + properties
        + "<sheets>"
        + sheets
        + "</sheets></workbook>";
  }

  /** Styles 0 plain, 1 0.0 %, 2 a date, 3 a format of its own with a date, 4 one with a percent. */
  private static String styles() {
    return "<styleSheet"
        + MAIN
        + "><numFmts count=\"2\">"
        + "<numFmt numFmtId=\"164\" formatCode=\"yyyy\\-mm\\-dd hh:mm\"/>"
        + "<numFmt numFmtId=\"165\" formatCode=\"0.00%\"/></numFmts>"
        + "<cellXfs count=\"5\"><xf numFmtId=\"0\"/><xf numFmtId=\"10\"/><xf numFmtId=\"14\"/>"
        + "<xf numFmtId=\"164\"/><xf numFmtId=\"165\"/></cellXfs></styleSheet>";
  }

  static byte[] zip(Map<String, String> parts) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    try (ZipOutputStream zip = new ZipOutputStream(out)) {
      for (Map.Entry<String, String> part : parts.entrySet()) {
        zip.putNextEntry(new ZipEntry(part.getKey()));
        zip.write(part.getValue().getBytes(StandardCharsets.UTF_8));
        zip.closeEntry();
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return out.toByteArray();
  }
}
