package org.modewright.ui.tests.editor;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.modewright.ui.editor.pages.NaturalOrder;

/** Names sorted as people do. */
class NaturalOrderTest {

    @Test
    void digitsAreNumbers() {
        List<String> sorted = List.of("", "2", "10", "A", "a2b", "A2C", "a10", "N1", "n2", "N007", "N10", "N123456789012345678901");
        List<String> names = new ArrayList<>(sorted);
        Collections.reverse(names);
        names.sort(new NaturalOrder());
        assertEquals(sorted, names);
    }

    @Test
    void onlyEqualNamesAreEqual() {
        NaturalOrder order = new NaturalOrder();
        assertEquals(0, order.compare("N1", "N1"));
        assertTrue(order.compare("N1", "n1") != 0);
        assertTrue(order.compare("N01", "N1") != 0);
        assertEquals(-Integer.signum(order.compare("N01", "N1")), Integer.signum(order.compare("N1", "N01")));
    }
}
