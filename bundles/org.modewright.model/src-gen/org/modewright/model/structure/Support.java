/**
 */
package org.modewright.model.structure;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Support</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Support of a node: held components, and elastic stiffness of components that are not held.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.Support#getNode <em>Node</em>}</li>
 *   <li>{@link org.modewright.model.structure.Support#isUx <em>Ux</em>}</li>
 *   <li>{@link org.modewright.model.structure.Support#isUy <em>Uy</em>}</li>
 *   <li>{@link org.modewright.model.structure.Support#isUz <em>Uz</em>}</li>
 *   <li>{@link org.modewright.model.structure.Support#isRx <em>Rx</em>}</li>
 *   <li>{@link org.modewright.model.structure.Support#isRy <em>Ry</em>}</li>
 *   <li>{@link org.modewright.model.structure.Support#isRz <em>Rz</em>}</li>
 *   <li>{@link org.modewright.model.structure.Support#getElasticUx <em>Elastic Ux</em>}</li>
 *   <li>{@link org.modewright.model.structure.Support#getElasticUy <em>Elastic Uy</em>}</li>
 *   <li>{@link org.modewright.model.structure.Support#getElasticUz <em>Elastic Uz</em>}</li>
 *   <li>{@link org.modewright.model.structure.Support#getElasticRx <em>Elastic Rx</em>}</li>
 *   <li>{@link org.modewright.model.structure.Support#getElasticRy <em>Elastic Ry</em>}</li>
 *   <li>{@link org.modewright.model.structure.Support#getElasticRz <em>Elastic Rz</em>}</li>
 * </ul>
 *
 * @see org.modewright.model.structure.StructurePackage#getSupport()
 * @generated
 */
public interface Support extends Identified {
	/**
	 * Returns the value of the '<em><b>Node</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Node.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Node</em>' reference.
	 * @see #setNode(Node)
	 * @see org.modewright.model.structure.StructurePackage#getSupport_Node()
	 * @generated
	 */
	Node getNode();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Support#getNode <em>Node</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Node</em>' reference.
	 * @see #getNode()
	 * @generated
	 */
	void setNode(Node value);

	/**
	 * Returns the value of the '<em><b>Ux</b></em>' attribute.
	 * The default value is <code>"false"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Whether ux is held.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Ux</em>' attribute.
	 * @see #setUx(boolean)
	 * @see org.modewright.model.structure.StructurePackage#getSupport_Ux()
	 * @generated
	 */
	boolean isUx();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Support#isUx <em>Ux</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Ux</em>' attribute.
	 * @see #isUx()
	 * @generated
	 */
	void setUx(boolean value);

	/**
	 * Returns the value of the '<em><b>Uy</b></em>' attribute.
	 * The default value is <code>"false"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Whether uy is held.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Uy</em>' attribute.
	 * @see #setUy(boolean)
	 * @see org.modewright.model.structure.StructurePackage#getSupport_Uy()
	 * @generated
	 */
	boolean isUy();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Support#isUy <em>Uy</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Uy</em>' attribute.
	 * @see #isUy()
	 * @generated
	 */
	void setUy(boolean value);

	/**
	 * Returns the value of the '<em><b>Uz</b></em>' attribute.
	 * The default value is <code>"false"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Whether uz is held.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Uz</em>' attribute.
	 * @see #setUz(boolean)
	 * @see org.modewright.model.structure.StructurePackage#getSupport_Uz()
	 * @generated
	 */
	boolean isUz();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Support#isUz <em>Uz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Uz</em>' attribute.
	 * @see #isUz()
	 * @generated
	 */
	void setUz(boolean value);

	/**
	 * Returns the value of the '<em><b>Rx</b></em>' attribute.
	 * The default value is <code>"false"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Whether rx is held.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Rx</em>' attribute.
	 * @see #setRx(boolean)
	 * @see org.modewright.model.structure.StructurePackage#getSupport_Rx()
	 * @generated
	 */
	boolean isRx();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Support#isRx <em>Rx</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Rx</em>' attribute.
	 * @see #isRx()
	 * @generated
	 */
	void setRx(boolean value);

	/**
	 * Returns the value of the '<em><b>Ry</b></em>' attribute.
	 * The default value is <code>"false"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Whether ry is held.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Ry</em>' attribute.
	 * @see #setRy(boolean)
	 * @see org.modewright.model.structure.StructurePackage#getSupport_Ry()
	 * @generated
	 */
	boolean isRy();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Support#isRy <em>Ry</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Ry</em>' attribute.
	 * @see #isRy()
	 * @generated
	 */
	void setRy(boolean value);

	/**
	 * Returns the value of the '<em><b>Rz</b></em>' attribute.
	 * The default value is <code>"false"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Whether rz is held.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Rz</em>' attribute.
	 * @see #setRz(boolean)
	 * @see org.modewright.model.structure.StructurePackage#getSupport_Rz()
	 * @generated
	 */
	boolean isRz();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Support#isRz <em>Rz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Rz</em>' attribute.
	 * @see #isRz()
	 * @generated
	 */
	void setRz(boolean value);

	/**
	 * Returns the value of the '<em><b>Elastic Ux</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Elastic stiffness of ux to ground where it is not held; force per length; 0: none.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Elastic Ux</em>' attribute.
	 * @see #setElasticUx(double)
	 * @see org.modewright.model.structure.StructurePackage#getSupport_ElasticUx()
	 * @generated
	 */
	double getElasticUx();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Support#getElasticUx <em>Elastic Ux</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Elastic Ux</em>' attribute.
	 * @see #getElasticUx()
	 * @generated
	 */
	void setElasticUx(double value);

	/**
	 * Returns the value of the '<em><b>Elastic Uy</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Elastic stiffness of uy to ground where it is not held; force per length; 0: none.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Elastic Uy</em>' attribute.
	 * @see #setElasticUy(double)
	 * @see org.modewright.model.structure.StructurePackage#getSupport_ElasticUy()
	 * @generated
	 */
	double getElasticUy();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Support#getElasticUy <em>Elastic Uy</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Elastic Uy</em>' attribute.
	 * @see #getElasticUy()
	 * @generated
	 */
	void setElasticUy(double value);

	/**
	 * Returns the value of the '<em><b>Elastic Uz</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Elastic stiffness of uz to ground where it is not held; force per length; 0: none.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Elastic Uz</em>' attribute.
	 * @see #setElasticUz(double)
	 * @see org.modewright.model.structure.StructurePackage#getSupport_ElasticUz()
	 * @generated
	 */
	double getElasticUz();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Support#getElasticUz <em>Elastic Uz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Elastic Uz</em>' attribute.
	 * @see #getElasticUz()
	 * @generated
	 */
	void setElasticUz(double value);

	/**
	 * Returns the value of the '<em><b>Elastic Rx</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Elastic stiffness of rx to ground where it is not held; moment per radian; 0: none.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Elastic Rx</em>' attribute.
	 * @see #setElasticRx(double)
	 * @see org.modewright.model.structure.StructurePackage#getSupport_ElasticRx()
	 * @generated
	 */
	double getElasticRx();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Support#getElasticRx <em>Elastic Rx</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Elastic Rx</em>' attribute.
	 * @see #getElasticRx()
	 * @generated
	 */
	void setElasticRx(double value);

	/**
	 * Returns the value of the '<em><b>Elastic Ry</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Elastic stiffness of ry to ground where it is not held; moment per radian; 0: none.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Elastic Ry</em>' attribute.
	 * @see #setElasticRy(double)
	 * @see org.modewright.model.structure.StructurePackage#getSupport_ElasticRy()
	 * @generated
	 */
	double getElasticRy();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Support#getElasticRy <em>Elastic Ry</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Elastic Ry</em>' attribute.
	 * @see #getElasticRy()
	 * @generated
	 */
	void setElasticRy(double value);

	/**
	 * Returns the value of the '<em><b>Elastic Rz</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Elastic stiffness of rz to ground where it is not held; moment per radian; 0: none.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Elastic Rz</em>' attribute.
	 * @see #setElasticRz(double)
	 * @see org.modewright.model.structure.StructurePackage#getSupport_ElasticRz()
	 * @generated
	 */
	double getElasticRz();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.Support#getElasticRz <em>Elastic Rz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Elastic Rz</em>' attribute.
	 * @see #getElasticRz()
	 * @generated
	 */
	void setElasticRz(double value);

} // Support
