/**
 * Symmetric sparse matrices, their LDL<sup>T</sup> factorisation, and the symmetric eigenproblem K &phi; = &lambda; M &phi;.
 * Nothing here knows about structures.
 */
package org.modewright.numerics;
