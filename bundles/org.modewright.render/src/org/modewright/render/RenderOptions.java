package org.modewright.render;

/** How a scene is drawn. Setters answer the object itself. */
public final class RenderOptions {

    private Theme theme = Theme.light();
    private Thickness thickness = Thickness.AUTOMATIC;
    private boolean ghost = true;
    private boolean labels = true;
    private boolean markers = true;
    private boolean tripod = true;
    private double lineWidth = 1.4;
    private double scale = 1;
    private double depthCue = 0.45;
    private int strips = 1;

    public Theme theme() {
        return theme;
    }

    public RenderOptions theme(Theme value) {
        theme = value;
        return this;
    }

    public Thickness thickness() {
        return thickness;
    }

    public RenderOptions thickness(Thickness value) {
        thickness = value;
        return this;
    }

    public boolean ghost() {
        return ghost;
    }

    /** Whether the structure at rest is drawn light behind the deformed one. */
    public RenderOptions ghost(boolean value) {
        ghost = value;
        return this;
    }

    public boolean labels() {
        return labels;
    }

    public RenderOptions labels(boolean value) {
        labels = value;
        return this;
    }

    public boolean markers() {
        return markers;
    }

    public RenderOptions markers(boolean value) {
        markers = value;
        return this;
    }

    public boolean tripod() {
        return tripod;
    }

    /** Whether the axes' directions are drawn in the lower left corner. */
    public RenderOptions tripod(boolean value) {
        tripod = value;
        return this;
    }

    public double lineWidth() {
        return lineWidth;
    }

    /** Width of member lines in pixels at scale 1. */
    public RenderOptions lineWidth(double pixels) {
        lineWidth = pixels;
        return this;
    }

    public double scale() {
        return scale;
    }

    /** Multiplies every size that is given in pixels: 1 for a usual display, 2 for one of double density or a supersampled still. */
    public RenderOptions scale(double value) {
        scale = value;
        return this;
    }

    public double depthCue() {
        return depthCue;
    }

    /** How far the most distant lines fade into the background, 0 to 1; lines coloured by a value never fade. */
    public RenderOptions depthCue(double value) {
        depthCue = value;
        return this;
    }

    public int strips() {
        return strips;
    }

    /** Horizontal strips drawn at the same time; the picture is the same for every number. */
    public RenderOptions strips(int value) {
        strips = Math.max(1, value);
        return this;
    }

    public RenderOptions copy() {
        return new RenderOptions().theme(theme).thickness(thickness).ghost(ghost).labels(labels).markers(markers).tripod(tripod)
            .lineWidth(lineWidth).scale(scale).depthCue(depthCue).strips(strips);
    }
}
