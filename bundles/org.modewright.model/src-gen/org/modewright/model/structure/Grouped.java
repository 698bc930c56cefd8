/**
 */
package org.modewright.model.structure;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Grouped</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * An element that may belong to a group.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.Grouped#getGroup <em>Group</em>}</li>
 * </ul>
 *
 * @see org.modewright.model.structure.StructurePackage#getGrouped()
 * @generated
 */
public interface Grouped extends Identified {
	/**
	 * Returns the value of the '<em><b>Group</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Group that the element belongs to; none if unset.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Group</em>' reference.
	 * @see #setGroup(Group)
	 * @see org.modewright.model.structure.StructurePackage#getGrouped_Group()
	 * @generated
	 */
	Group getGroup();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Grouped#getGroup <em>Group</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Group</em>' reference.
	 * @see #getGroup()
	 * @generated
	 */
	void setGroup(Group value);

} // Grouped
