package org.modewright.ui.modes;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.function.IntConsumer;
import java.util.stream.Collectors;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.SWT;
import org.eclipse.swt.accessibility.AccessibleAdapter;
import org.eclipse.swt.accessibility.AccessibleEvent;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Canvas;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Event;
import org.modewright.audit.AuditResult;
import org.modewright.audit.Verdict;
import org.modewright.modal.Direction;
import org.modewright.modal.ModalResult;
import org.modewright.ui.UiIds;
import org.modewright.ui.widgets.DirectionColours;
import org.modewright.ui.widgets.Numbers;
import org.modewright.ui.widgets.ThemeColours;

/**
 * The staircase of cumulative effective mass over the modes, one line a direction, with the required share, the mode that reaches it and,
 * at the right, a column a direction in which the missing mass is hatched.
 */
final class StaircasePlot extends Canvas {

    private static final int GAP = 4;
    private static final int LETTERS = 16;
    private static final int KEY_LINE = 20;
    private static final int LINES_PER_STEP = 2;
    private static final int OPAQUE = 255;
    private static final int VEILED = 200;
    private static final int MARK = 8;

    private final IntConsumer whenPicked;
    private final CaptureColumns columns = new CaptureColumns(this, LETTERS);
    private AuditResult audit;
    private CaptureScale scale;
    private boolean byPeriod;
    private int selected = -1;

    StaircasePlot(Composite parent, IntConsumer whenPicked) {
        super(parent, SWT.DOUBLE_BUFFERED);
        this.whenPicked = whenPicked;
        setData(UiIds.WIDGET_ID, "capture.plot");
        addListener(SWT.Paint, event -> paint(event.gc));
        addListener(SWT.MouseMove, this::explain);
        addListener(SWT.MouseDown, this::pick);
        addListener(SWT.KeyDown, this::key);
        addListener(SWT.FocusIn, event -> redraw());
        addListener(SWT.FocusOut, event -> redraw());
        getAccessible().addAccessibleListener(new AccessibleAdapter() {
            @Override
            public void getName(AccessibleEvent event) {
                event.result = Messages.Capture_accessibleName;
            }
        });
        addListener(SWT.Traverse, event -> event.doit = event.detail != SWT.TRAVERSE_ARROW_NEXT
                && event.detail != SWT.TRAVERSE_ARROW_PREVIOUS);
    }

    void show(AuditResult result) {
        audit = result;
        scale = result == null ? null : new CaptureScale(result.modal(), byPeriod);
        redraw();
    }

    void setByPeriod(boolean value) {
        byPeriod = value;
        show(audit);
    }

    void select(int mode) {
        selected = mode;
        redraw();
    }

    private boolean isEmpty() {
        return audit == null || audit.modal().modes().isEmpty();
    }

    private ModalResult modal() {
        return audit.modal();
    }

    /** The area of the staircase itself. */
    private Rectangle area(GC gc) {
        Rectangle client = getClientArea();
        int line = gc.getFontMetrics().getHeight();
        int left = gc.textExtent("100").x + 3 * GAP;
        int right = LETTERS + columns.width() + GAP;
        int top = line + 3 * GAP;
        return new Rectangle(left, top, Math.max(10, client.width - left - right), Math.max(10, client.height - top - 2 * line - 3 * GAP));
    }

    private void paint(GC gc) {
        gc.setBackground(getBackground());
        gc.fillRectangle(getClientArea());
        if (isEmpty()) {
            return;
        }
        gc.setAntialias(SWT.ON);
        Rectangle area = area(gc);
        paintFrame(gc, area);
        paintSelected(gc, area);
        paintRequired(gc, area);
        for (Direction direction : directions()) {
            paintStairs(gc, area, direction);
        }
        paintReached(gc, area);
        paintLetters(gc, area);
        columns.paint(gc, area, modal());
        if (isFocusControl()) {
            gc.setForeground(ThemeColours.link(this));
            gc.drawRectangle(0, 0, getClientArea().width - 1, getClientArea().height - 1);
        }
    }

    /** The translations that have mass, those not judged first, so that judged lines lie on top. */
    private List<Direction> directions() {
        List<Direction> directions = new ArrayList<>();
        for (Direction direction : List.of(Direction.Z, Direction.Y, Direction.X)) {
            if (modal().hasMass(direction)) {
                directions.add(verdict(direction).isEmpty() ? 0 : directions.size(), direction);
            }
        }
        return directions;
    }

    private Optional<Verdict> verdict(Direction direction) {
        return audit.verdicts().stream().filter(verdict -> verdict.direction() == direction).findFirst();
    }

