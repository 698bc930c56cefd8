package org.modewright.modal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;
import org.modewright.fem.NodePoint;

/**
 * The part of a shape in which every horizontal plane of nodes moves as one: the plane's mean translation u&#772; and its mean twist
 * &theta;&#772; about its own centre of mass, with the kinetic energies &Sigma;m u&#772;<sub>x</sub>&sup2;, &Sigma;m
 * u&#772;<sub>y</sub>&sup2;, &Sigma;m u&#772;<sub>x</sub>u&#772;<sub>y</sub> and &Sigma;I&theta;&#772;&sup2;. It tells sway from torsion
 * in modes of any order, where effective masses, which are small in high modes, do not.
 */
final class StoreyMotion {

    private static final double SAME_PLANE = 1e-3;

    private final List<Plane> planes = new ArrayList<>();

    /** Energies for &phi;<sup>T</sup>M&phi; = 1. */
    record Energies(double x, double y, double xy, double twist) {

        double sway() {
            return x + y;
        }
    }

    StoreyMotion(List<NodePoint> nodes, NodalMasses masses) {
        int[] byHeight = IntStream.range(0, nodes.size()).boxed().sorted(Comparator.comparingDouble(i -> nodes.get(i).z()))
                .mapToInt(Integer::intValue).toArray();
        if (byHeight.length == 0) {
            return;
        }
        double height = nodes.get(byHeight[byHeight.length - 1]).z() - nodes.get(byHeight[0]).z();
        int from = 0;
        for (int to = 1; to <= byHeight.length; to++) {
            if (to == byHeight.length || nodes.get(byHeight[to]).z() - nodes.get(byHeight[from]).z() > SAME_PLANE * height) {
                planes.add(new Plane(IntStream.range(from, to).map(i -> byHeight[i]).toArray(), nodes, masses));
                from = to;
            }
        }
    }

    Energies of(double[] shape) {
        double[] sums = new double[4];
        for (Plane plane : planes) {
            plane.add(shape, sums);
        }
        return new Energies(sums[0], sums[1], sums[2], sums[3]);
    }

    /** Nodes at one height. */
    private static final class Plane {

        private final int[] nodes;
        private final double[] massX;
        private final double[] massY;
        private final double[] armX;
        private final double[] armY;
        private double sumX;
        private double sumY;
        private double polar;

        Plane(int[] nodes, List<NodePoint> points, NodalMasses masses) {
            this.nodes = nodes;
            massX = IntStream.of(nodes).mapToDouble(node -> masses.along(0, node)).toArray();
            massY = IntStream.of(nodes).mapToDouble(node -> masses.along(1, node)).toArray();
            armX = IntStream.of(nodes).mapToDouble(node -> points.get(node).x()).toArray();
            armY = IntStream.of(nodes).mapToDouble(node -> points.get(node).y()).toArray();
            sumX = IntStream.range(0, nodes.length).mapToDouble(i -> massX[i]).sum();
            sumY = IntStream.range(0, nodes.length).mapToDouble(i -> massY[i]).sum();
            centre(armX, massY, sumY);
            centre(armY, massX, sumX);
            for (int i = 0; i < nodes.length; i++) {
                polar += massX[i] * armY[i] * armY[i] + massY[i] * armX[i] * armX[i];
            }
        }

        private static void centre(double[] arm, double[] mass, double sum) {
            double moment = 0;
            for (int i = 0; i < arm.length; i++) {
                moment += mass[i] * arm[i];
            }
            for (int i = 0; i < arm.length; i++) {
                arm[i] -= sum > 0 ? moment / sum : arm[i];
            }
        }

        void add(double[] shape, double[] sums) {
            double momentumX = 0;
            double momentumY = 0;
            double spin = 0;
            for (int i = 0; i < nodes.length; i++) {
                double x = massX[i] * shape[6 * nodes[i]];
                double y = massY[i] * shape[6 * nodes[i] + 1];
                momentumX += x;
                momentumY += y;
                spin += armX[i] * y - armY[i] * x;
            }
            sums[0] += sumX > 0 ? momentumX * momentumX / sumX : 0;
            sums[1] += sumY > 0 ? momentumY * momentumY / sumY : 0;
            sums[2] += sumX > 0 && sumY > 0 ? momentumX * momentumY / Math.sqrt(sumX * sumY) : 0;
            sums[3] += polar > 0 ? spin * spin / polar : 0;
        }
    }
}
