package org.modewright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.widgets.Display;
import org.eclipse.ui.PlatformUI;
import org.junit.jupiter.api.Test;
import org.modewright.testsupport.ResourceLeaks;

/** The check for leaks itself: it must notice what is dropped, and nothing else. */
class ResourceLeaksTest {

    private final Display display = PlatformUI.getWorkbench().getDisplay();
    private final ResourceLeaks leaks = new ResourceLeaks();

    @Test
    void aDroppedImageIsNoticedWithThePlaceWhereItWasMade() {
        leaks.watch();
        display.syncExec(() -> new Image(display, 4, 4));
        String found = leaks.found();
        assertTrue(found.contains(ResourceLeaksTest.class.getSimpleName()), found);
    }

    @Test
    void aDisposedImageIsNot() {
        leaks.watch();
        display.syncExec(() -> new Image(display, 4, 4).dispose());
        assertEquals("", leaks.found());
    }
}