    private void paintFrame(GC gc, Rectangle area) {
        int line = gc.getFontMetrics().getHeight();
        gc.setLineWidth(1);
        int step = area.height >= 5 * LINES_PER_STEP * line ? 20 : area.height >= 4 * line ? 50 : 100;
        for (int percent = 0; percent <= 100; percent += step) {
            int y = y(area, percent / 100.0);
            gc.setForeground(ThemeColours.mix(getForeground(), getBackground(), percent == 0 ? 0.4 : 0.1));
            gc.drawLine(area.x, y, area.x + area.width, y);
            gc.setForeground(ThemeColours.secondaryText(this));
            String text = Integer.toString(percent);
            gc.drawText(text, area.x - GAP - gc.textExtent(text).x, y - line / 2, true);
        }
        gc.drawText(Messages.Capture_axisMass, GAP, 0, true);
        paintTicks(gc, area);
    }

    private void paintTicks(GC gc, Rectangle area) {
        int y = area.y + area.height;
        int end = area.x - 1000;
        for (CaptureScale.Tick tick : scale.ticks()) {
            int x = x(area, tick.position());
            int half = gc.textExtent(tick.text()).x / 2;
            if (x - half < end + 2 * GAP || x + half > area.x + area.width + half) {
                continue;
            }
            gc.setForeground(ThemeColours.rule(this));
            gc.drawLine(x, y, x, y + GAP);
            gc.setForeground(ThemeColours.secondaryText(this));
            gc.drawText(tick.text(), x - half, y + GAP, true);
            end = x + half;
        }
        String axis = scale.isByPeriod() ? Messages.Capture_axisPeriod : Messages.Capture_axisNumber;
        gc.drawText(axis, area.x + area.width - gc.textExtent(axis).x, y + GAP + gc.getFontMetrics().getHeight(), true);
    }

    private void paintSelected(GC gc, Rectangle area) {
        if (selected < 0 || selected >= modal().modes().size()) {
            return;
        }
        int x = x(area, scale.position(selected));
        gc.setForeground(ThemeColours.selection(this));
        gc.setLineWidth(2);
        gc.drawLine(x, area.y, x, area.y + area.height);
        gc.setLineWidth(1);
    }

    private void paintRequired(GC gc, Rectangle area) {
        audit.verdicts().stream().mapToDouble(Verdict::required).distinct().forEach(required -> {
            int y = y(area, required);
            gc.setForeground(getForeground());
            gc.setLineStyle(SWT.LINE_DASH);
            gc.drawLine(area.x, y, area.x + area.width, y);
            gc.setLineStyle(SWT.LINE_SOLID);
        });
        paintRequiredKey(gc);
    }

    /** Says above the staircase what the dashed line is. */
    private void paintRequiredKey(GC gc) {
        String text = audit.verdicts().stream().map(Verdict::required).distinct().map(Numbers::percent)
                .collect(Collectors.joining(", "));
        if (text.isEmpty()) {
            return;
        }
        int x = 4 * GAP + gc.textExtent(Messages.Capture_axisMass).x;
        int middle = gc.getFontMetrics().getHeight() / 2;
        gc.setForeground(getForeground());
        gc.setLineStyle(SWT.LINE_DASH);
        gc.drawLine(x, middle, x + KEY_LINE, middle);
        gc.setLineStyle(SWT.LINE_SOLID);
        gc.drawText(NLS.bind(Messages.Capture_required, text), x + KEY_LINE + GAP, 0, true);
    }

    private void paintStairs(GC gc, Rectangle area, Direction direction) {
        double[] running = modal().running(direction);
        int[] points = new int[4 * running.length + 2];
        points[0] = area.x;
        points[1] = y(area, 0);
        for (int mode = 0; mode < running.length; mode++) {
            int x = x(area, scale.position(mode));
            points[4 * mode + 2] = x;
            points[4 * mode + 3] = points[4 * mode + 1];
            points[4 * mode + 4] = x;
            points[4 * mode + 5] = y(area, running[mode]);
        }
        gc.setForeground(DirectionColours.of(direction));
        gc.setLineWidth(verdict(direction).isPresent() ? 3 : 1);
        gc.drawPolyline(points);
        gc.setLineWidth(1);
    }

    private void paintReached(GC gc, Rectangle area) {
        for (Verdict verdict : audit.verdicts()) {
            if (verdict.reachedAtMode() <= 0 || verdict.reachedAtMode() > modal().modes().size()) {
                continue;
            }
            int mode = verdict.reachedAtMode() - 1;
            int x = x(area, scale.position(mode));
            int y = y(area, modal().running(verdict.direction())[mode]);
            gc.setBackground(getBackground());
            gc.setForeground(DirectionColours.of(verdict.direction()));
            gc.setLineWidth(2);
            gc.fillOval(x - MARK / 2, y - MARK / 2, MARK, MARK);
            gc.drawOval(x - MARK / 2, y - MARK / 2, MARK, MARK);
            gc.setLineWidth(1);
            paintReachedLabel(gc, area, verdict, x, y);
        }
    }

