package org.modewright.testsupport;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.lang.ref.Cleaner;
import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.atomic.AtomicBoolean;
import org.eclipse.swt.graphics.Resource;

/**
 * Notices images, fonts, graphics contexts and other resources of the window system that were dropped without being disposed of. The
 * tool kit reports them when the garbage collector finds them, with the place where they were made; those made by this product's code
 * count.
 */
public final class ResourceLeaks {

    private static final String OURS = "org.modewright";
    private static final int MOST_COLLECTIONS = 200;

    private final List<Error> reports = new CopyOnWriteArrayList<>();

    /** Begins to watch; resources made before are not watched. */
    public void watch() {
        Resource.setNonDisposeHandler(reports::add);
    }

    /** What was leaked so far, with stacks; empty if nothing. */
    public String found() {
        collectGarbage();
        StringWriter text = new StringWriter();
        for (Error report : reports) {
            StringWriter stack = new StringWriter();
            report.printStackTrace(new PrintWriter(stack));
            if (isOurs(stack.toString())) {
                text.append(stack.toString());
            }
        }
        reports.clear();
        return text.toString();
    }

    private static boolean isOurs(String stack) {
        return stack.lines().anyMatch(line -> line.contains(OURS) && !line.contains("org.modewright.testsupport"));
    }

    /** Collects until an object that was made just now has been found as garbage, and its cleaner has run, twice. */
    private static void collectGarbage() {
        for (int round = 0; round < 2; round++) {
            AtomicBoolean cleaned = new AtomicBoolean();
            Cleaner.create().register(new Object(), () -> cleaned.set(true));
            for (int i = 0; i < MOST_COLLECTIONS && !cleaned.get(); i++) {
                System.gc();
                Thread.onSpinWait();
            }
        }
    }
}
