/**
 */
package org.modewright.model.structure;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Tie Term</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Factor times one component of a node.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.TieTerm#getNode <em>Node</em>}</li>
 *   <li>{@link org.modewright.model.structure.TieTerm#getComponent <em>Component</em>}</li>
 *   <li>{@link org.modewright.model.structure.TieTerm#getFactor <em>Factor</em>}</li>
 * </ul>
 *
 * @see org.modewright.model.structure.StructurePackage#getTieTerm()
 * @generated
 */
public interface TieTerm extends EObject {
	/**
	 * Returns the value of the '<em><b>Node</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Node.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Node</em>' reference.
	 * @see #setNode(Node)
	 * @see org.modewright.model.structure.StructurePackage#getTieTerm_Node()
	 * @generated
	 */
	Node getNode();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.TieTerm#getNode <em>Node</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Node</em>' reference.
	 * @see #getNode()
	 * @generated
	 */
	void setNode(Node value);

	/**
	 * Returns the value of the '<em><b>Component</b></em>' attribute.
	 * The default value is <code>"ux"</code>.
	 * The literals are from the enumeration {@link org.modewright.model.structure.Component}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Component.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Component</em>' attribute.
	 * @see org.modewright.model.structure.Component
	 * @see #setComponent(Component)
	 * @see org.modewright.model.structure.StructurePackage#getTieTerm_Component()
	 * @generated
	 */
	Component getComponent();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.TieTerm#getComponent <em>Component</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Component</em>' attribute.
	 * @see org.modewright.model.structure.Component
	 * @see #getComponent()
	 * @generated
	 */
	void setComponent(Component value);

	/**
	 * Returns the value of the '<em><b>Factor</b></em>' attribute.
	 * The default value is <code>"1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Factor.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Factor</em>' attribute.
	 * @see #setFactor(double)
	 * @see org.modewright.model.structure.StructurePackage#getTieTerm_Factor()
	 * @generated
	 */
	double getFactor();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.TieTerm#getFactor <em>Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Factor</em>' attribute.
	 * @see #getFactor()
	 * @generated
	 */
	void setFactor(double value);

} // TieTerm
