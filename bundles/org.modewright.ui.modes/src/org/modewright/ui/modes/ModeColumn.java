package org.modewright.ui.modes;

import java.util.Comparator;
import org.eclipse.osgi.util.NLS;
import org.modewright.modal.Direction;
import org.modewright.modal.Mode;
import org.modewright.ui.widgets.Numbers;

/** A column of the table of modes: what it is called, what it shows, what is copied and how it sorts. */
public enum ModeColumn {

    NUMBER(null, true, 66), PERIOD(null, true, 60), FREQUENCY(null, true, 60),
    MASS_X(Direction.X, true, 52), MASS_Y(Direction.Y, true, 52), MASS_Z(Direction.Z, true, 52),
    RUNNING_X(Direction.X, true, 60), RUNNING_Y(Direction.Y, true, 60), RUNNING_Z(Direction.Z, false, 60),
    MASS_RX(Direction.RX, false, 88), MASS_RY(Direction.RY, false, 88), MASS_RZ(Direction.RZ, false, 88),
    SPREAD(null, false, 64), RESIDUAL(null, false, 88), ERROR_BOUND(null, false, 100), CHARACTER(null, true, 96);

    private final Direction direction;
    private final boolean shownAtFirst;
    private final int width;

    ModeColumn(Direction direction, boolean shownAtFirst, int width) {
        this.direction = direction;
        this.shownAtFirst = shownAtFirst;
        this.width = width;
    }

    /** The direction of a mass column; null for others. */
    public Direction direction() {
        return direction;
    }

    public boolean isShownAtFirst() {
        return shownAtFirst;
    }

    public int width() {
        return width;
    }

    public boolean isNumeric() {
        return this != CHARACTER;
    }

    private boolean isRunning() {
        return this == RUNNING_X || this == RUNNING_Y || this == RUNNING_Z;
    }

    private String axis() {
        return direction.name().substring(direction.name().length() - 1);
    }

    public String header() {
        if (direction != null) {
            String pattern = isRunning() ? Messages.Column_running : direction.isTranslation() ? Messages.Column_mass
                    : Messages.Column_rotary;
            return NLS.bind(pattern, axis());
        }
        return switch (this) {
            case NUMBER -> Messages.Column_number;
            case PERIOD -> Messages.Column_period;
            case FREQUENCY -> Messages.Column_frequency;
            case CHARACTER -> Messages.Column_character;
            case SPREAD -> Messages.Column_spread;
            case RESIDUAL -> Messages.Column_residual;
            default -> Messages.Column_errorBound;
        };
    }

    public String tip() {
        if (direction != null) {
            String pattern = isRunning() ? Messages.Column_runningTip
                    : direction.isTranslation() ? Messages.Column_massTip : Messages.Column_rotaryTip;
            return NLS.bind(pattern, axis());
        }
        return switch (this) {
            case NUMBER -> Messages.Column_numberTip;
            case PERIOD -> Messages.Column_periodTip;
            case FREQUENCY -> Messages.Column_frequencyTip;
            case SPREAD -> Messages.Column_spreadTip;
            case RESIDUAL -> Messages.Column_residualTip;
            case ERROR_BOUND -> Messages.Column_errorBoundTip;
            default -> Messages.Column_characterTip;
        };
    }

    /** The value that the column shows and sorts by; the mode's number for the character, which sorts by its words. */
    public double value(ModeRows rows, int mode) {
        Mode record = rows.mode(mode);
        if (direction != null) {
            return isRunning() ? rows.running(direction, mode) : record.effectiveMassShare(direction);
        }
        return switch (this) {
            case PERIOD -> record.period();
            case FREQUENCY -> record.frequency();
            case SPREAD -> record.spread();
            case RESIDUAL -> record.residual();
            case ERROR_BOUND -> record.errorBound();
            default -> record.number();
        };
    }

    /** The share that the cell's bar shows; 0 for columns without a bar. */
    public double bar(ModeRows rows, int mode) {
        return direction == null ? 0 : Math.min(1, value(rows, mode));
    }

    public String text(ModeRows rows, int mode) {
        if (this == CHARACTER) {
            return rows.mode(mode).character().text();
        }
        double value = value(rows, mode);
        if (direction != null) {
            return rows.hasMass(direction) ? Numbers.percentNumber(value) : "–";
        }
        return switch (this) {
            case NUMBER -> rows.signs(mode) + rows.mode(mode).number();
            case PERIOD, FREQUENCY -> Numbers.significant(value, 4);
            case SPREAD -> Numbers.significant(value, 3);
            default -> Numbers.significant(value, 2);
        };
    }

    /** The cell in full precision, for the clipboard. */
    public String exact(ModeRows rows, int mode) {
        return switch (this) {
            case CHARACTER -> rows.mode(mode).character().text();
            case NUMBER -> Integer.toString(rows.mode(mode).number());
            default -> Numbers.exact(direction == null ? value(rows, mode) : value(rows, mode) * 100);
        };
    }

    public Comparator<Integer> order(ModeRows rows) {
        if (this == CHARACTER) {
            return Comparator.comparing((Integer mode) -> rows.mode(mode).character().text()).thenComparing(Comparator.naturalOrder());
        }
        return Comparator.comparingDouble((Integer mode) -> value(rows, mode)).thenComparing(Comparator.naturalOrder());
    }
}
