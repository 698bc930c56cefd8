/**
 */
package org.modewright.model.structure;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Audit Settings</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * How it is judged.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.AuditSettings#getRulePack <em>Rule Pack</em>}</li>
 *   <li>{@link org.modewright.model.structure.AuditSettings#isX <em>X</em>}</li>
 *   <li>{@link org.modewright.model.structure.AuditSettings#isY <em>Y</em>}</li>
 *   <li>{@link org.modewright.model.structure.AuditSettings#isZ <em>Z</em>}</li>
 *   <li>{@link org.modewright.model.structure.AuditSettings#getLocalNodes <em>Local Nodes</em>}</li>
 *   <li>{@link org.modewright.model.structure.AuditSettings#getCoincidence <em>Coincidence</em>}</li>
 * </ul>
 *
 * @see org.modewright.model.structure.StructurePackage#getAuditSettings()
 * @generated
 */
public interface AuditSettings extends EObject {
	/**
	 * Returns the value of the '<em><b>Rule Pack</b></em>' attribute.
	 * The default value is <code>"common-90"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Id of the rule pack that the modes are judged by.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Rule Pack</em>' attribute.
	 * @see #setRulePack(String)
	 * @see org.modewright.model.structure.StructurePackage#getAuditSettings_RulePack()
	 * @generated
	 */
	String getRulePack();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.AuditSettings#getRulePack <em>Rule Pack</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Rule Pack</em>' attribute.
	 * @see #getRulePack()
	 * @generated
	 */
	void setRulePack(String value);

	/**
	 * Returns the value of the '<em><b>X</b></em>' attribute.
	 * The default value is <code>"true"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Whether direction x is judged.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>X</em>' attribute.
	 * @see #setX(boolean)
	 * @see org.modewright.model.structure.StructurePackage#getAuditSettings_X()
	 * @generated
	 */
	boolean isX();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.AuditSettings#isX <em>X</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>X</em>' attribute.
	 * @see #isX()
	 * @generated
	 */
	void setX(boolean value);

	/**
	 * Returns the value of the '<em><b>Y</b></em>' attribute.
	 * The default value is <code>"true"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Whether direction y is judged.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Y</em>' attribute.
	 * @see #setY(boolean)
	 * @see org.modewright.model.structure.StructurePackage#getAuditSettings_Y()
	 * @generated
	 */
	boolean isY();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.AuditSettings#isY <em>Y</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Y</em>' attribute.
	 * @see #isY()
	 * @generated
	 */
	void setY(boolean value);

	/**
	 * Returns the value of the '<em><b>Z</b></em>' attribute.
	 * The default value is <code>"false"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Whether direction z is judged.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Z</em>' attribute.
	 * @see #setZ(boolean)
	 * @see org.modewright.model.structure.StructurePackage#getAuditSettings_Z()
	 * @generated
	 */
	boolean isZ();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.AuditSettings#isZ <em>Z</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Z</em>' attribute.
	 * @see #isZ()
	 * @generated
	 */
	void setZ(boolean value);

	/**
	 * Returns the value of the '<em><b>Local Nodes</b></em>' attribute.
	 * The default value is <code>"0.1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * A mode that moves effectively fewer nodes than this share of all, and at most 0.5 % of the mass of any direction, is local.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Local Nodes</em>' attribute.
	 * @see #setLocalNodes(double)
	 * @see org.modewright.model.structure.StructurePackage#getAuditSettings_LocalNodes()
	 * @generated
	 */
	double getLocalNodes();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.AuditSettings#getLocalNodes <em>Local Nodes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Local Nodes</em>' attribute.
	 * @see #getLocalNodes()
	 * @generated
	 */
	void setLocalNodes(double value);

	/**
	 * Returns the value of the '<em><b>Coincidence</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Nodes closer than this length, in the unit of the model, and not joined are reported; 0: one thousandth of the size of the model.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Coincidence</em>' attribute.
	 * @see #setCoincidence(double)
	 * @see org.modewright.model.structure.StructurePackage#getAuditSettings_Coincidence()
	 * @generated
	 */
	double getCoincidence();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.AuditSettings#getCoincidence <em>Coincidence</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Coincidence</em>' attribute.
	 * @see #getCoincidence()
	 * @generated
	 */
	void setCoincidence(double value);

} // AuditSettings
