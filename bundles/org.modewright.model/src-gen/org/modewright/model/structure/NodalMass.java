/**
 */
package org.modewright.model.structure;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Nodal Mass</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Mass and rotary inertia at a node, global axes; several at one node add up.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.NodalMass#getNode <em>Node</em>}</li>
 *   <li>{@link org.modewright.model.structure.NodalMass#getUx <em>Ux</em>}</li>
 *   <li>{@link org.modewright.model.structure.NodalMass#getUy <em>Uy</em>}</li>
 *   <li>{@link org.modewright.model.structure.NodalMass#getUz <em>Uz</em>}</li>
 *   <li>{@link org.modewright.model.structure.NodalMass#getRx <em>Rx</em>}</li>
 *   <li>{@link org.modewright.model.structure.NodalMass#getRy <em>Ry</em>}</li>
 *   <li>{@link org.modewright.model.structure.NodalMass#getRz <em>Rz</em>}</li>
 *   <li>{@link org.modewright.model.structure.NodalMass#getOffset <em>Offset</em>}</li>
 * </ul>
 *
 * @see org.modewright.model.structure.StructurePackage#getNodalMass()
 * @generated
 */
public interface NodalMass extends Identified {
	/**
	 * Returns the value of the '<em><b>Node</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Node.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Node</em>' reference.
	 * @see #setNode(Node)
	 * @see org.modewright.model.structure.StructurePackage#getNodalMass_Node()
	 * @generated
	 */
	Node getNode();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.NodalMass#getNode <em>Node</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Node</em>' reference.
	 * @see #getNode()
	 * @generated
	 */
	void setNode(Node value);

	/**
	 * Returns the value of the '<em><b>Ux</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Mass in x.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Ux</em>' attribute.
	 * @see #setUx(double)
	 * @see org.modewright.model.structure.StructurePackage#getNodalMass_Ux()
	 * @generated
	 */
	double getUx();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.NodalMass#getUx <em>Ux</em>}' attribute.
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
	 * Mass in y.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Uy</em>' attribute.
	 * @see #setUy(double)
	 * @see org.modewright.model.structure.StructurePackage#getNodalMass_Uy()
	 * @generated
	 */
	double getUy();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.NodalMass#getUy <em>Uy</em>}' attribute.
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
	 * Mass in z.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Uz</em>' attribute.
	 * @see #setUz(double)
	 * @see org.modewright.model.structure.StructurePackage#getNodalMass_Uz()
	 * @generated
	 */
	double getUz();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.NodalMass#getUz <em>Uz</em>}' attribute.
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
	 * Rotary inertia about x through the centre of the mass.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Rx</em>' attribute.
	 * @see #setRx(double)
	 * @see org.modewright.model.structure.StructurePackage#getNodalMass_Rx()
	 * @generated
	 */
	double getRx();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.NodalMass#getRx <em>Rx</em>}' attribute.
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
	 * Rotary inertia about y through the centre of the mass.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Ry</em>' attribute.
	 * @see #setRy(double)
	 * @see org.modewright.model.structure.StructurePackage#getNodalMass_Ry()
	 * @generated
	 */
	double getRy();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.NodalMass#getRy <em>Ry</em>}' attribute.
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
	 * Rotary inertia about z through the centre of the mass.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Rz</em>' attribute.
	 * @see #setRz(double)
	 * @see org.modewright.model.structure.StructurePackage#getNodalMass_Rz()
	 * @generated
	 */
	double getRz();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.NodalMass#getRz <em>Rz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Rz</em>' attribute.
	 * @see #getRz()
	 * @generated
	 */
	void setRz(double value);

	/**
	 * Returns the value of the '<em><b>Offset</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * From the node to the centre of the mass, global axes; zero if unset.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Offset</em>' containment reference.
	 * @see #setOffset(Vector)
	 * @see org.modewright.model.structure.StructurePackage#getNodalMass_Offset()
	 * @generated
	 */
	Vector getOffset();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.NodalMass#getOffset <em>Offset</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Offset</em>' containment reference.
	 * @see #getOffset()
	 * @generated
	 */
	void setOffset(Vector value);

} // NodalMass
