package hissledger.chart;

import java.awt.Font;
import java.awt.Graphics2D;
import java.util.ArrayList;
import java.util.List;

/**
 * A text broken into lines that keep within a width.
 *
 * @param lines the lines
 * @param font the font of all of them
 */
record Lettering(List<String> lines, Font font) {
    private static final double LINE_HEIGHT = 1.28;
    /** From the middle of a line to its base line: half the height of a capital. */
    private static final double MIDDLE_TO_BASE = 0.36;

    private static final String ELLIPSIS = "…";

    Lettering {
        lines = List.copyOf(lines);
    }

    /**
     * Breaks a text at its blanks, and inside a word where a word alone is too wide. What does not fit into the lines allowed
     * is left out, and the end of the last line says so.
     */
    static Lettering broken(String text, Font font, double width, int mostLines) {
        List<String> lines = new ArrayList<>();
        String rest = clean(text);
        while (!rest.isEmpty() && lines.size() < mostLines) {
            int end = fitting(rest, font, width);
            if (end < rest.length()) {
                int blank = rest.lastIndexOf(' ', end);
                end = blank > 0 ? blank : end;
            }
            lines.add(rest.substring(0, end).strip());
            rest = rest.substring(end).strip();
        }
        if (!rest.isEmpty() && !lines.isEmpty()) {
            int last = lines.size() - 1;
            lines.set(last, shortened(lines.get(last), font, width));
        }
        return new Lettering(lines, font);
    }

    /** Line breaks and other controls of a name are blanks in a picture. */
    private static String clean(String text) {
        return text.replaceAll("\\p{Cntrl}+", " ").strip();
    }

    /** How many characters from the start keep within a width; at least one. */
    private static int fitting(String text, Font font, double width) {
        int end = text.length();
        while (end > 1 && width(text.substring(0, end).stripTrailing(), font) > width) {
            end--;
        }
        return end > 1 && Character.isHighSurrogate(text.charAt(end - 1)) ? end - 1 : end;
    }

    private static String shortened(String line, Font font, double width) {
        String kept = line;
        while (kept.length() > 1 && width(kept + ELLIPSIS, font) > width) {
            int end = kept.length() - 1;
            kept = kept.substring(0, Character.isLowSurrogate(kept.charAt(end)) ? end - 1 : end)
                    .stripTrailing();
        }
        return kept + ELLIPSIS;
    }

    /** The width of a line, pixels. */
    static double width(String line, Font font) {
        return font.getStringBounds(line, RuledAxes.LETTERING).getWidth();
    }

    /** The widest line, pixels. */
    double width() {
        return lines.stream().mapToDouble(line -> width(line, font)).max().orElse(0.0);
    }

    double lineHeight() {
        return LINE_HEIGHT * font.getSize2D();
    }

    double height() {
        return lines.size() * lineHeight();
    }

    /** Draws the lines, the first of them just below {@code top}. */
    void draw(Graphics2D graphics, double x, double top) {
        graphics.setFont(font);
        double base = top + lineHeight() / 2.0 + MIDDLE_TO_BASE * font.getSize2D();
        for (String line : lines) {
            graphics.drawString(line, (float) x, (float) base);
            base += lineHeight();
        }
    }
}