    private void paintReachedLabel(GC gc, Rectangle area, Verdict verdict, int x, int y) {
        String text = verdict.direction().name() + ": " + NLS.bind(Messages.Capture_mode, verdict.reachedAtMode());
        Point size = gc.textExtent(text);
        int left = Math.max(area.x + GAP, Math.min(x + MARK, area.x + area.width - size.x - GAP));
        int line = verdict.direction().ordinal();
        gc.setForeground(DirectionColours.of(verdict.direction()));
        gc.drawLine(x, y + MARK / 2, x, Math.max(y + MARK / 2, y(area, verdict.required()) + GAP + line * size.y + size.y / 2));
        gc.setForeground(getForeground());
        paintText(gc, text, left, Math.min(y(area, verdict.required()) + GAP + line * size.y, area.y + area.height - size.y));
    }

    /** Text on a veil, so that lines behind do not cross it. */
    private void paintText(GC gc, String text, int x, int y) {
        Point size = gc.textExtent(text);
        gc.setBackground(getBackground());
        gc.setAlpha(VEILED);
        gc.fillRectangle(x - 1, y, size.x + 2, size.y);
        gc.setAlpha(OPAQUE);
        gc.drawText(text, x, y, true);
    }

    /** The name of each direction where its line ends, the names kept apart. */
    private void paintLetters(GC gc, Rectangle area) {
        int line = gc.getFontMetrics().getHeight();
        List<Direction> upwards = new ArrayList<>(directions());
        upwards.sort(Comparator.comparingDouble(modal()::capture));
        int limit = area.y + area.height;
        int[] tops = new int[upwards.size()];
        for (int i = 0; i < tops.length; i++) {
            tops[i] = Math.min(limit, y(area, modal().capture(upwards.get(i))) + line / 2) - line;
            limit = tops[i];
        }
        int shift = Math.max(0, area.y - line - (tops.length == 0 ? area.y : tops[tops.length - 1]));
        for (int i = 0; i < tops.length; i++) {
            gc.setForeground(DirectionColours.of(upwards.get(i)));
            gc.drawText(upwards.get(i).name(), area.x + area.width + GAP, tops[i] + shift, true);
        }
    }

    private int x(Rectangle area, double position) {
        return area.x + (int) Math.round(position * area.width);
    }

    private static int y(Rectangle area, double share) {
        return area.y + area.height - (int) Math.round(share * area.height);
    }

    /** The mode under the pointer; -1 outside the staircase. */
    private int modeAt(int x, int y) {
        if (isEmpty()) {
            return -1;
        }
        GC gc = new GC(this);
        try {
            Rectangle area = area(gc);
            boolean inside = new Rectangle(area.x - GAP, area.y, area.width + 2 * GAP, area.height).contains(x, y);
            return inside ? scale.nearest((x - area.x) / (double) area.width) : -1;
        } finally {
            gc.dispose();
        }
    }

    private void explain(Event event) {
        int mode = modeAt(event.x, event.y);
        String tip = mode < 0 ? null : tip(mode);
        if (!Objects.equals(tip, getToolTipText())) {
            setToolTipText(tip);
        }
    }

    private String tip(int mode) {
        List<String> parts = new ArrayList<>();
        for (Direction direction : List.of(Direction.X, Direction.Y, Direction.Z)) {
            if (modal().hasMass(direction)) {
                parts.add(direction.name() + " +" + Numbers.percent(modal().modes().get(mode).effectiveMassShare(direction)) + " = "
                        + Numbers.percent(modal().running(direction)[mode]));
            }
        }
        return NLS.bind(Messages.Capture_tip, new Object[] {modal().modes().get(mode).number(),
            Numbers.period(modal().modes().get(mode).period()), String.join(", ", parts)});
    }

    private void pick(Event event) {
        setFocus();
        int mode = modeAt(event.x, event.y);
        if (mode >= 0 && event.button == 1) {
            pick(mode);
        }
    }

    private void pick(int mode) {
        select(mode);
        whenPicked.accept(mode);
    }

    private void key(Event event) {
        if (isEmpty()) {
            return;
        }
        int last = modal().modes().size() - 1;
        switch (event.keyCode) {
            case SWT.ARROW_RIGHT -> pick(Math.min(last, selected + 1));
            case SWT.ARROW_LEFT -> pick(Math.max(0, selected - 1));
            case SWT.HOME -> pick(0);
            case SWT.END -> pick(last);
            default -> {
                return;
            }
        }
    }
}
