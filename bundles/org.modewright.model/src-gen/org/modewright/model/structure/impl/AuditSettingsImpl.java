/**
 */
package org.modewright.model.structure.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

import org.modewright.model.structure.AuditSettings;
import org.modewright.model.structure.StructurePackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Audit Settings</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.impl.AuditSettingsImpl#getRulePack <em>Rule Pack</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.AuditSettingsImpl#isX <em>X</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.AuditSettingsImpl#isY <em>Y</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.AuditSettingsImpl#isZ <em>Z</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.AuditSettingsImpl#getLocalNodes <em>Local Nodes</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.AuditSettingsImpl#getCoincidence <em>Coincidence</em>}</li>
 * </ul>
 *
 * @generated
 */
public class AuditSettingsImpl extends MinimalEObjectImpl.Container implements AuditSettings {
	/**
	 * The default value of the '{@link #getRulePack() <em>Rule Pack</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRulePack()
	 * @generated
	 * @ordered
	 */
	protected static final String RULE_PACK_EDEFAULT = "common-90";

	/**
	 * The cached value of the '{@link #getRulePack() <em>Rule Pack</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRulePack()
	 * @generated
	 * @ordered
	 */
	protected String rulePack = RULE_PACK_EDEFAULT;

	/**
	 * The default value of the '{@link #isX() <em>X</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isX()
	 * @generated
	 * @ordered
	 */
	protected static final boolean X_EDEFAULT = true;

	/**
	 * The cached value of the '{@link #isX() <em>X</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isX()
	 * @generated
	 * @ordered
	 */
	protected boolean x = X_EDEFAULT;

	/**
	 * The default value of the '{@link #isY() <em>Y</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isY()
	 * @generated
	 * @ordered
	 */
	protected static final boolean Y_EDEFAULT = true;

	/**
	 * The cached value of the '{@link #isY() <em>Y</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isY()
	 * @generated
	 * @ordered
	 */
	protected boolean y = Y_EDEFAULT;

	/**
	 * The default value of the '{@link #isZ() <em>Z</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isZ()
	 * @generated
	 * @ordered
	 */
	protected static final boolean Z_EDEFAULT = false;

	/**
	 * The cached value of the '{@link #isZ() <em>Z</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isZ()
	 * @generated
	 * @ordered
	 */
	protected boolean z = Z_EDEFAULT;

	/**
	 * The default value of the '{@link #getLocalNodes() <em>Local Nodes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLocalNodes()
	 * @generated
	 * @ordered
	 */
	protected static final double LOCAL_NODES_EDEFAULT = 0.1;

	/**
	 * The cached value of the '{@link #getLocalNodes() <em>Local Nodes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLocalNodes()
	 * @generated
	 * @ordered
	 */
	protected double localNodes = LOCAL_NODES_EDEFAULT;

