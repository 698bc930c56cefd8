package org.modewright.render;

/** An axis-parallel box in model coordinates. */
public record Bounds(double minX, double minY, double minZ, double maxX, double maxY, double maxZ) {

    public Bounds {
        if (!(minX <= maxX && minY <= maxY && minZ <= maxZ)) {
            throw new IllegalArgumentException("Bounds need finite minima below their maxima.");
        }
    }

    /**
     * The box around points.
     *
     * @param xyz x, y, z of each point; without a point the box is the unit cube about the origin
     */
    public static Bounds of(double[] xyz) {
        if (xyz.length == 0) {
            return new Bounds(-0.5, -0.5, -0.5, 0.5, 0.5, 0.5);
        }
        double[] low = {xyz[0], xyz[1], xyz[2]};
        double[] high = low.clone();
        for (int i = 3; i < xyz.length; i++) {
            low[i % 3] = Math.min(low[i % 3], xyz[i]);
            high[i % 3] = Math.max(high[i % 3], xyz[i]);
        }
        return new Bounds(low[0], low[1], low[2], high[0], high[1], high[2]);
    }

    public double diagonal() {
        return Math.sqrt(square(maxX - minX) + square(maxY - minY) + square(maxZ - minZ));
    }

    public double[] centre() {
        return new double[] {(minX + maxX) / 2, (minY + maxY) / 2, (minZ + maxZ) / 2};
    }

    private static double square(double value) {
        return value * value;
    }
}
