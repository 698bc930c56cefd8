package org.modewright.render;

/** The vertices of a scene, deformed and projected: screen x, y and depth of each. Arrays are reused from frame to frame. */
final class ProjectedScene {

    Scene scene;
    Projection projection;
    float[] x = new float[0];
    float[] y = new float[0];
    /** Depth; NaN for a vertex behind the near plane. */
    float[] z = new float[0];

    private Deformation deformation;
    private float factor;
    private double[] rows;

    /** Sets what is projected; {@link #transform} does the work. */
    void begin(Scene newScene, Projection newProjection, Deformation newDeformation, double newFactor) {
        scene = newScene;
        projection = newProjection;
        deformation = newDeformation;
        factor = (float) newFactor;
        rows = newProjection.rows(newScene.origin);
        if (x.length < newScene.vertexCount()) {
            x = new float[newScene.vertexCount()];
            y = new float[x.length];
            z = new float[x.length];
        }
    }

    void transform(int from, int to) {
        if (deformation == null) {
            transform(from, to, scene.position, 0);
        } else {
            transform(from, to, deformation.displacement(), factor);
        }
    }

    private void transform(int from, int to, float[] shape, float scale) {
        float[] p = scene.position;
        for (int v = from, i = 3 * from; v < to; v++, i += 3) {
            place(v, p[i] + scale * shape[i], p[i + 1] + scale * shape[i + 1], p[i + 2] + scale * shape[i + 2]);
        }
    }

    private void place(int v, double px, double py, double pz) {
        double across = rows[0] * px + rows[1] * py + rows[2] * pz + rows[3];
        double upwards = rows[4] * px + rows[5] * py + rows[6] * pz + rows[7];
        double behind = rows[8] * px + rows[9] * py + rows[10] * pz + rows[11];
        if (!projection.perspective()) {
            x[v] = (float) (projection.width() * 0.5 + across);
            y[v] = (float) (projection.height() * 0.5 - upwards);
            z[v] = (float) behind;
            return;
        }
        double w = 1 + behind / projection.distance();
        if (w < projection.nearest()) {
            z[v] = Float.NaN;
            return;
        }
        x[v] = (float) (projection.width() * 0.5 + across / w);
        y[v] = (float) (projection.height() * 0.5 - upwards / w);
        z[v] = (float) (-projection.distance() / w);
    }

    /** The deformed position of a vertex in model coordinates. */
    void world(int v, double[] out) {
        for (int k = 0; k < 3; k++) {
            double shift = deformation == null ? 0 : factor * deformation.displacement()[3 * v + k];
            out[k] = scene.origin[k] + scene.position[3 * v + k] + shift;
        }
    }

    /** The twist of a vertex at the drawn amplitude, radians. */
    double twist(int v) {
        return deformation == null ? 0 : factor * deformation.twist()[v];
    }

    boolean visible(int v) {
        return !Float.isNaN(z[v]);
    }
}
