package org.modewright.ui.canvas;

import java.util.Objects;
import java.util.Set;
import java.util.function.Consumer;
import java.util.function.Function;
import org.eclipse.swt.SWT;
import org.eclipse.swt.accessibility.AccessibleAdapter;
import org.eclipse.swt.accessibility.AccessibleEvent;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.RGB;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Canvas;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Event;
import org.modewright.model.structure.Identified;
import org.modewright.render.Camera;
import org.modewright.render.Deformation;
import org.modewright.render.Mark;
import org.modewright.render.Pick;
import org.modewright.render.PrimitiveKind;
import org.modewright.render.Raster;
import org.modewright.render.RenderOptions;
import org.modewright.render.SceneRenderer;
import org.modewright.render.StandardView;
import org.modewright.render.StillImage;
import org.modewright.render.Theme;
import org.modewright.ui.UiIds;
import org.modewright.ui.canvas.drawing.StructureDrawing;
import org.modewright.ui.widgets.ThemeColours;

/**
 * Shows a structure in space. A drag orbits, with Shift it moves; the wheel zooms at the pointer; a click picks, with Ctrl it adds; a drag
 * with Ctrl picks what lies in the rectangle; a double click opens. On the keyboard: arrows orbit, with Shift they move, + and &minus; zoom,
 * Home fits, 0 to 3 give the standard views, Escape picks nothing.
 */
public final class StructureCanvas extends Canvas {

    /** What the canvas tells of. */
    public interface Handler {
        /** Objects were picked; none: the pick is cleared. */
        void picked(Set<String> ids, boolean add);

        /** An object was double-clicked. */
        void opened(String id);
    }

    private static final int DRAG_THRESHOLD = 4;
    private static final double PICK_TOLERANCE = 6;
    private static final double ORBIT_STEP = Math.toRadians(5);
    private static final int MOVE_STEP = 24;
    private static final double ZOOM_STEP = 1.15;
    private static final int TURN_MILLISECONDS = 250;
    private static final int TURN_FRAME = 16;

    private enum Drag { NONE, PRESSED, ORBIT, MOVE, RECTANGLE }

    private final SceneRenderer renderer = new SceneRenderer();
    private final RenderOptions options = new RenderOptions().strips(2);
    private final Raster raster = new Raster(1, 1);
    private final RasterImage image;
    private final Handler handler;
    private StructureDrawing drawing;
    private Camera camera;
    private Deformation deformation;
    private double factor;
    private Function<Identified, String> describer = object -> null;
    private Consumer<GC> overlay = gc -> { };
    private Drag drag = Drag.NONE;
    private boolean dragAdds;
    private Point pressed;
    private Point last;
    private String hovered;
    private StandardView currentView = StandardView.AXONOMETRIC;
    private boolean fitted;
    private long frames;

    public StructureCanvas(Composite parent, Handler handler) {
        super(parent, SWT.NO_BACKGROUND | SWT.DOUBLE_BUFFERED);
        this.handler = handler;
        image = new RasterImage(getDisplay());
        setData(UiIds.WIDGET_ID, "canvas");
        addListener(SWT.Paint, event -> paint(event.gc));
        addListener(SWT.Resize, event -> resized());
        addListener(SWT.MouseDown, this::mouseDown);
        addListener(SWT.MouseMove, this::mouseMove);
        addListener(SWT.MouseUp, this::mouseUp);
        addListener(SWT.MouseDoubleClick, this::mouseDoubleClick);
        addListener(SWT.MouseExit, event -> hover(null));
        addListener(SWT.MouseVerticalWheel, this::wheel);
        addListener(SWT.KeyDown, this::keyDown);
        addListener(SWT.Traverse, event -> event.doit = event.detail == SWT.TRAVERSE_TAB_NEXT || event.detail == SWT.TRAVERSE_TAB_PREVIOUS);
        addListener(SWT.FocusIn, event -> redraw());
        addListener(SWT.FocusOut, event -> redraw());
        getAccessible().addAccessibleListener(new AccessibleAdapter() {
            @Override
            public void getName(AccessibleEvent event) {
                event.result = Messages.Canvas_accessibleName;
            }
        });
    }

    /** Options of the drawing; call {@link #redraw()} after a change. */
    public RenderOptions options() {
        return options;
    }

    /** What the tooltip says of an object. */
    void describeWith(Function<Identified, String> value) {
        describer = value;
    }

    /** Draws over the structure, such as a legend. */
    void overlayWith(Consumer<GC> value) {
        overlay = value;
    }

    /**
     * Shows a structure at rest.
     *
     * @param newDrawing the structure; null: none
     * @param keepsCamera whether the camera stays where it is, if it has seen anything before; else all is brought into sight
     */
    void show(StructureDrawing newDrawing, boolean keepsCamera) {
        drawing = newDrawing;
        deformation = null;
        factor = 0;
        hovered = null;
        if (!keepsCamera || newDrawing == null || newDrawing.isEmpty()) {
            fitted = false;
        }
        redraw();
    }

    StructureDrawing drawing() {
        return drawing;
    }

