/**
 */
package org.modewright.model.structure;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Node Load</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Force at a node.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.NodeLoad#getNode <em>Node</em>}</li>
 * </ul>
 *
 * @see org.modewright.model.structure.StructurePackage#getNodeLoad()
 * @generated
 */
public interface NodeLoad extends GravityLoad {
	/**
	 * Returns the value of the '<em><b>Node</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Node.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Node</em>' reference.
	 * @see #setNode(Node)
	 * @see org.modewright.model.structure.StructurePackage#getNodeLoad_Node()
	 * @generated
	 */
	Node getNode();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.NodeLoad#getNode <em>Node</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Node</em>' reference.
	 * @see #getNode()
	 * @generated
	 */
	void setNode(Node value);

} // NodeLoad
