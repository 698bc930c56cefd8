package org.modewright.fem;

/**
 * Makes the matrices of one kind of element. A formulation has no state, so that it may serve several threads. Its stiffness costs
 * nothing in a rigid-body motion of all its nodes, and its mass in a translation of all its nodes is the element's own mass.
 */
public interface ElementFormulation {

    /** Whether this formulation is meant for an element. */
    boolean accepts(StructuralElement element);

    /**
     * The matrices of an element.
     *
     * @param element an element that this formulation accepts
     * @param snapshot the structure it belongs to
     */
    ElementMatrices matrices(StructuralElement element, Snapshot snapshot);
}
