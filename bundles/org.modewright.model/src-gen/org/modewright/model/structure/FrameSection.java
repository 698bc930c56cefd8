/**
 */
package org.modewright.model.structure;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Frame Section</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Cross section of a frame member.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.FrameSection#getArea <em>Area</em>}</li>
 *   <li>{@link org.modewright.model.structure.FrameSection#getIy <em>Iy</em>}</li>
 *   <li>{@link org.modewright.model.structure.FrameSection#getIz <em>Iz</em>}</li>
 *   <li>{@link org.modewright.model.structure.FrameSection#getTorsion <em>Torsion</em>}</li>
 *   <li>{@link org.modewright.model.structure.FrameSection#getShearAreaY <em>Shear Area Y</em>}</li>
 *   <li>{@link org.modewright.model.structure.FrameSection#getShearAreaZ <em>Shear Area Z</em>}</li>
 * </ul>
 *
 * @see org.modewright.model.structure.StructurePackage#getFrameSection()
 * @generated
 */
public interface FrameSection extends Identified {
	/**
	 * Returns the value of the '<em><b>Area</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Cross-sectional area; length squared.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Area</em>' attribute.
	 * @see #setArea(double)
	 * @see org.modewright.model.structure.StructurePackage#getFrameSection_Area()
	 * @generated
	 */
	double getArea();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.FrameSection#getArea <em>Area</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Area</em>' attribute.
	 * @see #getArea()
	 * @generated
	 */
	void setArea(double value);

	/**
	 * Returns the value of the '<em><b>Iy</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Second moment of area for bending in the local x-z plane; length to the fourth.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Iy</em>' attribute.
	 * @see #setIy(double)
	 * @see org.modewright.model.structure.StructurePackage#getFrameSection_Iy()
	 * @generated
	 */
	double getIy();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.FrameSection#getIy <em>Iy</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Iy</em>' attribute.
	 * @see #getIy()
	 * @generated
	 */
	void setIy(double value);

	/**
	 * Returns the value of the '<em><b>Iz</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Second moment of area for bending in the local x-y plane; length to the fourth.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Iz</em>' attribute.
	 * @see #setIz(double)
	 * @see org.modewright.model.structure.StructurePackage#getFrameSection_Iz()
	 * @generated
	 */
	double getIz();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.FrameSection#getIz <em>Iz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Iz</em>' attribute.
	 * @see #getIz()
	 * @generated
	 */
	void setIz(double value);

	/**
	 * Returns the value of the '<em><b>Torsion</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Saint-Venant's torsion constant; length to the fourth.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Torsion</em>' attribute.
	 * @see #setTorsion(double)
	 * @see org.modewright.model.structure.StructurePackage#getFrameSection_Torsion()
	 * @generated
	 */
	double getTorsion();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.FrameSection#getTorsion <em>Torsion</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Torsion</em>' attribute.
	 * @see #getTorsion()
	 * @generated
	 */
	void setTorsion(double value);

	/**
	 * Returns the value of the '<em><b>Shear Area Y</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Shear area of the local x-y plane; length squared; 0: no shear deformation in that plane.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Shear Area Y</em>' attribute.
	 * @see #setShearAreaY(double)
	 * @see org.modewright.model.structure.StructurePackage#getFrameSection_ShearAreaY()
	 * @generated
	 */
	double getShearAreaY();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.FrameSection#getShearAreaY <em>Shear Area Y</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Shear Area Y</em>' attribute.
	 * @see #getShearAreaY()
	 * @generated
	 */
	void setShearAreaY(double value);

	/**
	 * Returns the value of the '<em><b>Shear Area Z</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Shear area of the local x-z plane; length squared; 0: no shear deformation in that plane.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Shear Area Z</em>' attribute.
	 * @see #setShearAreaZ(double)
	 * @see org.modewright.model.structure.StructurePackage#getFrameSection_ShearAreaZ()
	 * @generated
	 */
	double getShearAreaZ();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.FrameSection#getShearAreaZ <em>Shear Area Z</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Shear Area Z</em>' attribute.
	 * @see #getShearAreaZ()
	 * @generated
	 */
	void setShearAreaZ(double value);

} // FrameSection
