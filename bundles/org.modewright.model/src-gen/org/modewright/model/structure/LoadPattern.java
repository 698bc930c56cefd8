/**
 */
package org.modewright.model.structure;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Load Pattern</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Gravity loads that act together; downwards positive.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.LoadPattern#getMassFactor <em>Mass Factor</em>}</li>
 *   <li>{@link org.modewright.model.structure.LoadPattern#getLoads <em>Loads</em>}</li>
 * </ul>
 *
 * @see org.modewright.model.structure.StructurePackage#getLoadPattern()
 * @generated
 */
public interface LoadPattern extends Identified {
	/**
	 * Returns the value of the '<em><b>Mass Factor</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Factor by which the loads become seismic mass.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Mass Factor</em>' attribute.
	 * @see #setMassFactor(double)
	 * @see org.modewright.model.structure.StructurePackage#getLoadPattern_MassFactor()
	 * @generated
	 */
	double getMassFactor();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.LoadPattern#getMassFactor <em>Mass Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Mass Factor</em>' attribute.
	 * @see #getMassFactor()
	 * @generated
	 */
	void setMassFactor(double value);

	/**
	 * Returns the value of the '<em><b>Loads</b></em>' containment reference list.
	 * The list contents are of type {@link org.modewright.model.structure.GravityLoad}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Loads.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Loads</em>' containment reference list.
	 * @see org.modewright.model.structure.StructurePackage#getLoadPattern_Loads()
	 * @generated
	 */
	EList<GravityLoad> getLoads();

} // LoadPattern
