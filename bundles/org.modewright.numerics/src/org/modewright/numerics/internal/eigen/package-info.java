/** Eigen solvers and the certificate of their results. */
package org.modewright.numerics.internal.eigen;
