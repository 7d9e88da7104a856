package torqueloom.reports.render;

import java.util.regex.Pattern;
import torqueloom.reports.document.Block;
import torqueloom.reports.document.Bullets;
import torqueloom.reports.document.Callout;
import torqueloom.reports.document.Cell;
import torqueloom.reports.document.Definitions;
import torqueloom.reports.document.Figure;
import torqueloom.reports.document.Markup;
import torqueloom.reports.document.Paragraph;
import torqueloom.reports.document.Section;
import torqueloom.reports.document.Span;
import torqueloom.reports.document.Table;
import torqueloom.reports.document.Text;
import torqueloom.reports.document.Tiles;

/** Writes the blocks of a document as HTML elements. */
final class BlockWriter {
  private static final int DEEPEST_HEADING = 6;

  /** Tables of up to so many rows stay on one page in print. */
  private static final int SHORT_TABLE = 12;

  /** The gap between a number and its unit, where no line may end. */
  private static final Pattern UNIT_GAP =
      Pattern.compile("(?<=\\d) (?=(?:%|points|[fpnµmkMG]?[VAJWTKsΩSm])(?![A-Za-z0-9]))");

  private final StringBuilder out;
  private int figures;
  private int tables;

  BlockWriter(StringBuilder out) {
    this.out = out;
  }

  /** Writes a block; headings inside it start at a level. */
  void write(Block block, int level) {
    if (block instanceof Section section) {
      section(section, level);
    } else if (block instanceof Paragraph paragraph) {
      element("p", "", paragraph.text());
    } else if (block instanceof Bullets bullets) {
      out.append("<ul>\n");
      bullets.items().forEach(item -> element("li", "", item));
      out.append("</ul>\n");
    } else if (block instanceof Definitions definitions) {
      definitions(definitions);
    } else if (block instanceof Tiles tiles) {
      tiles(tiles);
    } else if (block instanceof Callout callout) {
      callout(callout, level);
    } else if (block instanceof Figure figure) {
      figure(figure);
    } else if (block instanceof Table table) {
      table(table);
    } else {
      throw new IllegalStateException("no words for " + block.getClass().getSimpleName());
    }
  }

  private void section(Section section, int level) {
    final String heading = "h" + Math.min(level, DEEPEST_HEADING);
    out.append("<section id=\"").append(section.id()).append("\">\n");
    element(heading, "", Text.of(section.title()));
    section.blocks().forEach(inner -> write(inner, level + 1));
    out.append("</section>\n");
  }

  private void definitions(Definitions definitions) {
    out.append("<dl>\n");
    for (final Definitions.Entry entry : definitions.entries()) {
      out.append("<div>");
      element("dt", "", entry.term());
      element("dd", "", entry.value());
      out.append("</div>\n");
    }
    out.append("</dl>\n");
  }

  private void tiles(Tiles tiles) {
    out.append("<dl class=\"tiles\">\n");
    for (final Tiles.Tile tile : tiles.tiles()) {
      out.append("<div>");
      element("dt", "", Text.of(tile.label()));
      element("dd", "value", Text.of(tile.value()));
      if (!tile.detail().isEmpty()) {
        element("dd", "detail", Text.of(tile.detail()));
      }
      out.append("</div>\n");
    }
    out.append("</dl>\n");
  }

  private void callout(Callout callout, int level) {
    final String tone = callout.tone().name().toLowerCase(java.util.Locale.ROOT).replace('_', '-');
    out.append("<div class=\"callout ").append(tone).append("\" role=\"note\">\n");
    out.append(Weave.sign(callout.tone()));
    element("h" + Math.min(level, DEEPEST_HEADING), "", Text.of(callout.title()));
    callout.blocks().forEach(inner -> write(inner, level + 1));
    out.append("</div>\n");
  }

  private void figure(Figure figure) {
    figures++;
    out.append("<figure id=\"").append(figure.id()).append("\">\n<div class=\"scroll\">");
    out.append(figure.picture().svg(figure.id())).append("</div>\n<figcaption><b>Figure ");
    out.append(figures).append(".</b> ").append(inline(figure.caption()));
    out.append("</figcaption>\n</figure>\n");
  }

  private void table(Table table) {
    tables++;
    out.append("<div class=\"scroll\" tabindex=\"0\" role=\"region\" aria-labelledby=\"");
    out.append(table.id()).append("-caption\">\n<table id=\"").append(table.id());
    out.append(table.rows().size() <= SHORT_TABLE ? "\" class=\"short" : "");
    out.append("\">\n<caption id=\"").append(table.id()).append("-caption\"><b>Table ");
    out.append(tables).append(".</b> ").append(Markup.escape(table.caption()));
    out.append("</caption>\n<thead><tr>");
    for (final Table.Column column :
        table.columns().stream().filter(Table.Column::shown).toList()) {
      out.append("<th scope=\"col\"").append(column.numeric() ? " class=\"number\">" : ">");
      out.append(Markup.escape(column.heading())).append("</th>");
    }
    out.append("</tr></thead>\n<tbody>\n");
    table.rows().forEach(row -> row(table, row));
    out.append("</tbody>\n</table>\n</div>\n");
  }

  private void row(Table table, java.util.List<Cell> row) {
    out.append("<tr>");
    for (int i = 0; i < row.size(); i++) {
      if (!table.columns().get(i).shown()) {
        continue;
      }
      final String name = i == 0 ? "th" : "td";
      out.append('<').append(name).append(i == 0 ? " scope=\"row\"" : "");
      out.append(table.columns().get(i).numeric() ? " class=\"number\">" : ">");
      out.append(inline(row.get(i).text())).append("</").append(name).append('>');
    }
    out.append("</tr>\n");
  }

  private void element(String name, String style, Text text) {
    out.append('<').append(name);
    if (!style.isEmpty()) {
      out.append(" class=\"").append(style).append('"');
    }
    out.append('>').append(inline(text)).append("</").append(name).append(">\n");
  }

  private static String inline(Text text) {
    final StringBuilder line = new StringBuilder();
    for (final Span span : text.spans()) {
      final String inside = Markup.escape(UNIT_GAP.matcher(span.text()).replaceAll("\u00A0"));
      line.append(
          switch (span.style()) {
            case PLAIN -> inside;
            case STRONG -> "<strong>" + inside + "</strong>";
            case EMPHASIS -> "<i>" + inside + "</i>";
            case CODE -> "<code>" + inside + "</code>";
            case SUBSCRIPT -> "<sub>" + inside + "</sub>";
          });
    }
    return line.toString();
  }
}
