package hissledger.report;

import java.util.ArrayList;
import java.util.List;

/** A plain text table: a header of one or more lines, a rule, and rows; numbers aligned on their decimal point. */
final class TextTable {
    private static final String GAP = "  ";

    /** How the cells of a column line up. */
    enum Align {
        /** At the left edge: words. */
        LEFT,
        /** On the decimal point: numbers, with or without a unit after them. */
        POINT
    }

    private final List<Column> columns = new ArrayList<>();
    private int rows;

    private static final class Column {
        private final Align align;
        private final List<String> header;
        private final List<String> cells = new ArrayList<>();

        Column(Align align, List<String> header) {
            this.align = align;
            this.header = header;
        }

        /** Cells padded so that their points, or their left edges, stand below one another. */
        List<String> aligned() {
            if (align == Align.LEFT) {
                return cells;
            }
            int before = cells.stream().mapToInt(Column::pointAt).max().orElse(0);
            List<String> aligned = new ArrayList<>();
            for (String cell : cells) {
                aligned.add(" ".repeat(before - pointAt(cell)) + cell);
            }
            return aligned;
        }

        /** Where the decimal point of a number stands, or would stand; words among numbers line up at their end. */
        private static int pointAt(String cell) {
            int end = 0;
            while (end < cell.length() && "+-−0123456789".indexOf(cell.charAt(end)) >= 0) {
                end++;
            }
            return end;
        }
    }

    /** Adds a column; each further header word goes on a line of its own. */
    TextTable column(Align align, String... header) {
        columns.add(new Column(align, List.of(header)));
        return this;
    }

    /** Adds a row with as many cells as there are columns. */
    void row(String... cells) {
        if (cells.length != columns.size()) {
            throw new IllegalArgumentException("a row of " + cells.length + " cells in a table of " + columns.size());
        }
        for (int c = 0; c < cells.length; c++) {
            columns.get(c).cells.add(cells[c]);
        }
        rows++;
    }

    /** The table, each line ended by a line feed, without blanks at line ends. */
    String render() {
        int headerLines = columns.stream().mapToInt(c -> c.header.size()).max().orElse(0);
        List<List<String>> aligned = new ArrayList<>();
        List<Integer> widths = new ArrayList<>();
        for (Column column : columns) {
            List<String> cells = column.aligned();
            aligned.add(cells);
            int width = 0;
            for (String cell : cells) {
                width = Math.max(width, cell.length());
            }
            for (String word : column.header) {
                width = Math.max(width, word.length());
            }
            widths.add(width);
        }
        StringBuilder text = new StringBuilder();
        for (int line = 0; line < headerLines; line++) {
            StringBuilder out = new StringBuilder();
            for (int c = 0; c < columns.size(); c++) {
                List<String> header = columns.get(c).header;
                append(out, line < header.size() ? header.get(line) : "", widths.get(c));
            }
            end(text, out);
        }
        int total = widths.stream().mapToInt(width -> width + GAP.length()).sum() - GAP.length();
        text.append("-".repeat(Math.max(0, total))).append('\n');
        for (int r = 0; r < rows; r++) {
            StringBuilder out = new StringBuilder();
            for (int c = 0; c < columns.size(); c++) {
                append(out, aligned.get(c).get(r), widths.get(c));
            }
            end(text, out);
        }
        return text.toString();
    }

    private static void append(StringBuilder line, String cell, int width) {
        line.append(cell).append(" ".repeat(width - cell.length())).append(GAP);
    }

    private static void end(StringBuilder text, StringBuilder line) {
        text.append(line.toString().stripTrailing()).append('\n');
    }
}
