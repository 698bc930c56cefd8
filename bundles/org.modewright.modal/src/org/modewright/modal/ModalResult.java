package org.modewright.modal;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.modewright.fem.Carrier;
import org.modewright.fem.MassLedger;
import org.modewright.fem.NodePoint;

/**
 * Modes of a structure with all that is derived from them. Immutable: every array that a method returns is a copy, but for
 * {@link #sharedShape(int)}.
 */
public final class ModalResult {

    private final String modelName;
    private final int memberCount;
    private final int panelCount;
    private final int freeDofs;
    private final List<NodePoint> nodes;
    private final List<Carrier> carriers;
    private final MassLedger mass;
    private final double planCoupling;
    private final Certificate certificate;
    private final boolean exhausted;
    private final List<Mode> modes;
    private final double[][] shapes;
    private final ShareTable strain;
    private final ShareTable kinetic;
    private final List<Instability> instabilities;
    private final List<String> remarks;
    private final Map<String, Double> seconds;

    private ModalResult(Builder builder) {
        modelName = builder.modelName;
        memberCount = builder.memberCount;
        panelCount = builder.panelCount;
        freeDofs = builder.freeDofs;
        nodes = List.copyOf(builder.nodes);
        carriers = List.copyOf(builder.carriers);
        mass = Objects.requireNonNull(builder.mass, "mass");
        planCoupling = builder.planCoupling;
        certificate = Objects.requireNonNull(builder.certificate, "certificate");
        exhausted = builder.exhausted;
        modes = List.copyOf(builder.modes);
        shapes = builder.shapes.toArray(new double[0][]);
        strain = new ShareTable(builder.strain);
        kinetic = new ShareTable(builder.kinetic);
        instabilities = List.copyOf(builder.instabilities);
        remarks = List.copyOf(builder.remarks);
        seconds = Collections.unmodifiableMap(new LinkedHashMap<>(builder.seconds));
    }

    private ModalResult(ModalResult other, String stage, double spent) {
        modelName = other.modelName;
        memberCount = other.memberCount;
        panelCount = other.panelCount;
        freeDofs = other.freeDofs;
        nodes = other.nodes;
        carriers = other.carriers;
        mass = other.mass;
        planCoupling = other.planCoupling;
        certificate = other.certificate;
        exhausted = other.exhausted;
        modes = other.modes;
        shapes = other.shapes;
        strain = other.strain;
        kinetic = other.kinetic;
        instabilities = other.instabilities;
        remarks = other.remarks;
        Map<String, Double> more = new LinkedHashMap<>(other.seconds);
        more.put(stage, spent);
        seconds = Collections.unmodifiableMap(more);
    }

    /** A builder of a result, for the run and for whoever reads a stored one. */
    public static Builder builder() {
        return new Builder();
    }

    /** Name of the model. */
    public String modelName() {
        return modelName;
    }

    /** Number of nodes of the model. */
    public int nodeCount() {
        return nodes.size();
    }

    /** Number of frame members and bars. */
    public int memberCount() {
        return memberCount;
    }

    /** Number of panels. */
    public int panelCount() {
        return panelCount;
    }

    /** Degrees of freedom after constraints, without the motions that have neither stiffness nor mass. */
    public int freeDofs() {
        return freeDofs;
    }

    /** The nodes, in the order of the shapes. */
    public List<NodePoint> nodes() {
        return nodes;
    }

    /** All carriers of energy, in the order of the shares. */
    public List<Carrier> carriers() {
        return carriers;
    }

    /** Where the mass is, kg. */
    public MassLedger mass() {
        return mass;
    }

    /** &iota;<sub>x</sub><sup>T</sup>M&iota;<sub>y</sub>, kg; not 0 only where skew constraints couple the plan directions. */
    public double planCoupling() {
        return planCoupling;
    }

    /** The proof that no mode is missing, or what keeps it from being one. */
    public Certificate certificate() {
        return certificate;
    }

    /** Whether the structure has no further mode. */
    public boolean isExhausted() {
        return exhausted;
    }

    /** The modes by ascending eigenvalue. */
    public List<Mode> modes() {
        return modes;
    }

    /**
     * Shape of a mode, six components (u<sub>x</sub> u<sub>y</sub> u<sub>z</sub> &theta;<sub>x</sub> &theta;<sub>y</sub>
     * &theta;<sub>z</sub>) for each node in the order of {@link #nodes()}, with &phi;<sup>T</sup>M&phi; = 1.
     *
     * @param mode index of the mode, from 0
     */
    public double[] shape(int mode) {
        return shapes[mode].clone();
    }

    /** As {@link #shape(int)} without a copy, for drawing; the caller does not write to it. */
    public double[] sharedShape(int mode) {
        return shapes[mode];
    }

    /** Strain energy share of every carrier in a mode, summing to 1; all 0 where the mode has no strain energy. */
    public double[] strainShares(int mode) {
        return strain.row(mode);
    }

    /** Kinetic energy share of every carrier in a mode, summing to 1. */
    public double[] kineticShares(int mode) {
        return kinetic.row(mode);
    }

