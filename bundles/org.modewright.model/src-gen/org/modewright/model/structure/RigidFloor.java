/**
 */
package org.modewright.model.structure;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Rigid Floor</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Nodes that move as a rigid body in their common plane.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.RigidFloor#getNodes <em>Nodes</em>}</li>
 * </ul>
 *
 * @see org.modewright.model.structure.StructurePackage#getRigidFloor()
 * @generated
 */
public interface RigidFloor extends Identified {
	/**
	 * Returns the value of the '<em><b>Nodes</b></em>' reference list.
	 * The list contents are of type {@link org.modewright.model.structure.Node}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Two or more nodes in one plane.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Nodes</em>' reference list.
	 * @see org.modewright.model.structure.StructurePackage#getRigidFloor_Nodes()
	 * @generated
	 */
	EList<Node> getNodes();

} // RigidFloor
