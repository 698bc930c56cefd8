/**
 */
package org.modewright.model.structure;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Analysis Settings</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * What is solved.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.AnalysisSettings#getModes <em>Modes</em>}</li>
 *   <li>{@link org.modewright.model.structure.AnalysisSettings#getBelow <em>Below</em>}</li>
 * </ul>
 *
 * @see org.modewright.model.structure.StructurePackage#getAnalysisSettings()
 * @generated
 */
public interface AnalysisSettings extends EObject {
	/**
	 * Returns the value of the '<em><b>Modes</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Number of modes to find; 0: as many as the rule pack needs.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Modes</em>' attribute.
	 * @see #setModes(int)
	 * @see org.modewright.model.structure.StructurePackage#getAnalysisSettings_Modes()
	 * @generated
	 */
	int getModes();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.AnalysisSettings#getModes <em>Modes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Modes</em>' attribute.
	 * @see #getModes()
	 * @generated
	 */
	void setModes(int value);

	/**
	 * Returns the value of the '<em><b>Below</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Only modes below this frequency; Hz; 0: no limit.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Below</em>' attribute.
	 * @see #setBelow(double)
	 * @see org.modewright.model.structure.StructurePackage#getAnalysisSettings_Below()
	 * @generated
	 */
	double getBelow();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.AnalysisSettings#getBelow <em>Below</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Below</em>' attribute.
	 * @see #getBelow()
	 * @generated
	 */
	void setBelow(double value);

} // AnalysisSettings
