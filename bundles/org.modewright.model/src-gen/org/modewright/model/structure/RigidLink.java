/**
 */
package org.modewright.model.structure;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Rigid Link</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A node that follows another as a rigid body.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.RigidLink#getFrom <em>From</em>}</li>
 *   <li>{@link org.modewright.model.structure.RigidLink#getTo <em>To</em>}</li>
 *   <li>{@link org.modewright.model.structure.RigidLink#getComponents <em>Components</em>}</li>
 * </ul>
 *
 * @see org.modewright.model.structure.StructurePackage#getRigidLink()
 * @generated
 */
public interface RigidLink extends Identified {
	/**
	 * Returns the value of the '<em><b>From</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Leading node.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>From</em>' reference.
	 * @see #setFrom(Node)
	 * @see org.modewright.model.structure.StructurePackage#getRigidLink_From()
	 * @generated
	 */
	Node getFrom();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.RigidLink#getFrom <em>From</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>From</em>' reference.
	 * @see #getFrom()
	 * @generated
	 */
	void setFrom(Node value);

	/**
	 * Returns the value of the '<em><b>To</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Following node.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>To</em>' reference.
	 * @see #setTo(Node)
	 * @see org.modewright.model.structure.StructurePackage#getRigidLink_To()
	 * @generated
	 */
	Node getTo();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.RigidLink#getTo <em>To</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>To</em>' reference.
	 * @see #getTo()
	 * @generated
	 */
	void setTo(Node value);

	/**
	 * Returns the value of the '<em><b>Components</b></em>' attribute list.
	 * The list contents are of type {@link org.modewright.model.structure.Component}.
	 * The literals are from the enumeration {@link org.modewright.model.structure.Component}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Tied components of the following node; empty: all six.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Components</em>' attribute list.
	 * @see org.modewright.model.structure.Component
	 * @see org.modewright.model.structure.StructurePackage#getRigidLink_Components()
	 * @generated
	 */
	EList<Component> getComponents();

} // RigidLink