	/**
	 * The default value of the '{@link #getCoincidence() <em>Coincidence</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCoincidence()
	 * @generated
	 * @ordered
	 */
	protected static final double COINCIDENCE_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getCoincidence() <em>Coincidence</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCoincidence()
	 * @generated
	 * @ordered
	 */
	protected double coincidence = COINCIDENCE_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected AuditSettingsImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return StructurePackage.Literals.AUDIT_SETTINGS;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getRulePack() {
		return rulePack;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRulePack(String newRulePack) {
		String oldRulePack = rulePack;
		rulePack = newRulePack;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.AUDIT_SETTINGS__RULE_PACK, oldRulePack, rulePack));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean isX() {
		return x;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setX(boolean newX) {
		boolean oldX = x;
		x = newX;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.AUDIT_SETTINGS__X, oldX, x));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean isY() {
		return y;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setY(boolean newY) {
		boolean oldY = y;
		y = newY;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.AUDIT_SETTINGS__Y, oldY, y));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean isZ() {
		return z;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setZ(boolean newZ) {
		boolean oldZ = z;
		z = newZ;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.AUDIT_SETTINGS__Z, oldZ, z));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getLocalNodes() {
		return localNodes;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setLocalNodes(double newLocalNodes) {
		double oldLocalNodes = localNodes;
		localNodes = newLocalNodes;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.AUDIT_SETTINGS__LOCAL_NODES, oldLocalNodes, localNodes));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getCoincidence() {
		return coincidence;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setCoincidence(double newCoincidence) {
		double oldCoincidence = coincidence;
		coincidence = newCoincidence;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.AUDIT_SETTINGS__COINCIDENCE, oldCoincidence, coincidence));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case StructurePackage.AUDIT_SETTINGS__RULE_PACK:
				return getRulePack();
			case StructurePackage.AUDIT_SETTINGS__X:
				return isX();
			case StructurePackage.AUDIT_SETTINGS__Y:
				return isY();
			case StructurePackage.AUDIT_SETTINGS__Z:
				return isZ();
			case StructurePackage.AUDIT_SETTINGS__LOCAL_NODES:
				return getLocalNodes();
			case StructurePackage.AUDIT_SETTINGS__COINCIDENCE:
				return getCoincidence();
		}
		return super.eGet(featureID, resolve, coreType);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eSet(int featureID, Object newValue) {
		switch (featureID) {
			case StructurePackage.AUDIT_SETTINGS__RULE_PACK:
				setRulePack((String)newValue);
				return;
			case StructurePackage.AUDIT_SETTINGS__X:
				setX((Boolean)newValue);
				return;
			case StructurePackage.AUDIT_SETTINGS__Y:
				setY((Boolean)newValue);
				return;
			case StructurePackage.AUDIT_SETTINGS__Z:
				setZ((Boolean)newValue);
				return;
			case StructurePackage.AUDIT_SETTINGS__LOCAL_NODES:
				setLocalNodes((Double)newValue);
				return;
			case StructurePackage.AUDIT_SETTINGS__COINCIDENCE:
				setCoincidence((Double)newValue);
				return;
		}
		super.eSet(featureID, newValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eUnset(int featureID) {
		switch (featureID) {
			case StructurePackage.AUDIT_SETTINGS__RULE_PACK:
				setRulePack(RULE_PACK_EDEFAULT);
				return;
			case StructurePackage.AUDIT_SETTINGS__X:
				setX(X_EDEFAULT);
				return;
			case StructurePackage.AUDIT_SETTINGS__Y:
				setY(Y_EDEFAULT);
				return;
			case StructurePackage.AUDIT_SETTINGS__Z:
				setZ(Z_EDEFAULT);
				return;
			case StructurePackage.AUDIT_SETTINGS__LOCAL_NODES:
				setLocalNodes(LOCAL_NODES_EDEFAULT);
				return;
			case StructurePackage.AUDIT_SETTINGS__COINCIDENCE:
				setCoincidence(COINCIDENCE_EDEFAULT);
				return;
		}
		super.eUnset(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean eIsSet(int featureID) {
		switch (featureID) {
			case StructurePackage.AUDIT_SETTINGS__RULE_PACK:
				return RULE_PACK_EDEFAULT == null ? rulePack != null : !RULE_PACK_EDEFAULT.equals(rulePack);
			case StructurePackage.AUDIT_SETTINGS__X:
				return x != X_EDEFAULT;
			case StructurePackage.AUDIT_SETTINGS__Y:
				return y != Y_EDEFAULT;
			case StructurePackage.AUDIT_SETTINGS__Z:
				return z != Z_EDEFAULT;
			case StructurePackage.AUDIT_SETTINGS__LOCAL_NODES:
				return localNodes != LOCAL_NODES_EDEFAULT;
			case StructurePackage.AUDIT_SETTINGS__COINCIDENCE:
				return coincidence != COINCIDENCE_EDEFAULT;
		}
		return super.eIsSet(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String toString() {
		if (eIsProxy()) return super.toString();

		StringBuilder result = new StringBuilder(super.toString());
		result.append(" (rulePack: ");
		result.append(rulePack);
		result.append(", x: ");
		result.append(x);
		result.append(", y: ");
		result.append(y);
		result.append(", z: ");
		result.append(z);
		result.append(", localNodes: ");
		result.append(localNodes);
		result.append(", coincidence: ");
		result.append(coincidence);
		result.append(')');
		return result.toString();
	}

} //AuditSettingsImpl
