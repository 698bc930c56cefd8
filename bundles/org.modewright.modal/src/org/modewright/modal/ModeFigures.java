package org.modewright.modal;

import org.modewright.fem.Assembly;
import org.modewright.fem.MassLedger;
import org.modewright.numerics.EigenPairs;

/**
 * Turns eigenpairs into modes: sign, participation, effective mass, spread, split, energy shares and character. Definitions:
 * participation &Gamma; = &phi;<sup>T</sup>M&iota;, effective mass share &Gamma;&sup2;/&iota;<sup>T</sup>M&iota;, spread 1/&Sigma;p&sup2;
 * with p the nodes' shares of the kinetic energy.
 */
final class ModeFigures {

    private final Assembly assembly;
    private final double[][] massTimesRigid = new double[6][];
    private final double[] movable = new double[6];
    private final Characterisation characterisation;

    /** A mode with what the result keeps beside it. */
    record Figured(Mode mode, double[] shape, double[] strainShares, double[] kineticShares) {
    }

    ModeFigures(Assembly assembly, CharacterRules rules) {
        this.assembly = assembly;
        MassLedger ledger = assembly.ledger();
        for (int component = 0; component < 6; component++) {
            massTimesRigid[component] = assembly.massTimesRigid(component, ledger.centre());
            movable[component] = component < 3 ? ledger.movable()[component] : ledger.rotary()[component - 3];
        }
        StoreyMotion storeys = new StoreyMotion(assembly.snapshot().nodes(), new NodalMasses(assembly));
        characterisation = new Characterisation(rules, assembly.snapshot().nodes().size(), storeys);
    }

    /** Sum of the effective mass shares of some pairs in a direction; 1 where nothing can move. */
    double capture(EigenPairs pairs, Direction direction) {
        int component = direction.ordinal();
        if (!(movable[component] > 0)) {
            return 1;
        }
        double sum = 0;
        for (double[] vector : pairs.vectors()) {
            double participation = dot(massTimesRigid[component], vector);
            sum += participation * participation;
        }
        return sum / movable[component];
    }

    Figured figure(int index, EigenPairs pairs) {
        double[] free = pairs.vectors()[index];
        double[] shape = assembly.expand(free);
        double sign = sign(shape);
        if (sign < 0) {
            free = scaled(free, -1);
            shape = scaled(shape, -1);
        }
        double eigenvalue = pairs.values()[index];
        double[] participation = participation(free);
        double[] kineticShares = normalised(assembly.kineticEnergies(shape), true);
        double[] strainShares = normalised(assembly.strainEnergies(shape), eigenvalue != 0);
        double[] products = assembly.kineticProducts(free);
        double spread = spread(products);
        double[] effective = effective(participation);
        double[] split = split(products);
        Character character = characterisation.of(new Characterisation.Figure(eigenvalue, effective, spread, split,
                componentSum(products, 5)), shape,
                new LocalPlace(assembly.carriers(), assembly.snapshot().nodes(), strainShares, kineticShares));
        double frequency = Spectrum.frequency(eigenvalue);
        Mode mode = new Mode(index + 1, eigenvalue, frequency, frequency > 0 ? 1 / frequency : Double.POSITIVE_INFINITY,
                pairs.residuals()[index], frequencyBound(eigenvalue, pairs.errorBounds()[index]), participation, effective, spread, split,
                character);
        return new Figured(mode, shape, strainShares, kineticShares);
    }

    /**
     * Relative error of the frequency from a bound &delta; on the eigenvalue: 1 &minus; &radic;(1 &minus; &delta;/&lambda;), the larger of
     * the two sides; 0 for a motion without resistance, whose frequency is 0 by definition; 1 where the bound says nothing.
     */
    static double frequencyBound(double eigenvalue, double bound) {
        if (eigenvalue == 0) {
            return 0;
        }
        double relative = bound / Math.abs(eigenvalue);
        return relative < 1 ? relative / (1 + Math.sqrt(1 - relative)) : 1;
    }

    /** The sign that makes the largest translation of any node positive; the first of equal ones counts, whatever their round-off. */
    private static double sign(double[] shape) {
        double largest = largest(shape, 0, 3);
        return largest > 0 ? signOf(shape, 0, 3, largest) : signOf(shape, 3, 6, largest(shape, 3, 6));
    }

    private static double largest(double[] shape, int from, int to) {
        double largest = 0;
        for (int i = 0; i < shape.length; i++) {
            if (i % 6 >= from && i % 6 < to) {
                largest = Math.max(largest, Math.abs(shape[i]));
            }
        }
        return largest;
    }

    private static double signOf(double[] shape, int from, int to, double largest) {
        double roundOff = 1e-9;
        for (int i = 0; i < shape.length; i++) {
            if (i % 6 >= from && i % 6 < to && Math.abs(shape[i]) >= largest * (1 - roundOff)) {
                return Math.signum(shape[i]);
            }
        }
        return 1;
    }

    private double[] participation(double[] free) {
        double[] participation = new double[6];
        for (int component = 0; component < 6; component++) {
            participation[component] = movable[component] > 0 ? dot(massTimesRigid[component], free) : 0;
        }
        return participation;
    }

    private double[] effective(double[] participation) {
        double[] effective = new double[6];
        for (int component = 0; component < 6; component++) {
            effective[component] = movable[component] > 0 ? participation[component] * participation[component] / movable[component] : 0;
        }
        return effective;
    }

    private static double spread(double[] products) {
        double total = 0;
        double squares = 0;
        for (int node = 0; node < products.length / 6; node++) {
            double product = 0;
            for (int component = 0; component < 6; component++) {
                product += products[6 * node + component];
            }
            total += product;
            squares += product * product;
        }
        return squares > 0 ? total * total / squares : 0;
    }

    private static double[] split(double[] products) {
        double[] split = new double[4];
        for (int component = 0; component < 6; component++) {
            split[Math.min(component, 3)] += componentSum(products, component);
        }
        return normalised(split, true);
    }

    private static double componentSum(double[] products, int component) {
        double sum = 0;
        for (int i = component; i < products.length; i += 6) {
            sum += products[i];
        }
        return sum;
    }

    private static double[] normalised(double[] energies, boolean present) {
        double sum = 0;
        for (double energy : energies) {
            sum += energy;
        }
        return present && sum != 0 ? scaled(energies, 1 / sum) : new double[energies.length];
    }

    private static double[] scaled(double[] vector, double factor) {
        double[] scaled = new double[vector.length];
        for (int i = 0; i < vector.length; i++) {
            scaled[i] = factor * vector[i];
        }
        return scaled;
    }

    private static double dot(double[] a, double[] b) {
        double sum = 0;
        for (int i = 0; i < a.length; i++) {
            sum += a[i] * b[i];
        }
        return sum;
    }
}
