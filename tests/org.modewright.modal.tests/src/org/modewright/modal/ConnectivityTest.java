package org.modewright.modal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

/** Parts of a structure: joined by elements and constraints, held by supports and springs. */
class ConnectivityTest {

    /** Nodes 0 and 1 are held, 8 by a spring to them; 2, 3 and 4 hang together alone; 5 and 6 stand on a spring; 7 and 9 are alone. */
    private static Connectivity connectivity() {
        Structures s = new Structures("parts").material("steel", 2e11, 0.3, 7850).section("tube", 0.01, 1e-5, 1e-5, 1e-5);
        for (int i = 0; i < 10; i++) {
            s.node("n" + i, i, i * i, 0);
        }
        s.support("n0", "ux").with("a", "n0", "n1").with("b", "n2", "n3").link("link", "n4", "n3").with("c", "n5", "n6");
        s.spring("ground", "n6", null, 1).mass("n7", 1).spring("between", "n8", "n1", 1);
        return Connectivity.of(s.snapshot());
    }

    @Test
    void partsHangTogetherThroughElementsAndConstraints() {
        Connectivity connectivity = connectivity();
        List<int[]> expected = List.of(new int[] {0, 1, 8}, new int[] {2, 3, 4}, new int[] {5, 6}, new int[] {7}, new int[] {9});
        assertEquals(expected.size(), connectivity.parts().size());
        for (int part = 0; part < expected.size(); part++) {
            assertArrayEquals(expected.get(part), connectivity.parts().get(part));
            for (int node : expected.get(part)) {
                assertEquals(part, connectivity.partOf(node));
            }
        }
    }

    @Test
    void aSupportOrASpringToGroundHoldsThePart() {
        Connectivity connectivity = connectivity();
        int[] held = IntStream.range(0, 5).filter(connectivity::meetsSupport).toArray();
        assertArrayEquals(new int[] {0, 2}, held);
    }

    @Test
    void aMassAloneDoesNotUseItsNode() {
        Connectivity connectivity = connectivity();
        assertFalse(connectivity.isUsed(7) || connectivity.isUsed(9));
        assertTrue(IntStream.range(0, 7).allMatch(connectivity::isUsed));
    }
}
