package org.modewright.fem.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

import org.modewright.fem.Carrier;
import org.modewright.fem.ElementFormulations;
import org.modewright.fem.ElementMatrices;
import org.modewright.fem.Kind;
import org.modewright.fem.NodePoint;
import org.modewright.fem.Snapshot;
import org.modewright.fem.StructuralElement;
import org.modewright.numerics.Progress;

/** All energy carriers of a structure with their matrices: its elements, then its nodes that carry mass of their own. */
public final class CarrierStore {

    private static final double[] NONE = new double[0];

    private final List<Carrier> carriers = new ArrayList<>();
    private final List<int[]> places = new ArrayList<>();
    private final List<double[]> stiffness = new ArrayList<>();
    private final List<double[]> mass = new ArrayList<>();
    private final int elements;
    private final int components;

    /**
     * Makes all matrices.
     *
     * @throws org.modewright.numerics.CancelledException if progress is cancelled
     */
    public CarrierStore(Snapshot snapshot, ElementFormulations formulations, NodalMasses nodalMasses, Progress progress) {
        components = 6 * snapshot.nodes().size();
        LevelFinder levels = new LevelFinder(snapshot);
        List<StructuralElement> all = snapshot.elements();
        elements = all.size();
        for (StructuralElement element : all) {
            reportNow(progress);
            addElement(element, formulations.matrices(element, snapshot), levels);
        }
        for (int node = 0; node < snapshot.nodes().size(); node++) {
            if (nodalMasses.at(node) != null) {
                addNode(snapshot.nodes().get(node), node, nodalMasses.at(node), levels);
            }
        }
    }

    private void reportNow(Progress progress) {
        if (carriers.size() % 1024 == 0) {
            progress.checkCancelled();
            progress.report("Element matrices", elements == 0 ? 1.0 : (double) carriers.size() / elements);
        }
    }

    private void addElement(StructuralElement element, ElementMatrices matrices, LevelFinder levels) {
        int[] nodes = element.nodes();
        carriers.add(new Carrier(element.kind(), element.id(), element.name(), nodes, element.group(), element.section(),
                element.material(), levels.of(nodes)));
        places.add(places(nodes));
        stiffness.add(matrices.stiffness());
        mass.add(matrices.mass());
    }

    private void addNode(NodePoint point, int node, double[] nodeMass, LevelFinder levels) {
        int[] nodes = {node};
        carriers.add(new Carrier(Kind.NODE, point.id(), point.name(), nodes, null, null, null, levels.of(nodes)));
        places.add(places(nodes));
        stiffness.add(NONE);
        mass.add(nodeMass);
    }

    private static int[] places(int[] nodes) {
        int[] places = new int[6 * nodes.length];
        Arrays.setAll(places, i -> 6 * nodes[i / 6] + i % 6);
        return places;
    }

    /** The carriers in their fixed order. */
    public List<Carrier> carriers() {
        return carriers;
    }

    /** Number of carriers that are elements; they come first. */
    public int elements() {
        return elements;
    }

    /** For each node the carriers that are at it. */
    int[][] carriersAtNodes() {
        int[] count = new int[components / 6];
        carriers.forEach(carrier -> Arrays.stream(carrier.nodes()).forEach(node -> count[node]++));
        int[][] atNode = new int[count.length][];
        for (int node = 0; node < count.length; node++) {
            atNode[node] = new int[count[node]];
        }
        for (int carrier = carriers.size() - 1; carrier >= 0; carrier--) {
            for (int node : carriers.get(carrier).nodes()) {
                atNode[node][--count[node]] = carrier;
            }
        }
        return atNode;
    }

    int[] places(int carrier) {
        return places.get(carrier);
    }

    double[] stiffness(int carrier) {
        return stiffness.get(carrier);
    }

    double[] mass(int carrier) {
        return mass.get(carrier);
    }

    /** u<sup>T</sup> k u of every carrier. */
    public double[] strainEnergies(double[] u) {
        return energies(stiffness, u);
    }

    /** u<sup>T</sup> m u of every carrier. */
    public double[] kineticEnergies(double[] u) {
        return energies(mass, u);
    }

    private double[] energies(List<double[]> matrices, double[] u) {
        double[] energies = new double[carriers.size()];
        for (int i = 0; i < energies.length; i++) {
            if (matrices.get(i).length > 0) {
                energies[i] = PackedMatrix.bilinear(matrices.get(i), places.get(i), u, u);
            }
        }
        return energies;
    }

    /** M u over the components of all nodes, before constraints. */
    public double[] massTimes(double[] u) {
        double[] product = new double[components];
        for (int i = 0; i < carriers.size(); i++) {
            if (mass.get(i).length > 0) {
                PackedMatrix.addMultiply(mass.get(i), places.get(i), u, product);
            }
        }
        return product;
    }
}