    /** Shows a shape of the present structure; null: at rest. */
    void shape(Deformation newDeformation, double newFactor) {
        if (newDeformation != deformation) {
            hover(null);
        }
        deformation = newDeformation;
        factor = newFactor;
        redraw();
    }

    void select(Set<String> ids) {
        if (drawing != null) {
            drawing.mark(Mark.SELECTED, ids);
            redraw();
        }
    }

    /** Frames drawn so far, to see that something moves. */
    public long frames() {
        return frames;
    }

    /** The colours of the frame drawn last, 0xAARRGGBB row by row. */
    public int[] pixels() {
        return raster.colour().clone();
    }

    /** Turns to a standard view with everything in sight, in a short movement. */
    public void view(StandardView view) {
        currentView = view;
        if (hasScene() && camera != null) {
            turn(camera.view(view).fit(drawing.scene().bounds(), raster.width(), raster.height()));
        }
    }

    /** Brings everything into sight. */
    public void fit() {
        if (hasScene() && camera != null) {
            turn(camera.fit(drawing.scene().bounds(), raster.width(), raster.height()));
        }
    }

    /** The present picture in another size, drawn anew with smooth edges. */
    Raster still(int width, int height, double scale) {
        RenderOptions larger = options.copy().theme(theme()).scale(scale);
        return StillImage.render(drawing.scene(), camera, deformation, factor, larger, width, height);
    }

    boolean hasScene() {
        return drawing != null && !drawing.isEmpty();
    }

    private void turn(Camera target) {
        Camera from = camera;
        long start = System.nanoTime();
        Runnable step = new Runnable() {
            @Override
            public void run() {
                if (isDisposed()) {
                    return;
                }
                double done = Math.min(1, (System.nanoTime() - start) / 1e6 / TURN_MILLISECONDS);
                camera = done >= 1 ? target : from.towards(target, done);
                redraw();
                if (done < 1) {
                    getDisplay().timerExec(TURN_FRAME, this);
                }
            }
        };
        step.run();
    }

    private double scale() {
        return getMonitor().getZoom() / 100.0;
    }

    private void resized() {
        Rectangle area = getClientArea();
        double scale = scale();
        raster.resize(Math.max(1, (int) Math.round(area.width * scale)), Math.max(1, (int) Math.round(area.height * scale)));
        options.scale(Math.max(1, Math.min(2.5, scale)));
        redraw();
    }

    private void paint(GC gc) {
        Rectangle area = getClientArea();
        if (area.isEmpty()) {
            return;
        }
        if (!hasScene()) {
            gc.setBackground(getBackground());
            gc.fillRectangle(area);
            return;
        }
        placeCamera();
        options.theme(theme());
        renderer.render(drawing.scene(), camera, deformation, factor, options, raster);
        frames++;
        image.draw(gc, raster, area);
        overlay.accept(gc);
        paintRectangle(gc);
        if (isFocusControl()) {
            gc.setForeground(ThemeColours.link(this));
            gc.drawRectangle(0, 0, area.width - 1, area.height - 1);
        }
    }

    /** Everything is brought into sight once there is room, and never again of its own accord. */
    private void placeCamera() {
        if (!fitted || camera == null) {
            camera = Camera.standard(currentView, drawing.scene().bounds(), raster.width(), raster.height()).withPerspective(Camera.MILD)
                    .fit(drawing.scene().bounds(), raster.width(), raster.height());
            fitted = true;
        }
    }

    private Theme theme() {
        Theme theme = ThemeColours.isDark(this) ? Theme.dark() : Theme.light();
        return theme.withSelection(argb(ThemeColours.selection(this)));
    }

    private static int argb(Color colour) {
        RGB rgb = colour.getRGB();
        return 0xFF000000 | rgb.red << 16 | rgb.green << 8 | rgb.blue;
    }

    private void paintRectangle(GC gc) {
        if (drag == Drag.RECTANGLE) {
            gc.setForeground(ThemeColours.selection(this));
            gc.setLineStyle(SWT.LINE_DASH);
            gc.drawRectangle(Math.min(pressed.x, last.x), Math.min(pressed.y, last.y), Math.abs(last.x - pressed.x), Math.abs(last.y - pressed.y));
            gc.setLineStyle(SWT.LINE_SOLID);
        }
    }

    private void mouseDown(Event event) {
        setFocus();
        if (event.button == 1 || event.button == 2) {
            drag = event.button == 2 ? Drag.MOVE : Drag.PRESSED;
            dragAdds = (event.stateMask & SWT.MOD1) != 0;
            pressed = new Point(event.x, event.y);
            last = pressed;
        }
    }

    private void mouseMove(Event event) {
        if (drag == Drag.NONE) {
            hover(pickAt(event.x, event.y));
            return;
        }
        if (drag == Drag.PRESSED) {
            if (Math.abs(event.x - pressed.x) + Math.abs(event.y - pressed.y) < DRAG_THRESHOLD) {
                return;
            }
            drag = (event.stateMask & SWT.SHIFT) != 0 ? Drag.MOVE : dragAdds ? Drag.RECTANGLE : Drag.ORBIT;
            hover(null);
        }
        dragTo(event);
        last = new Point(event.x, event.y);
        redraw();
    }

