/**
 */
package org.modewright.model.structure.impl;

import java.util.Collection;

import org.eclipse.emf.common.notify.Notification;
import org.eclipse.emf.common.notify.NotificationChain;

import org.eclipse.emf.common.util.EList;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.InternalEObject;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import org.eclipse.emf.ecore.util.EObjectContainmentEList;
import org.eclipse.emf.ecore.util.InternalEList;

import org.modewright.model.structure.GravityLoad;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.StructurePackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Load Pattern</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.impl.LoadPatternImpl#getMassFactor <em>Mass Factor</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.LoadPatternImpl#getLoads <em>Loads</em>}</li>
 * </ul>
 *
 * @generated
 */
public class LoadPatternImpl extends IdentifiedImpl implements LoadPattern {
	/**
	 * The default value of the '{@link #getMassFactor() <em>Mass Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMassFactor()
	 * @generated
	 * @ordered
	 */
	protected static final double MASS_FACTOR_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getMassFactor() <em>Mass Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMassFactor()
	 * @generated
	 * @ordered
	 */
	protected double massFactor = MASS_FACTOR_EDEFAULT;

	/**
	 * The cached value of the '{@link #getLoads() <em>Loads</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLoads()
	 * @generated
	 * @ordered
	 */
	protected EList<GravityLoad> loads;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected LoadPatternImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return StructurePackage.Literals.LOAD_PATTERN;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getMassFactor() {
		return massFactor;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setMassFactor(double newMassFactor) {
		double oldMassFactor = massFactor;
		massFactor = newMassFactor;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.LOAD_PATTERN__MASS_FACTOR, oldMassFactor, massFactor));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<GravityLoad> getLoads() {
		if (loads == null) {
			loads = new EObjectContainmentEList<GravityLoad>(GravityLoad.class, this, StructurePackage.LOAD_PATTERN__LOADS);
		}
		return loads;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case StructurePackage.LOAD_PATTERN__LOADS:
				return ((InternalEList<?>)getLoads()).basicRemove(otherEnd, msgs);
		}
		return super.eInverseRemove(otherEnd, featureID, msgs);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case StructurePackage.LOAD_PATTERN__MASS_FACTOR:
				return getMassFactor();
			case StructurePackage.LOAD_PATTERN__LOADS:
				return getLoads();
		}
		return super.eGet(featureID, resolve, coreType);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@SuppressWarnings("unchecked")
	@Override
	public void eSet(int featureID, Object newValue) {
		switch (featureID) {
			case StructurePackage.LOAD_PATTERN__MASS_FACTOR:
				setMassFactor((Double)newValue);
				return;
			case StructurePackage.LOAD_PATTERN__LOADS:
				getLoads().clear();
				getLoads().addAll((Collection<? extends GravityLoad>)newValue);
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
			case StructurePackage.LOAD_PATTERN__MASS_FACTOR:
				setMassFactor(MASS_FACTOR_EDEFAULT);
				return;
			case StructurePackage.LOAD_PATTERN__LOADS:
				getLoads().clear();
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
			case StructurePackage.LOAD_PATTERN__MASS_FACTOR:
				return massFactor != MASS_FACTOR_EDEFAULT;
			case StructurePackage.LOAD_PATTERN__LOADS:
				return loads != null && !loads.isEmpty();
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
		result.append(" (massFactor: ");
		result.append(massFactor);
		result.append(')');
		return result.toString();
	}

} //LoadPatternImpl
