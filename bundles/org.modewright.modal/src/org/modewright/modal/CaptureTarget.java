package org.modewright.modal;

import java.util.Collections;
import java.util.EnumSet;
import java.util.Set;

/**
 * Until when a run solves on: each direction's effective mass shares must sum to the share. A direction that has no movable mass counts
 * as met.
 *
 * @param share 0 to 1
 * @param directions the directions that count
 */
public record CaptureTarget(double share, Set<Direction> directions) {

    /** Round-off of a sum of shares, so that a structure with all its modes meets a share of 1. */
    public static final double TOLERANCE = 1e-9;

    public CaptureTarget {
        if (!(share >= 0 && share <= 1)) {
            throw new IllegalArgumentException("A capture target lies between 0 and 1, not at " + share + ".");
        }
        EnumSet<Direction> copy = EnumSet.noneOf(Direction.class);
        copy.addAll(directions);
        directions = Collections.unmodifiableSet(copy);
    }

    /** Whether a captured share meets the target, round-off aside. */
    public boolean isMetBy(double captured) {
        return captured + TOLERANCE >= share;
    }
}
