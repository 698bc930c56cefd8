package org.modewright.numerics;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;

import org.junit.jupiter.api.Test;

class CancelTest {

    /** Cancels at the given question whether it shall stop. */
    private static final class CancelAt implements Progress {

        private final long question;
        private long asked;
        private final List<String> stages = new ArrayList<>();

        CancelAt(long question) {
            this.question = question;
        }

        @Override
        public void report(String stage, double fraction) {
            assertTrue(Double.isNaN(fraction) || fraction >= 0.0 && fraction <= 1.0, stage + ": " + fraction);
            assertFalse(stage.isBlank());
            stages.add(stage);
        }

        @Override
        public boolean isCancelled() {
            asked++;
            return asked >= question;
        }
    }

    private static void run(EigenSolver solver, EigenProblem problem, Progress progress) {
        try (EigenSession session = solver.open(problem, progress)) {
            session.certify(session.solve(EigenRequest.lowest(20), progress), progress);
        }
    }

    @Test
    void everyQuestionIsObeyedAtOnce() {
        EigenProblem problem = FrameBuilding.problem(4, 4, 6, 2, 6.0, 5.0);
        CancelAt never = new CancelAt(Long.MAX_VALUE);
        run(EigenSolvers.lanczos(), problem, never);
        long step = Math.max(1, never.asked / 25);
        assertTrue(never.asked > 100, "questions " + never.asked);
        for (long question = 1; question < never.asked; question += step) {
            CancelAt progress = new CancelAt(question);
            try {
                run(EigenSolvers.lanczos(), problem, progress);
                // A run that waits less for its dense eigenvalues asks less often.
                assertTrue(progress.asked < question, "asked " + progress.asked + " times, not stopped at " + question);
            } catch (CancelledException obeyed) {
                assertEquals(question, progress.asked);
            }
        }
    }

    @Test
    void denseSolutionIsCancelledToo() {
        EigenProblem problem = Pencils.freeTruss(5, 5, 5);
        CancelAt progress = new CancelAt(60);
        assertThrows(CancelledException.class, () -> run(EigenSolvers.dense(), problem, progress));
        assertEquals(60, progress.asked);
    }

    @Test
    void cancelledSessionMayBeAskedAgain() {
        EigenProblem problem = FrameBuilding.problem(3, 3, 5, 2, 6.0, 5.0);
        EigenRequest request = EigenRequest.lowest(30);
        EigenPairs undisturbed = EigenSolvers.lanczos().open(problem, Progress.NONE).solve(request, Progress.NONE);
        for (long question : new long[] {1, 5, 10, 20, 30}) {
            EigenSession session = EigenSolvers.lanczos().open(problem, Progress.NONE);
            CancelAt progress = new CancelAt(question);
            assertThrows(CancelledException.class, () -> session.solve(request, progress));
            EigenPairs pairs = session.solve(request, Progress.NONE);
            assertArrayEquals(undisturbed.values(), pairs.values(), 1e-9 * undisturbed.values()[29]);
            assertTrue(session.certify(pairs, Progress.NONE).complete());
        }
    }

    @Test
    void stagesAreToldInWords() {
        CancelAt never = new CancelAt(Long.MAX_VALUE);
        run(EigenSolvers.lanczos(), FrameBuilding.problem(4, 4, 6, 2, 6.0, 5.0), never);
        String all = String.join("\n", never.stages);
        assertTrue(all.contains("Ordering the equations"), all);
        assertTrue(all.contains("Factorising: equation"), all);
        assertTrue(all.contains("Converged modes: 20 of 20"), all);
    }
}
