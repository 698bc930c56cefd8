package org.modewright.render;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class ModeAnimatorTest {

    @Test
    void theLargestDisplacementIsDrawnAsTheWantedShareOfTheModel() {
        ModeAnimator animator = new ModeAnimator(40, 0.5);
        animator.amplitude(0.1);
        assertEquals(4, 0.5 * animator.factor(), 1e-12);
        animator.phase(0);
        assertEquals(0, animator.factor(), 0);
        animator.phase(Math.PI / 6);
        assertEquals(2, 0.5 * animator.factor(), 1e-12);
    }

    @Test
    void timePassesOnlyWhilePlaying() {
        ModeAnimator animator = new ModeAnimator(1, 1);
        animator.speed(0.5);
        animator.phase(0);
        animator.advance(1);
        assertEquals(0, animator.phase(), 0);
        animator.play();
        animator.advance(0.5);
        assertEquals(Math.PI / 2, animator.phase(), 1e-12);
        animator.pause();
        animator.step(0.5);
        assertEquals(3 * Math.PI / 2, animator.phase(), 1e-12);
        animator.step(-1);
        assertEquals(3 * Math.PI / 2, animator.phase(), 1e-12, "a whole cycle back is the same phase");
    }

    @Test
    void aShapeWithoutDisplacementStaysStill() {
        assertEquals(0, new ModeAnimator(10, 0).factor(), 0);
    }
}
