package broadside.cli;

import broadside.sheet.Block;
import broadside.sheet.Sheet;
import java.io.PrintStream;
import java.util.List;

/** The first part of a sheet as plain text: answers, tables and notes, without the drawing and the calculation. */
final class TextTable {

    static void print(Sheet sheet, PrintStream stream) {
        Lines out = text -> stream.println(Terminal.plain(text));
        out.println(sheet.caution());
        for (Block block : sheet.blocks()) {
            if (block instanceof Block.NewPage || block instanceof Block.Heading h && h.anchor().endsWith("-speed-0")) {
                break;
            }
            print(block, out);
        }
        out.println("");
        out.println(sheet.made());
    }

    private static void print(Block block, Lines out) {
        if (block instanceof Block.Heading heading && !heading.text().equals("Drawing")) {
            out.println("");
            out.println(heading.text());
        } else if (block instanceof Block.Answer answer) {
            answer.lines().forEach(f -> out.println("  " + f.label() + ": " + f.value() + (f.remark().isEmpty() ? "" : "; " + f.remark())));
        } else if (block instanceof Block.Table table) {
            table(table, out);
        } else if (block instanceof Block.Facts facts) {
            out.println("");
            out.println("  " + facts.caption());
            facts.facts().forEach(f -> out.println("  " + f.label() + ": " + f.value()));
        } else if (block instanceof Block.Notes notes) {
            notes.items().forEach(n -> out.println("  - " + n));
        } else if (block instanceof Block.Paragraph paragraph) {
            out.println("  " + paragraph.text());
        }
    }

    private static void table(Block.Table table, Lines out) {
        int[] widths = new int[table.columns().size()];
        for (int i = 0; i < widths.length; i++) {
            int column = i;
            widths[i] = Math.max(table.columns().get(i).heading().length(),
                table.rows().stream().mapToInt(r -> r.cells().get(column).length()).max().orElse(0));
        }
        out.println("");
        out.println("  " + table.caption());
        out.println("  " + row(table, table.columns().stream().map(Block.Column::heading).toList(), widths));
        table.rows().forEach(r -> out.println("  " + row(table, r.cells(), widths)));
    }

    private static String row(Block.Table table, List<String> cells, int[] widths) {
        StringBuilder line = new StringBuilder();
        for (int i = 0; i < widths.length; i++) {
            String pad = " ".repeat(widths[i] - cells.get(i).length());
            line.append(i == 0 ? "" : "  ").append(table.columns().get(i).number() ? pad + cells.get(i) : cells.get(i) + pad);
        }
        return line.toString().stripTrailing();
    }

    /** Takes one line at a time. */
    private interface Lines {
        void println(String text);
    }

    private TextTable() { }
}
