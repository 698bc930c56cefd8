/**
 */
package org.modewright.model.structure;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Member Load</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Force per length over the whole node-to-node length of a member.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.MemberLoad#getMember <em>Member</em>}</li>
 * </ul>
 *
 * @see org.modewright.model.structure.StructurePackage#getMemberLoad()
 * @generated
 */
public interface MemberLoad extends GravityLoad {
	/**
	 * Returns the value of the '<em><b>Member</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Member.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Member</em>' reference.
	 * @see #setMember(Member)
	 * @see org.modewright.model.structure.StructurePackage#getMemberLoad_Member()
	 * @generated
	 */
	Member getMember();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.MemberLoad#getMember <em>Member</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Member</em>' reference.
	 * @see #getMember()
	 * @generated
	 */
	void setMember(Member value);

} // MemberLoad
