/**
 */
package org.modewright.model.structure.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import org.modewright.model.structure.Material;
import org.modewright.model.structure.StructurePackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Material</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.impl.MaterialImpl#getYoung <em>Young</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MaterialImpl#getPoisson <em>Poisson</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MaterialImpl#getDensity <em>Density</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MaterialImpl#getShear <em>Shear</em>}</li>
 * </ul>
 *
 * @generated
 */
public class MaterialImpl extends IdentifiedImpl implements Material {
	/**
	 * The default value of the '{@link #getYoung() <em>Young</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getYoung()
	 * @generated
	 * @ordered
	 */
	protected static final double YOUNG_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getYoung() <em>Young</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getYoung()
	 * @generated
	 * @ordered
	 */
	protected double young = YOUNG_EDEFAULT;

	/**
	 * The default value of the '{@link #getPoisson() <em>Poisson</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPoisson()
	 * @generated
	 * @ordered
	 */
	protected static final double POISSON_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getPoisson() <em>Poisson</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPoisson()
	 * @generated
	 * @ordered
	 */
	protected double poisson = POISSON_EDEFAULT;

	/**
	 * The default value of the '{@link #getDensity() <em>Density</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDensity()
	 * @generated
	 * @ordered
	 */
	protected static final double DENSITY_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getDensity() <em>Density</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDensity()
	 * @generated
	 * @ordered
	 */
	protected double density = DENSITY_EDEFAULT;

	/**
	 * The default value of the '{@link #getShear() <em>Shear</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getShear()
	 * @generated
	 * @ordered
	 */
	protected static final double SHEAR_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getShear() <em>Shear</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getShear()
	 * @generated
	 * @ordered
	 */
	protected double shear = SHEAR_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected MaterialImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return StructurePackage.Literals.MATERIAL;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getYoung() {
		return young;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setYoung(double newYoung) {
		double oldYoung = young;
		young = newYoung;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MATERIAL__YOUNG, oldYoung, young));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getPoisson() {
		return poisson;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setPoisson(double newPoisson) {
		double oldPoisson = poisson;
		poisson = newPoisson;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MATERIAL__POISSON, oldPoisson, poisson));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getDensity() {
		return density;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setDensity(double newDensity) {
		double oldDensity = density;
		density = newDensity;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MATERIAL__DENSITY, oldDensity, density));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getShear() {
		return shear;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setShear(double newShear) {
		double oldShear = shear;
		shear = newShear;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MATERIAL__SHEAR, oldShear, shear));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case StructurePackage.MATERIAL__YOUNG:
				return getYoung();
			case StructurePackage.MATERIAL__POISSON:
				return getPoisson();
			case StructurePackage.MATERIAL__DENSITY:
				return getDensity();
			case StructurePackage.MATERIAL__SHEAR:
				return getShear();
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
			case StructurePackage.MATERIAL__YOUNG:
				setYoung((Double)newValue);
				return;
			case StructurePackage.MATERIAL__POISSON:
				setPoisson((Double)newValue);
				return;
			case StructurePackage.MATERIAL__DENSITY:
				setDensity((Double)newValue);
				return;
			case StructurePackage.MATERIAL__SHEAR:
				setShear((Double)newValue);
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
			case StructurePackage.MATERIAL__YOUNG:
				setYoung(YOUNG_EDEFAULT);
				return;
			case StructurePackage.MATERIAL__POISSON:
				setPoisson(POISSON_EDEFAULT);
				return;
			case StructurePackage.MATERIAL__DENSITY:
				setDensity(DENSITY_EDEFAULT);
				return;
			case StructurePackage.MATERIAL__SHEAR:
				setShear(SHEAR_EDEFAULT);
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
			case StructurePackage.MATERIAL__YOUNG:
				return young != YOUNG_EDEFAULT;
			case StructurePackage.MATERIAL__POISSON:
				return poisson != POISSON_EDEFAULT;
			case StructurePackage.MATERIAL__DENSITY:
				return density != DENSITY_EDEFAULT;
			case StructurePackage.MATERIAL__SHEAR:
				return shear != SHEAR_EDEFAULT;
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
		result.append(" (young: ");
		result.append(young);
		result.append(", poisson: ");
		result.append(poisson);
		result.append(", density: ");
		result.append(density);
		result.append(", shear: ");
		result.append(shear);
		result.append(')');
		return result.toString();
	}

} //MaterialImpl
