package torqueloom.reports.render;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import torqueloom.reports.document.Block;
import torqueloom.reports.document.Document;
import torqueloom.reports.document.Markup;
import torqueloom.reports.document.Section;

/**
 * Writes a document as one HTML page that is well-formed XML too. Style and pictures stand inside the
 * page; it has no script and opens no connection. The same document gives the same characters.
 */
public final class HtmlPage {
  private static final String STYLE = "report.css";

  private HtmlPage() {}

  /** The whole page. */
  public static String of(Document document) {
    final StringBuilder out = new StringBuilder(1 << 16);
    head(document, out);
    out.append("<body>\n").append(Weave.BAND).append('\n');
    out.append("<header class=\"masthead\">\n<h1>").append(Markup.escape(document.title()));
    out.append("</h1>\n<p class=\"subtitle\">").append(Markup.escape(document.subtitle()));
    out.append("</p>\n</header>\n<main>\n<div class=\"lead\">\n");
    final BlockWriter blocks = new BlockWriter(out);
    for (final Block block : document.lead()) {
      blocks.write(block, 2);
    }
    out.append("</div>\n");
    contents(document, out);
    for (final Section section : document.sections()) {
      blocks.write(section, 2);
    }
    out.append("</main>\n<footer><p>").append(Markup.escape(document.footer()));
    out.append("</p></footer>\n</body>\n</html>\n");
    return out.toString();
  }

  private static void head(Document document, StringBuilder out) {
    out.append("<!DOCTYPE html>\n");
    out.append(
        "<html xmlns=\"http://www.w3.org/1999/xhtml\" lang=\"en\" xml:lang=\"en\">\n<head>\n");
    out.append("<meta charset=\"utf-8\"/>\n");
    out.append("<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\"/>\n");
    out.append("<meta name=\"referrer\" content=\"no-referrer\"/>\n");
    out.append("<title>").append(Markup.escape(document.title())).append("</title>\n<style>\n");
    out.append(style()).append("</style>\n</head>\n");
  }

  private static void contents(Document document, StringBuilder out) {
    out.append("<nav class=\"contents\" aria-label=\"Contents\">\n<ol>\n");
    for (final Section section : document.sections()) {
      out.append("<li><a href=\"#").append(section.id()).append("\">");
      out.append(Markup.escape(section.title())).append("</a></li>\n");
    }
    out.append("</ol>\n</nav>\n");
  }

  /** The style sheet; it holds no character that XML would read as markup. */
  private static String style() {
    try (InputStream in = HtmlPage.class.getResourceAsStream(STYLE)) {
      if (in == null) {
        throw new IllegalStateException(
            "the style sheet " + STYLE + " is missing from the program");
      }
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException("the style sheet " + STYLE + " cannot be read", e);
    }
  }
}
