/**
 */
package org.modewright.model.structure;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Material</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Linear elastic material.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.Material#getYoung <em>Young</em>}</li>
 *   <li>{@link org.modewright.model.structure.Material#getPoisson <em>Poisson</em>}</li>
 *   <li>{@link org.modewright.model.structure.Material#getDensity <em>Density</em>}</li>
 *   <li>{@link org.modewright.model.structure.Material#getShear <em>Shear</em>}</li>
 * </ul>
 *
 * @see org.modewright.model.structure.StructurePackage#getMaterial()
 * @generated
 */
public interface Material extends Identified {
	/**
	 * Returns the value of the '<em><b>Young</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Modulus of elasticity; force per area.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Young</em>' attribute.
	 * @see #setYoung(double)
	 * @see org.modewright.model.structure.StructurePackage#getMaterial_Young()
	 * @generated
	 */
	double getYoung();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Material#getYoung <em>Young</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Young</em>' attribute.
	 * @see #getYoung()
	 * @generated
	 */
	void setYoung(double value);

	/**
	 * Returns the value of the '<em><b>Poisson</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Poisson's ratio.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Poisson</em>' attribute.
	 * @see #setPoisson(double)
	 * @see org.modewright.model.structure.StructurePackage#getMaterial_Poisson()
	 * @generated
	 */
	double getPoisson();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Material#getPoisson <em>Poisson</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Poisson</em>' attribute.
	 * @see #getPoisson()
	 * @generated
	 */
	void setPoisson(double value);

	/**
	 * Returns the value of the '<em><b>Density</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Mass (not weight) per volume.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Density</em>' attribute.
	 * @see #setDensity(double)
	 * @see org.modewright.model.structure.StructurePackage#getMaterial_Density()
	 * @generated
	 */
	double getDensity();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Material#getDensity <em>Density</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Density</em>' attribute.
	 * @see #getDensity()
	 * @generated
	 */
	void setDensity(double value);

	/**
	 * Returns the value of the '<em><b>Shear</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Shear modulus; force per area; 0: E/2(1+v) from modulus of elasticity and Poisson's ratio.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Shear</em>' attribute.
	 * @see #setShear(double)
	 * @see org.modewright.model.structure.StructurePackage#getMaterial_Shear()
	 * @generated
	 */
	double getShear();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Material#getShear <em>Shear</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Shear</em>' attribute.
	 * @see #getShear()
	 * @generated
	 */
	void setShear(double value);

} // Material
