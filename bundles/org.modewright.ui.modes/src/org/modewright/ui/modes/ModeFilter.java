package org.modewright.ui.modes;

import org.modewright.modal.Direction;

/**
 * Which modes the table shows.
 *
 * @param kind all, local, not local, or those with a share of effective mass
 * @param share the least effective mass share, for {@link Kind#AT_LEAST}
 * @param direction the direction of the share; null: any translation
 */
public record ModeFilter(Kind kind, double share, Direction direction) {

    /** Kinds of filter. */
    public enum Kind { ALL, LOCAL, NOT_LOCAL, AT_LEAST }

    public static final ModeFilter ALL = new ModeFilter(Kind.ALL, 0, null);

    public boolean accepts(ModeRows rows, int mode) {
        return switch (kind) {
            case ALL -> true;
            case LOCAL -> rows.mode(mode).isLocal();
            case NOT_LOCAL -> !rows.mode(mode).isLocal();
            case AT_LEAST -> acceptsShare(rows, mode);
        };
    }

    private boolean acceptsShare(ModeRows rows, int mode) {
        if (direction != null) {
            return rows.mode(mode).effectiveMassShare(direction) >= share;
        }
        for (Direction any : Direction.values()) {
            if (any.isTranslation() && rows.mode(mode).effectiveMassShare(any) >= share) {
                return true;
            }
        }
        return false;
    }
}
