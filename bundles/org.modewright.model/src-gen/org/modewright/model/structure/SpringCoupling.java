/**
 */
package org.modewright.model.structure;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Spring Coupling</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Stiffness that couples two components of a spring.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.SpringCoupling#getFirst <em>First</em>}</li>
 *   <li>{@link org.modewright.model.structure.SpringCoupling#getSecond <em>Second</em>}</li>
 *   <li>{@link org.modewright.model.structure.SpringCoupling#getStiffness <em>Stiffness</em>}</li>
 * </ul>
 *
 * @see org.modewright.model.structure.StructurePackage#getSpringCoupling()
 * @generated
 */
public interface SpringCoupling extends EObject {
	/**
	 * Returns the value of the '<em><b>First</b></em>' attribute.
	 * The default value is <code>"ux"</code>.
	 * The literals are from the enumeration {@link org.modewright.model.structure.Component}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * First component.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>First</em>' attribute.
	 * @see org.modewright.model.structure.Component
	 * @see #setFirst(Component)
	 * @see org.modewright.model.structure.StructurePackage#getSpringCoupling_First()
	 * @generated
	 */
	Component getFirst();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.SpringCoupling#getFirst <em>First</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>First</em>' attribute.
	 * @see org.modewright.model.structure.Component
	 * @see #getFirst()
	 * @generated
	 */
	void setFirst(Component value);

	/**
	 * Returns the value of the '<em><b>Second</b></em>' attribute.
	 * The default value is <code>"ux"</code>.
	 * The literals are from the enumeration {@link org.modewright.model.structure.Component}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Second component.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Second</em>' attribute.
	 * @see org.modewright.model.structure.Component
	 * @see #setSecond(Component)
	 * @see org.modewright.model.structure.StructurePackage#getSpringCoupling_Second()
	 * @generated
	 */
	Component getSecond();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.SpringCoupling#getSecond <em>Second</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Second</em>' attribute.
	 * @see org.modewright.model.structure.Component
	 * @see #getSecond()
	 * @generated
	 */
	void setSecond(Component value);

	/**
	 * Returns the value of the '<em><b>Stiffness</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Entry (first, second) and (second, first) of the symmetric 6x6 stiffness.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Stiffness</em>' attribute.
	 * @see #setStiffness(double)
	 * @see org.modewright.model.structure.StructurePackage#getSpringCoupling_Stiffness()
	 * @generated
	 */
	double getStiffness();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.SpringCoupling#getStiffness <em>Stiffness</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Stiffness</em>' attribute.
	 * @see #getStiffness()
	 * @generated
	 */
	void setStiffness(double value);

} // SpringCoupling