    private void dragTo(Event event) {
        if (camera == null) {
            return;
        }
        double dx = (event.x - last.x) * scale();
        double dy = (event.y - last.y) * scale();
        if (drag == Drag.ORBIT) {
            camera = camera.orbitPixels(dx, dy);
        } else if (drag == Drag.MOVE) {
            camera = camera.pan(dx, dy, raster.width(), raster.height());
        }
    }

    private void mouseUp(Event event) {
        Drag ended = drag;
        drag = Drag.NONE;
        if (ended == Drag.PRESSED && event.button == 1) {
            pickOne(event.x, event.y);
        } else if (ended == Drag.RECTANGLE) {
            pickRectangle(event);
        }
    }

    private void pickOne(int x, int y) {
        Pick pick = pickAt(x, y);
        String id = drawing == null ? null : drawing.id(pick);
        handler.picked(id == null ? Set.of() : Set.of(id), dragAdds);
    }

    private void pickRectangle(Event event) {
        double scale = scale();
        double x0 = Math.min(pressed.x, event.x) * scale;
        double y0 = Math.min(pressed.y, event.y) * scale;
        double x1 = Math.max(pressed.x, event.x) * scale;
        double y1 = Math.max(pressed.y, event.y) * scale;
        boolean crossing = event.x < pressed.x;
        Set<String> ids = drawing.ids(renderer.pickRectangle(PrimitiveKind.MEMBER, x0, y0, x1, y1, crossing),
                renderer.pickRectangle(PrimitiveKind.MARKER, x0, y0, x1, y1, crossing));
        handler.picked(ids, true);
        redraw();
    }

    private void mouseDoubleClick(Event event) {
        String id = drawing == null ? null : drawing.id(pickAt(event.x, event.y));
        if (id != null && event.button == 1) {
            handler.opened(id);
        }
    }

    private Pick pickAt(int x, int y) {
        double scale = scale();
        return hasScene() && frames > 0 ? renderer.pick(x * scale, y * scale, PICK_TOLERANCE * scale) : null;
    }

    private void hover(Pick pick) {
        String id = drawing == null ? null : drawing.id(pick);
        if (Objects.equals(id, hovered)) {
            return;
        }
        hovered = id;
        if (drawing == null) {
            return;
        }
        drawing.mark(Mark.HOVERED, id == null ? Set.of() : Set.of(id));
        setToolTipText(id == null ? null : describer.apply(drawing.object(pick)));
        redraw();
    }

    private void wheel(Event event) {
        if (camera != null && hasScene()) {
            zoom(Math.pow(ZOOM_STEP, event.count / 3.0), event.x * scale(), event.y * scale());
            event.doit = false;
        }
    }

    private void zoom(double by, double x, double y) {
        camera = camera.zoomAt(by, x, y, raster.width(), raster.height());
        redraw();
    }

    private void keyDown(Event event) {
        if (camera == null || !hasScene()) {
            return;
        }
        if (!navigate(event) && !act(event)) {
            return;
        }
        event.doit = false;
    }

    private boolean navigate(Event event) {
        int x = event.keyCode == SWT.ARROW_LEFT ? -1 : event.keyCode == SWT.ARROW_RIGHT ? 1 : 0;
        int y = event.keyCode == SWT.ARROW_UP ? -1 : event.keyCode == SWT.ARROW_DOWN ? 1 : 0;
        if (x == 0 && y == 0) {
            return false;
        }
        if ((event.stateMask & SWT.SHIFT) != 0) {
            camera = camera.pan(x * MOVE_STEP, y * MOVE_STEP, raster.width(), raster.height());
        } else {
            camera = camera.orbit(-x * ORBIT_STEP, y * ORBIT_STEP);
        }
        redraw();
        return true;
    }

    private boolean act(Event event) {
        double middleX = raster.width() / 2.0;
        double middleY = raster.height() / 2.0;
        switch (event.keyCode) {
            case SWT.HOME -> fit();
            case SWT.ESC -> handler.picked(Set.of(), false);
            case SWT.KEYPAD_ADD -> zoom(ZOOM_STEP, middleX, middleY);
            case SWT.KEYPAD_SUBTRACT -> zoom(1 / ZOOM_STEP, middleX, middleY);
            default -> {
                return actOn(event.character, middleX, middleY);
            }
        }
        return true;
    }

    private boolean actOn(char character, double middleX, double middleY) {
        switch (character) {
            case '+', '=' -> zoom(ZOOM_STEP, middleX, middleY);
            case '-' -> zoom(1 / ZOOM_STEP, middleX, middleY);
            case '0' -> view(StandardView.AXONOMETRIC);
            case '1' -> view(StandardView.ALONG_PLUS_Y);
            case '2' -> view(StandardView.ALONG_MINUS_X);
            case '3' -> view(StandardView.PLAN);
            default -> {
                return false;
            }
        }
        return true;
    }
}
