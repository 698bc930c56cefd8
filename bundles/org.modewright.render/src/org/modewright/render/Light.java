package org.modewright.render;

/**
 * One light that stands at the viewer's upper left; both faces of a surface are lit alike (Lambert's cosine law on top of an even
 * light).
 */
final class Light {

    private static final double EVEN = 0.70;
    private static final double RIGHT = -0.35;
    private static final double UP = 0.65;
    private static final double TOWARDS = 0.675;

    private Light() {
    }

    /** The colour of a surface with the given normal, of any length and either sense. */
    static int shade(Projection p, int argb, double nx, double ny, double nz) {
        double length = Math.sqrt(nx * nx + ny * ny + nz * nz);
        if (length == 0) {
            return argb;
        }
        double across = p.alongRight(nx, ny, nz);
        double upwards = p.alongUp(nx, ny, nz);
        double towards = -p.alongForward(nx, ny, nz);
        double sense = towards < 0 ? -1 : 1;
        double cosine = Math.max(0, sense * (RIGHT * across + UP * upwards + TOWARDS * towards) / length);
        return Argb.shade(argb, EVEN + (1 - EVEN) * cosine);
    }
}
