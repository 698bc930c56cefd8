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
import org.eclipse.swt.graphics.RGB;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Canvas;
import org.eclipse.swt.widgets.Composite;
import org.modewright.model.structure.Identified;
import org.modewright.render.Camera;
import org.modewright.render.Deformation;
import org.modewright.render.Mark;
import org.modewright.render.Pick;
import org.modewright.render.PrimitiveKind;
import org.modewright.render.Projection;
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
 * with Ctrl picks what lies in the rectangle; a double click opens. On the keyboard: arrows orbit, with Shift they move, + and &minus;
 * zoom, Home fits, 0 to 3 give the standard views, Escape picks nothing.
 */
public final class StructureCanvas extends Canvas {

    /** What the canvas tells of. */
    public interface Handler {
        /** Objects were picked; none: the pick is cleared. */
        void picked(Set<String> ids, boolean add);

        /** An object was double-clicked. */
        void opened(String id);
    }

    private static final double PICK_TOLERANCE = 6;
    private static final int TURN_MILLISECONDS = 250;
    private static final int TURN_FRAME = 16;

    private final SceneRenderer renderer = new SceneRenderer();
    private final RenderOptions options = new RenderOptions().strips(2);
    private final Raster raster = new Raster(1, 1);
    private final RasterImage image;
    private StructureDrawing drawing;
    private Camera camera;
    private Deformation deformation;
    private double factor;
    private Function<Identified, String> describer = object -> null;
    private Consumer<GC> overlay = gc -> { };
    private Rectangle rubberBand;
    private String hovered;
    private StandardView currentView = StandardView.AXONOMETRIC;
    private boolean fitted;
    private Runnable turning;
    private final TouchedArea touched = new TouchedArea();
    private long frames;

    public StructureCanvas(Composite parent, Handler handler) {
        super(parent, SWT.NO_BACKGROUND | SWT.DOUBLE_BUFFERED);
        image = new RasterImage(getDisplay());
        setData(UiIds.WIDGET_ID, "canvas");
        addListener(SWT.Paint, event -> paint(event.gc, event.getBounds()));
        addListener(SWT.Resize, event -> resized());
        new CanvasMouse(this, handler).listen();
        addListener(SWT.KeyDown, new CanvasKeys(this, handler)::press);
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
            touched.forget();
        }
        deformation = newDeformation;
        factor = newFactor;
        if (newDeformation == null || !isLooking() || !fitted) {
            touched.forget();
            redraw();
            return;
        }
        Projection projection = camera.projection(raster.width(), raster.height());
        touched.include(camera, drawing.scene().bounds(), Math.abs(factor) * deformation.largest(), projection, scale());
        touched.redraw(this);
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
                if (isDisposed() || turning != this) {
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
        turning = step;
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

    private void paint(GC gc, Rectangle damaged) {
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
        image.draw(gc, raster, area, damaged);
        overlay.accept(gc);
        paintRubberBand(gc);
        if (isFocusControl()) {
            gc.setForeground(ThemeColours.link(this));
            gc.drawRectangle(0, 0, area.width - 1, area.height - 1);
        }
    }

    /** Everything is brought into sight once there is room, and never again of its own accord. */
    private void placeCamera() {
        if (!fitted || camera == null) {
            turning = null;
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

    private void paintRubberBand(GC gc) {
        if (rubberBand != null) {
            gc.setForeground(ThemeColours.selection(this));
            gc.setLineStyle(SWT.LINE_DASH);
            gc.drawRectangle(rubberBand);
            gc.setLineStyle(SWT.LINE_SOLID);
        }
    }

    /** Draws a rectangle over the structure; null: none. */
    void rubberBand(Rectangle band) {
        rubberBand = band;
        redraw();
    }

    /** Whether there is something that a camera looks at. */
    boolean isLooking() {
        return camera != null && hasScene();
    }

    /** Looks otherwise at once; a turn under way ends. */
    private void look(Camera other) {
        turning = null;
        camera = other;
        redraw();
    }

    /** Turns round the structure by radians. */
    void orbit(double azimuth, double elevation) {
        look(camera.orbit(azimuth, elevation));
    }

    /** Turns round the structure as a drag by so many points does. */
    void orbitBy(int dx, int dy) {
        look(camera.orbitPixels(dx * scale(), dy * scale()));
    }

    /** Moves the picture by points. */
    void moveBy(int dx, int dy) {
        look(camera.pan(dx * scale(), dy * scale(), raster.width(), raster.height()));
    }

    /** Comes nearer by a factor above 1, with a place of the canvas staying where it is. */
    void zoom(double factor, int x, int y) {
        look(camera.zoomAt(factor, x * scale(), y * scale(), raster.width(), raster.height()));
    }

    /** Comes nearer by a factor above 1, with the middle staying where it is. */
    void zoom(double factor) {
        Rectangle area = getClientArea();
        zoom(factor, area.width / 2, area.height / 2);
    }

    /** Id of the object at a point of the canvas; null if there is none. */
    public String idAt(int x, int y) {
        return drawing == null ? null : drawing.id(pickAt(x, y));
    }

    private Pick pickAt(int x, int y) {
        double scale = scale();
        return hasScene() && frames > 0 ? renderer.pick(x * scale, y * scale, PICK_TOLERANCE * scale) : null;
    }

    /** Ids of the objects in a rectangle of the canvas. */
    Set<String> idsIn(Rectangle band, boolean crossing) {
        double scale = scale();
        double x0 = band.x * scale;
        double y0 = band.y * scale;
        double x1 = (band.x + band.width) * scale;
        double y1 = (band.y + band.height) * scale;
        return drawing.ids(renderer.pickRectangle(PrimitiveKind.MEMBER, x0, y0, x1, y1, crossing),
                renderer.pickRectangle(PrimitiveKind.MARKER, x0, y0, x1, y1, crossing));
    }

    /** Outlines what the pointer is over and describes it. */
    void hover(int x, int y) {
        hover(pickAt(x, y));
    }

    void hoverNothing() {
        hover(null);
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
}