    /** Strain energy share of one carrier in a mode. */
    public double strainShare(int mode, int carrier) {
        return strain.share(mode, carrier);
    }

    /** Kinetic energy share of one carrier in a mode. */
    public double kineticShare(int mode, int carrier) {
        return kinetic.share(mode, carrier);
    }

    /** Sum of the effective mass shares of all modes found, in a direction. */
    public double capture(Direction direction) {
        double[] running = running(direction);
        return running.length == 0 ? 0 : running[running.length - 1];
    }

    /** Sums of the effective mass shares in a direction up to and including each mode. */
    public double[] running(Direction direction) {
        double[] running = new double[modes.size()];
        double sum = 0;
        for (int i = 0; i < running.length; i++) {
            sum += modes.get(i).effectiveMassShare(direction);
            running[i] = sum;
        }
        return running;
    }

    /**
     * Sum of the effective mass shares in the plan direction at an angle from X towards Y:
     * &Sigma;(&Gamma;<sub>x</sub>cos + &Gamma;<sub>y</sub>sin)&sup2; over the movable mass of that direction.
     *
     * @param angle radians
     */
    public double capture(double angle) {
        double sum = 0;
        for (Mode mode : modes) {
            sum += effectiveMassShare(mode, angle);
        }
        return sum;
    }

    /** Effective mass share of a mode in the plan direction at an angle from X towards Y, radians. */
    public double effectiveMassShare(Mode mode, double angle) {
        double cos = Math.cos(angle);
        double sin = Math.sin(angle);
        double movable = cos * cos * mass.movable()[0] + sin * sin * mass.movable()[1] + 2 * cos * sin * planCoupling;
        double participation = cos * mode.participation(Direction.X) + sin * mode.participation(Direction.Y);
        return movable > 0 ? participation * participation / movable : 0;
    }

    /** Whether a direction has mass that can move; one without is not judged. */
    public boolean hasMass(Direction direction) {
        int component = direction.ordinal();
        return direction.isTranslation() ? mass.movable()[component] > 0 : mass.rotary()[component - 3] > 0;
    }

    /** Free parts, mechanisms and indefinite stiffness; empty for a sound structure. */
    public List<Instability> instabilities() {
        return instabilities;
    }

    /** What the run did of its own accord, in sentences. */
    public List<String> remarks() {
        return remarks;
    }

    /** Seconds spent by stage: read, assemble, factor, eigen, audit. */
    public Map<String, Double> seconds() {
        return seconds;
    }

    /** The same result with the seconds of one more stage. */
    public ModalResult withSeconds(String stage, double spent) {
        return new ModalResult(this, stage, spent);
    }

    /** Collects a result. */
    public static final class Builder {

        private String modelName = "";
        private int memberCount;
        private int panelCount;
        private int freeDofs;
        private List<NodePoint> nodes = List.of();
        private List<Carrier> carriers = List.of();
        private MassLedger mass;
        private double planCoupling;
        private Certificate certificate = Certificate.EMPTY;
        private boolean exhausted;
        private List<Instability> instabilities = List.of();
        private final List<Mode> modes = new ArrayList<>();
        private final List<double[]> shapes = new ArrayList<>();
        private final List<double[]> strain = new ArrayList<>();
        private final List<double[]> kinetic = new ArrayList<>();
        private final List<String> remarks = new ArrayList<>();
        private final Map<String, Double> seconds = new LinkedHashMap<>();

        private Builder() {
        }

        public Builder model(String name, int members, int panels, int freeMotions) {
            modelName = name == null ? "" : name;
            memberCount = members;
            panelCount = panels;
            freeDofs = freeMotions;
            return this;
        }

        public Builder nodes(List<NodePoint> value) {
            nodes = value;
            return this;
        }

        public Builder carriers(List<Carrier> value) {
            carriers = value;
            return this;
        }

        /**
         * @param ledger the masses
         * @param coupling &iota;<sub>x</sub><sup>T</sup>M&iota;<sub>y</sub>, kg
         */
        public Builder mass(MassLedger ledger, double coupling) {
            mass = ledger;
            planCoupling = coupling;
            return this;
        }

        public Builder certificate(Certificate value, boolean noFurtherMode) {
            certificate = value;
            exhausted = noFurtherMode;
            return this;
        }

        /**
         * Adds the next mode. The arrays become the result's own.
         *
         * @param shape six components a node
         * @param strainShares one a carrier
         * @param kineticShares one a carrier
         */
        public Builder mode(Mode mode, double[] shape, double[] strainShares, double[] kineticShares) {
            modes.add(mode);
            shapes.add(shape);
            strain.add(strainShares);
            kinetic.add(kineticShares);
            return this;
        }

        public Builder instabilities(List<Instability> value) {
            instabilities = value;
            return this;
        }

        public Builder remark(String sentence) {
            remarks.add(sentence);
            return this;
        }

        public Builder seconds(String stage, double spent) {
            seconds.put(stage, spent);
            return this;
        }

        public ModalResult build() {
            return new ModalResult(this);
        }
    }
}
