package org.modewright.render;

import java.text.Normalizer;
import java.util.HashMap;
import java.util.Map;

/**
 * A small font of strokes, for texts inside the drawing at any size: letters, digits and the usual signs. Accents are left off, and a
 * character that the font does not know is an empty box.
 *
 * <p>The design grid is {@value #CAP} units from the baseline to the top of capitals. A glyph is a list of strokes, a stroke a list of
 * points, each an x digit and a y digit; a, b, c are 1, 2, 3 below the baseline.
 */
final class StrokeFont {

    static final int CAP = 9;

    private static final double GAP = 2.6;
    private static final double SPACE = 4;
    private static final String[] UNKNOWN = {"00 09 59 50 00"};

    private static final String[] DESIGN = {
        "0|20 40 62 67 49 29 07 02 20", "1|07 29 20", "2|07 29 49 67 66 00 60", "3|07 29 49 67 66 45 25|45 63 62 40 20 02",
        "4|40 49 03 63", "5|59 09 05 45 63 62 40 20 02", "6|58 49 29 07 02 20 40 62 63 45 25 03", "7|09 69 20",
        "8|25 06 07 29 49 67 66 45 25 03 02 20 40 62 63 45", "9|01 20 40 62 67 49 29 07 06 24 44 66",
        "A|00 39 60|13 53", "B|00 09 49 67 66 45 05|45 63 62 40 00", "C|67 49 29 07 02 20 40 62", "D|00 09 39 66 63 30 00",
        "E|59 09 00 50|05 45", "F|59 09 00|05 45", "G|67 49 29 07 02 20 40 62 64 34", "H|00 09|60 69|05 65", "I|00 09",
        "J|49 42 30 10 02", "K|00 09|59 04|26 60", "L|09 00 50", "M|00 09 34 69 60", "N|00 09 60 69",
        "O|20 50 72 77 59 29 07 02 20", "P|00 09 49 67 66 44 04", "Q|20 50 72 77 59 29 07 02 20|43 70", "R|00 09 49 67 66 44 04|34 60",
        "S|67 49 29 07 06 25 45 63 62 40 20 02", "T|09 69|39 30", "U|09 02 20 40 62 69", "V|09 30 69", "W|09 20 47 60 89",
        "X|00 69|09 60", "Y|09 35 69|35 30", "Z|09 69 00 60",
        "a|54 36 26 04 02 20 30 52|56 50", "b|09 00|02 20 30 52 54 36 26 04", "c|55 36 26 04 02 20 30 51",
        "d|59 50|54 36 26 04 02 20 30 52", "e|03 53 54 36 26 04 02 20 30 51", "f|49 39 27 20|06 46",
        "g|54 36 26 04 02 20 30 52|56 5a 3c 2c 0b", "h|09 00|04 26 36 54 50", "i|06 00|08 09", "j|26 2a 0c|28 29", "k|09 00|46 02|24 50",
        "l|09 00", "m|06 00|04 16 26 44 40|44 56 66 84 80", "n|06 00|04 26 36 54 50", "o|20 30 52 54 36 26 04 02 20",
        "p|06 0c|04 26 36 54 52 30 20 02", "q|56 5c|54 36 26 04 02 20 30 52", "r|06 00|04 26 36", "s|45 36 16 05 04 13 33 42 41 30 10 01",
        "t|28 21 30 40|06 46", "u|06 02 20 30 52|56 50", "v|06 30 66", "w|06 20 45 60 86", "x|00 56|06 50", "y|06 30|66 1c",
        "z|06 56 00 50",
        ".|00 01", ",|11 0b", ":|01 02|05 06", ";|12 11|11 0b|15 16", "-|04 44", "\u2013|04 64", "\u2212|04 64", "+|04 64|31 37",
        "/|0a 59", "(|29 06 03 20", ")|09 26 23 00", "[|29 09 00 20", "]|09 29 20 00", "=|03 53|05 55",
        "%|00 69|08 19 28 17 08|41 52 61 50 41",
        "_|0a 6a", "\u00b1|16 56|34 38|12 52", "*|31 37|13 55|15 53", "#|10 29|40 59|03 63|06 66", "\u00b0|08 19 28 17 08",
        "\u00b2|08 19 28 05 25",
        "\u00b3|09 29 17 26 15 05", "'|09 07", "\"|09 07|29 27", "<|57 04 51", ">|07 54 01", "?|07 29 49 67 66 34 33|30 31",
        "!|09 03|00 01",
        "\u00b7|04 05", "\u00d7|16 52|12 56", "&|62 40 20 02 03 27 29 39 47 46 60"};

    private final Map<Integer, String[]> glyphs = new HashMap<>();

    StrokeFont() {
        for (String design : DESIGN) {
            int character = design.codePointAt(0);
            glyphs.put(character, design.substring(2).split("\\|"));
        }
    }

    /** Receives the pieces of a text in design units, y upwards from the baseline. */
    interface Pen {
        void stroke(double x0, double y0, double x1, double y1);
    }

    /** The width of a text in design units. */
    double width(String text) {
        return Math.max(0, trace(text, (x0, y0, x1, y1) -> { }) - GAP);
    }

    /** Traces a text; answers where the next character would begin. */
    double trace(String text, Pen pen) {
        double x = 0;
        for (int character : plain(text)) {
            if (Character.isWhitespace(character)) {
                x += SPACE;
            } else {
                x += trace(glyphs.getOrDefault(character, UNKNOWN), x, pen) + GAP;
            }
        }
        return x;
    }

    boolean knows(int character) {
        return glyphs.containsKey(character);
    }

    private static int[] plain(String text) {
        String decomposed = Normalizer.normalize(text.replace("\u00df", "ss"), Normalizer.Form.NFD);
        return decomposed.codePoints().filter(c -> Character.getType(c) != Character.NON_SPACING_MARK).toArray();
    }

    private static double trace(String[] strokes, double left, Pen pen) {
        int widest = 0;
        for (String stroke : strokes) {
            for (int i = 0; i < stroke.length(); i += 3) {
                int x = stroke.charAt(i) - '0';
                widest = Math.max(widest, x);
                if (i > 0) {
                    pen.stroke(left + stroke.charAt(i - 3) - '0', height(stroke.charAt(i - 2)), left + x, height(stroke.charAt(i + 1)));
                }
            }
        }
        return widest;
    }

    private static int height(char code) {
        return code >= 'a' ? 'a' - code - 1 : code - '0';
    }
}
