package org.modewright.numerics;

/** K and M share null vectors: motions with neither stiffness nor mass, for which every number is an eigenvalue. */
public final class SingularPencilException extends RuntimeException {

    private static final long serialVersionUID = 1L;

    private final transient double[][] nullVectors;
    private final int[] degreesOfFreedom;

    /**
     * Names the motions.
     *
     * @param nullVectors one vector per motion, of length n; of the first ones if there are many
     * @param degreesOfFreedom for each motion the degree of freedom where its component is 1
     */
    public SingularPencilException(double[][] nullVectors, int[] degreesOfFreedom) {
        super("Stiffness and mass share " + degreesOfFreedom.length + " null vector(s), the first at degree of freedom "
                + degreesOfFreedom[0] + ": that motion has neither stiffness nor mass. Hold it, or drop it from the problem.");
        this.nullVectors = nullVectors;
        this.degreesOfFreedom = degreesOfFreedom;
    }

    /** One vector per motion, of length n; of the first hundred motions if there are more. */
    public double[][] nullVectors() {
        return nullVectors;
    }

    /** For each motion the degree of freedom where its component is 1; dropping these takes the motions out of the problem. */
    public int[] degreesOfFreedom() {
        return degreesOfFreedom;
    }
}
