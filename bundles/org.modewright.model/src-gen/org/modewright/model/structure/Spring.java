/**
 */
package org.modewright.model.structure;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Spring</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Spring along global axes, to ground or between two nodes (relative motion at the mid-point of the line between them).
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.Spring#getNode <em>Node</em>}</li>
 *   <li>{@link org.modewright.model.structure.Spring#getTo <em>To</em>}</li>
 *   <li>{@link org.modewright.model.structure.Spring#getUx <em>Ux</em>}</li>
 *   <li>{@link org.modewright.model.structure.Spring#getUy <em>Uy</em>}</li>
 *   <li>{@link org.modewright.model.structure.Spring#getUz <em>Uz</em>}</li>
 *   <li>{@link org.modewright.model.structure.Spring#getRx <em>Rx</em>}</li>
 *   <li>{@link org.modewright.model.structure.Spring#getRy <em>Ry</em>}</li>
 *   <li>{@link org.modewright.model.structure.Spring#getRz <em>Rz</em>}</li>
 *   <li>{@link org.modewright.model.structure.Spring#getCouplings <em>Couplings</em>}</li>
 * </ul>
 *
 * @see org.modewright.model.structure.StructurePackage#getSpring()
 * @generated
 */
public interface Spring extends Grouped {
	/**
	 * Returns the value of the '<em><b>Node</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Node.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Node</em>' reference.
	 * @see #setNode(Node)
	 * @see org.modewright.model.structure.StructurePackage#getSpring_Node()
	 * @generated
	 */
	Node getNode();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Spring#getNode <em>Node</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Node</em>' reference.
	 * @see #getNode()
	 * @generated
	 */
	void setNode(Node value);

	/**
	 * Returns the value of the '<em><b>To</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Other node; to ground if unset.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>To</em>' reference.
	 * @see #setTo(Node)
	 * @see org.modewright.model.structure.StructurePackage#getSpring_To()
	 * @generated
	 */
	Node getTo();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Spring#getTo <em>To</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>To</em>' reference.
	 * @see #getTo()
	 * @generated
	 */
	void setTo(Node value);

	/**
	 * Returns the value of the '<em><b>Ux</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Stiffness of ux; force per length.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Ux</em>' attribute.
	 * @see #setUx(double)
	 * @see org.modewright.model.structure.StructurePackage#getSpring_Ux()
	 * @generated
	 */
	double getUx();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Spring#getUx <em>Ux</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Ux</em>' attribute.
	 * @see #getUx()
	 * @generated
	 */
	void setUx(double value);

	/**
	 * Returns the value of the '<em><b>Uy</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Stiffness of uy; force per length.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Uy</em>' attribute.
	 * @see #setUy(double)
	 * @see org.modewright.model.structure.StructurePackage#getSpring_Uy()
	 * @generated
	 */
	double getUy();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Spring#getUy <em>Uy</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Uy</em>' attribute.
	 * @see #getUy()
	 * @generated
	 */
	void setUy(double value);

	/**
	 * Returns the value of the '<em><b>Uz</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Stiffness of uz; force per length.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Uz</em>' attribute.
	 * @see #setUz(double)
	 * @see org.modewright.model.structure.StructurePackage#getSpring_Uz()
	 * @generated
	 */
	double getUz();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Spring#getUz <em>Uz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Uz</em>' attribute.
	 * @see #getUz()
	 * @generated
	 */
	void setUz(double value);

	/**
	 * Returns the value of the '<em><b>Rx</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Stiffness of rx; moment per radian.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Rx</em>' attribute.
	 * @see #setRx(double)
	 * @see org.modewright.model.structure.StructurePackage#getSpring_Rx()
	 * @generated
	 */
	double getRx();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Spring#getRx <em>Rx</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Rx</em>' attribute.
	 * @see #getRx()
	 * @generated
	 */
	void setRx(double value);

	/**
	 * Returns the value of the '<em><b>Ry</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Stiffness of ry; moment per radian.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Ry</em>' attribute.
	 * @see #setRy(double)
	 * @see org.modewright.model.structure.StructurePackage#getSpring_Ry()
	 * @generated
	 */
	double getRy();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Spring#getRy <em>Ry</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Ry</em>' attribute.
	 * @see #getRy()
	 * @generated
	 */
	void setRy(double value);

	/**
	 * Returns the value of the '<em><b>Rz</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Stiffness of rz; moment per radian.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Rz</em>' attribute.
	 * @see #setRz(double)
	 * @see org.modewright.model.structure.StructurePackage#getSpring_Rz()
	 * @generated
	 */
	double getRz();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Spring#getRz <em>Rz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Rz</em>' attribute.
	 * @see #getRz()
	 * @generated
	 */
	void setRz(double value);

	/**
	 * Returns the value of the '<em><b>Couplings</b></em>' containment reference list.
	 * The list contents are of type {@link org.modewright.model.structure.SpringCoupling}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Off-diagonal stiffnesses; a pair of components adds up.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Couplings</em>' containment reference list.
	 * @see org.modewright.model.structure.StructurePackage#getSpring_Couplings()
	 * @generated
	 */
	EList<SpringCoupling> getCouplings();

} // Spring
