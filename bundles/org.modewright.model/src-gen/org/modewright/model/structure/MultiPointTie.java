/**
 */
package org.modewright.model.structure;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Multi Point Tie</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Homogeneous linear constraint: the terms add up to zero.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.MultiPointTie#getTerms <em>Terms</em>}</li>
 * </ul>
 *
 * @see org.modewright.model.structure.StructurePackage#getMultiPointTie()
 * @generated
 */
public interface MultiPointTie extends Identified {
	/**
	 * Returns the value of the '<em><b>Terms</b></em>' containment reference list.
	 * The list contents are of type {@link org.modewright.model.structure.TieTerm}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Terms.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Terms</em>' containment reference list.
	 * @see org.modewright.model.structure.StructurePackage#getMultiPointTie_Terms()
	 * @generated
	 */
	EList<TieTerm> getTerms();

} // MultiPointTie
