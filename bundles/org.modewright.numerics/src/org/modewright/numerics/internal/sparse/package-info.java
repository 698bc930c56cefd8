/** Ordering, symbolic analysis and multifrontal LDL<sup>T</sup> factorisation of sparse symmetric matrices. */
package org.modewright.numerics.internal.sparse;
