package org.modewright.workspace;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.core.runtime.NullProgressMonitor;
import org.junit.jupiter.api.Test;
import org.modewright.numerics.CancelledException;
import org.modewright.workspace.internal.MonitorProgress;

class MonitorProgressTest {

    private final Recorder monitor = new Recorder();
    private final MonitorProgress progress = new MonitorProgress(monitor, "audit");

    @Test
    void everyStageIsNamedOnce() {
        progress.report("assembling", 0.1);
        progress.report("assembling", 0.9);
        progress.report("factorising", Double.NaN);
        assertEquals(List.of("assembling", "factorising"), monitor.stages);
    }

    @Test
    void progressGrowsAndNeverPassesTheWhole() {
        double before = 0;
        for (int stage = 0; stage < 100; stage++) {
            for (double fraction = 0; fraction <= 1; fraction += 0.25) {
                progress.report("stage " + stage, fraction);
                assertTrue(monitor.done >= before);
                before = monitor.done;
            }
        }
        assertTrue(before > 0.5 * monitor.total && before <= monitor.total, before + " of " + monitor.total);
    }

    @Test
    void aStepBackIsNotShown() {
        progress.report("solving", 0.8);
        double shown = monitor.done;
        progress.report("solving", 0.2);
        assertEquals(shown, monitor.done);
    }

    @Test
    void aCancelReachesTheComputation() {
        assertFalse(progress.isCancelled());
        monitor.setCanceled(true);
        assertTrue(progress.isCancelled());
        assertThrows(CancelledException.class, progress::checkCancelled);
    }

    private static final class Recorder extends NullProgressMonitor {

        private final List<String> stages = new ArrayList<>();
        private double done;
        private int total;

        @Override
        public void beginTask(String name, int totalWork) {
            total = totalWork;
        }

        @Override
        public void subTask(String name) {
            if (!name.isEmpty()) {
                stages.add(name);
            }
        }

        @Override
        public void worked(int work) {
            done += work;
        }

        @Override
        public void internalWorked(double work) {
            done += work;
        }
    }
}
