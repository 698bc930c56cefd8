package org.modewright.render;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;

import org.junit.jupiter.api.Test;

class StrokeFontTest {

    private final StrokeFont font = new StrokeFont();

    private List<String> strokes(String text) {
        List<String> found = new ArrayList<>();
        font.trace(text, (x0, y0, x1, y1) -> found.add(x0 + " " + y0 + " " + x1 + " " + y1));
        return found;
    }

    @Test
    void lettersDigitsAndUsualSignsAreKnownAndDiffer() {
        String all = "ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789.,:;-+/()=%#?!\u00b0\u00b1";
        List<List<String>> seen = new ArrayList<>();
        for (String character : all.split("")) {
            assertTrue(font.knows(character.codePointAt(0)), character);
            List<String> shape = strokes(character);
            assertTrue(!seen.contains(shape), "another character looks like " + character);
            seen.add(shape);
        }
    }

    @Test
    void capitalsReachFromTheBaselineToTheirHeight() {
        for (String capital : "ABCDEFGHIKLMNOPRSTUVWXYZ".split("")) {
            double[] reach = {9, 0};
            font.trace(capital, (x0, y0, x1, y1) -> {
                reach[0] = Math.min(reach[0], Math.min(y0, y1));
                reach[1] = Math.max(reach[1], Math.max(y0, y1));
            });
            assertEquals(0, reach[0], capital);
            assertEquals(StrokeFont.CAP, reach[1], capital);
        }
    }

    @Test
    void accentsAreLeftOff() {
        assertEquals(strokes("Etage"), strokes("\u00c9tage"));
        assertEquals(strokes("Strasse"), strokes("Stra\u00dfe"));
    }

    @Test
    void anUnknownCharacterIsABox() {
        assertEquals(4, strokes("\u6f22").size());
    }

    @Test
    void widthsAddUp() {
        assertEquals(0, font.width(""), 0);
        assertTrue(font.width("AA") > 2 * font.width("A"));
    }
}
