/**
 */
package org.modewright.model.structure;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Member</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Straight frame member from start to end; local x from start to end.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.Member#getStart <em>Start</em>}</li>
 *   <li>{@link org.modewright.model.structure.Member#getEnd <em>End</em>}</li>
 *   <li>{@link org.modewright.model.structure.Member#getSection <em>Section</em>}</li>
 *   <li>{@link org.modewright.model.structure.Member#getMaterial <em>Material</em>}</li>
 *   <li>{@link org.modewright.model.structure.Member#getRoll <em>Roll</em>}</li>
 *   <li>{@link org.modewright.model.structure.Member#getStartFree <em>Start Free</em>}</li>
 *   <li>{@link org.modewright.model.structure.Member#getEndFree <em>End Free</em>}</li>
 *   <li>{@link org.modewright.model.structure.Member#getStartRigid <em>Start Rigid</em>}</li>
 *   <li>{@link org.modewright.model.structure.Member#getEndRigid <em>End Rigid</em>}</li>
 *   <li>{@link org.modewright.model.structure.Member#getStartOffset <em>Start Offset</em>}</li>
 *   <li>{@link org.modewright.model.structure.Member#getEndOffset <em>End Offset</em>}</li>
 *   <li>{@link org.modewright.model.structure.Member#isAxialOnly <em>Axial Only</em>}</li>
 *   <li>{@link org.modewright.model.structure.Member#getAxialForce <em>Axial Force</em>}</li>
 *   <li>{@link org.modewright.model.structure.Member#getMass <em>Mass</em>}</li>
 *   <li>{@link org.modewright.model.structure.Member#getAxialFactor <em>Axial Factor</em>}</li>
 *   <li>{@link org.modewright.model.structure.Member#getShearYFactor <em>Shear YFactor</em>}</li>
 *   <li>{@link org.modewright.model.structure.Member#getShearZFactor <em>Shear ZFactor</em>}</li>
 *   <li>{@link org.modewright.model.structure.Member#getTorsionFactor <em>Torsion Factor</em>}</li>
 *   <li>{@link org.modewright.model.structure.Member#getBendingYFactor <em>Bending YFactor</em>}</li>
 *   <li>{@link org.modewright.model.structure.Member#getBendingZFactor <em>Bending ZFactor</em>}</li>
 * </ul>
 *
 * @see org.modewright.model.structure.StructurePackage#getMember()
 * @generated
 */
public interface Member extends Grouped {
	/**
	 * Returns the value of the '<em><b>Start</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Start node.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Start</em>' reference.
	 * @see #setStart(Node)
	 * @see org.modewright.model.structure.StructurePackage#getMember_Start()
	 * @generated
	 */
	Node getStart();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Member#getStart <em>Start</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Start</em>' reference.
	 * @see #getStart()
	 * @generated
	 */
	void setStart(Node value);

	/**
	 * Returns the value of the '<em><b>End</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * End node.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>End</em>' reference.
	 * @see #setEnd(Node)
	 * @see org.modewright.model.structure.StructurePackage#getMember_End()
	 * @generated
	 */
	Node getEnd();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Member#getEnd <em>End</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>End</em>' reference.
	 * @see #getEnd()
	 * @generated
	 */
	void setEnd(Node value);

	/**
	 * Returns the value of the '<em><b>Section</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Cross section.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Section</em>' reference.
	 * @see #setSection(FrameSection)
	 * @see org.modewright.model.structure.StructurePackage#getMember_Section()
	 * @generated
	 */
	FrameSection getSection();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Member#getSection <em>Section</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Section</em>' reference.
	 * @see #getSection()
	 * @generated
	 */
	void setSection(FrameSection value);

	/**
	 * Returns the value of the '<em><b>Material</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Material.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Material</em>' reference.
	 * @see #setMaterial(Material)
	 * @see org.modewright.model.structure.StructurePackage#getMember_Material()
	 * @generated
	 */
	Material getMaterial();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Member#getMaterial <em>Material</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Material</em>' reference.
	 * @see #getMaterial()
	 * @generated
	 */
	void setMaterial(Material value);

	/**
	 * Returns the value of the '<em><b>Roll</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Turn of the local axes y and z about x, right-handed; degrees.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Roll</em>' attribute.
	 * @see #setRoll(double)
	 * @see org.modewright.model.structure.StructurePackage#getMember_Roll()
	 * @generated
	 */
	double getRoll();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Member#getRoll <em>Roll</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Roll</em>' attribute.
	 * @see #getRoll()
	 * @generated
	 */
	void setRoll(double value);

	/**
	 * Returns the value of the '<em><b>Start Free</b></em>' attribute list.
	 * The list contents are of type {@link org.modewright.model.structure.Component}.
	 * The literals are from the enumeration {@link org.modewright.model.structure.Component}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Released components at the start, local axes.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Start Free</em>' attribute list.
	 * @see org.modewright.model.structure.Component
	 * @see org.modewright.model.structure.StructurePackage#getMember_StartFree()
	 * @generated
	 */
	EList<Component> getStartFree();

	/**
	 * Returns the value of the '<em><b>End Free</b></em>' attribute list.
	 * The list contents are of type {@link org.modewright.model.structure.Component}.
	 * The literals are from the enumeration {@link org.modewright.model.structure.Component}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Released components at the end, local axes.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>End Free</em>' attribute list.
	 * @see org.modewright.model.structure.Component
	 * @see org.modewright.model.structure.StructurePackage#getMember_EndFree()
	 * @generated
	 */
	EList<Component> getEndFree();

	/**
	 * Returns the value of the '<em><b>Start Rigid</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Length of the rigid zone at the start; length.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Start Rigid</em>' attribute.
	 * @see #setStartRigid(double)
	 * @see org.modewright.model.structure.StructurePackage#getMember_StartRigid()
	 * @generated
	 */
	double getStartRigid();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Member#getStartRigid <em>Start Rigid</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Start Rigid</em>' attribute.
	 * @see #getStartRigid()
	 * @generated
	 */
	void setStartRigid(double value);

	/**
	 * Returns the value of the '<em><b>End Rigid</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Length of the rigid zone at the end; length.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>End Rigid</em>' attribute.
	 * @see #setEndRigid(double)
	 * @see org.modewright.model.structure.StructurePackage#getMember_EndRigid()
	 * @generated
	 */
	double getEndRigid();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Member#getEndRigid <em>End Rigid</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>End Rigid</em>' attribute.
	 * @see #getEndRigid()
	 * @generated
	 */
	void setEndRigid(double value);

	/**
	 * Returns the value of the '<em><b>Start Offset</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * From the start node to the start of the member, global axes; zero if unset.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Start Offset</em>' containment reference.
	 * @see #setStartOffset(Vector)
	 * @see org.modewright.model.structure.StructurePackage#getMember_StartOffset()
	 * @generated
	 */
	Vector getStartOffset();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Member#getStartOffset <em>Start Offset</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Start Offset</em>' containment reference.
	 * @see #getStartOffset()
	 * @generated
	 */
	void setStartOffset(Vector value);

	/**
	 * Returns the value of the '<em><b>End Offset</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * From the end node to the end of the member, global axes; zero if unset.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>End Offset</em>' containment reference.
	 * @see #setEndOffset(Vector)
	 * @see org.modewright.model.structure.StructurePackage#getMember_EndOffset()
	 * @generated
	 */
	Vector getEndOffset();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Member#getEndOffset <em>End Offset</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>End Offset</em>' containment reference.
	 * @see #getEndOffset()
	 * @generated
	 */
	void setEndOffset(Vector value);

	/**
	 * Returns the value of the '<em><b>Axial Only</b></em>' attribute.
	 * The default value is <code>"false"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Whether the member is a bar that carries axial force alone.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Axial Only</em>' attribute.
	 * @see #setAxialOnly(boolean)
	 * @see org.modewright.model.structure.StructurePackage#getMember_AxialOnly()
	 * @generated
	 */
	boolean isAxialOnly();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Member#isAxialOnly <em>Axial Only</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Axial Only</em>' attribute.
	 * @see #isAxialOnly()
	 * @generated
	 */
	void setAxialOnly(boolean value);

	/**
	 * Returns the value of the '<em><b>Axial Force</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Axial force for the geometric stiffness, tension positive; force.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Axial Force</em>' attribute.
	 * @see #setAxialForce(double)
	 * @see org.modewright.model.structure.StructurePackage#getMember_AxialForce()
	 * @generated
	 */
	double getAxialForce();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Member#getAxialForce <em>Axial Force</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Axial Force</em>' attribute.
	 * @see #getAxialForce()
	 * @generated
	 */
	void setAxialForce(double value);

	/**
	 * Returns the value of the '<em><b>Mass</b></em>' attribute.
	 * The default value is <code>"as the model"</code>.
	 * The literals are from the enumeration {@link org.modewright.model.structure.MemberMass}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * How this member spreads its mass.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Mass</em>' attribute.
	 * @see org.modewright.model.structure.MemberMass
	 * @see #setMass(MemberMass)
	 * @see org.modewright.model.structure.StructurePackage#getMember_Mass()
	 * @generated
	 */
	MemberMass getMass();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Member#getMass <em>Mass</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Mass</em>' attribute.
	 * @see org.modewright.model.structure.MemberMass
	 * @see #getMass()
	 * @generated
	 */
	void setMass(MemberMass value);

	/**
	 * Returns the value of the '<em><b>Axial Factor</b></em>' attribute.
	 * The default value is <code>"1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Factor of the axial stiffness EA.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Axial Factor</em>' attribute.
	 * @see #setAxialFactor(double)
	 * @see org.modewright.model.structure.StructurePackage#getMember_AxialFactor()
	 * @generated
	 */
	double getAxialFactor();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Member#getAxialFactor <em>Axial Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Axial Factor</em>' attribute.
	 * @see #getAxialFactor()
	 * @generated
	 */
	void setAxialFactor(double value);

	/**
	 * Returns the value of the '<em><b>Shear YFactor</b></em>' attribute.
	 * The default value is <code>"1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Factor of the shear area of the local x-y plane.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Shear YFactor</em>' attribute.
	 * @see #setShearYFactor(double)
	 * @see org.modewright.model.structure.StructurePackage#getMember_ShearYFactor()
	 * @generated
	 */
	double getShearYFactor();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Member#getShearYFactor <em>Shear YFactor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Shear YFactor</em>' attribute.
	 * @see #getShearYFactor()
	 * @generated
	 */
	void setShearYFactor(double value);

	/**
	 * Returns the value of the '<em><b>Shear ZFactor</b></em>' attribute.
	 * The default value is <code>"1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Factor of the shear area of the local x-z plane.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Shear ZFactor</em>' attribute.
	 * @see #setShearZFactor(double)
	 * @see org.modewright.model.structure.StructurePackage#getMember_ShearZFactor()
	 * @generated
	 */
	double getShearZFactor();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Member#getShearZFactor <em>Shear ZFactor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Shear ZFactor</em>' attribute.
	 * @see #getShearZFactor()
	 * @generated
	 */
	void setShearZFactor(double value);

	/**
	 * Returns the value of the '<em><b>Torsion Factor</b></em>' attribute.
	 * The default value is <code>"1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Factor of the torsional stiffness GJ.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Torsion Factor</em>' attribute.
	 * @see #setTorsionFactor(double)
	 * @see org.modewright.model.structure.StructurePackage#getMember_TorsionFactor()
	 * @generated
	 */
	double getTorsionFactor();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Member#getTorsionFactor <em>Torsion Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Torsion Factor</em>' attribute.
	 * @see #getTorsionFactor()
	 * @generated
	 */
	void setTorsionFactor(double value);

	/**
	 * Returns the value of the '<em><b>Bending YFactor</b></em>' attribute.
	 * The default value is <code>"1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Factor of the bending stiffness E iy.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Bending YFactor</em>' attribute.
	 * @see #setBendingYFactor(double)
	 * @see org.modewright.model.structure.StructurePackage#getMember_BendingYFactor()
	 * @generated
	 */
	double getBendingYFactor();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Member#getBendingYFactor <em>Bending YFactor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Bending YFactor</em>' attribute.
	 * @see #getBendingYFactor()
	 * @generated
	 */
	void setBendingYFactor(double value);

	/**
	 * Returns the value of the '<em><b>Bending ZFactor</b></em>' attribute.
	 * The default value is <code>"1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Factor of the bending stiffness E iz.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Bending ZFactor</em>' attribute.
	 * @see #setBendingZFactor(double)
	 * @see org.modewright.model.structure.StructurePackage#getMember_BendingZFactor()
	 * @generated
	 */
	double getBendingZFactor();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Member#getBendingZFactor <em>Bending ZFactor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Bending ZFactor</em>' attribute.
	 * @see #getBendingZFactor()
	 * @generated
	 */
	void setBendingZFactor(double value);

} // Member
