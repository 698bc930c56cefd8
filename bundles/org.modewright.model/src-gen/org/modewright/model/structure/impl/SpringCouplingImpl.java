/**
 */
package org.modewright.model.structure.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

import org.modewright.model.structure.Component;
import org.modewright.model.structure.SpringCoupling;
import org.modewright.model.structure.StructurePackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Spring Coupling</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.impl.SpringCouplingImpl#getFirst <em>First</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SpringCouplingImpl#getSecond <em>Second</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SpringCouplingImpl#getStiffness <em>Stiffness</em>}</li>
 * </ul>
 *
 * @generated
 */
public class SpringCouplingImpl extends MinimalEObjectImpl.Container implements SpringCoupling {
	/**
	 * The default value of the '{@link #getFirst() <em>First</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFirst()
	 * @generated
	 * @ordered
	 */
	protected static final Component FIRST_EDEFAULT = Component.UX;

	/**
	 * The cached value of the '{@link #getFirst() <em>First</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFirst()
	 * @generated
	 * @ordered
	 */
	protected Component first = FIRST_EDEFAULT;

	/**
	 * The default value of the '{@link #getSecond() <em>Second</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSecond()
	 * @generated
	 * @ordered
	 */
	protected static final Component SECOND_EDEFAULT = Component.UX;

	/**
	 * The cached value of the '{@link #getSecond() <em>Second</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSecond()
	 * @generated
	 * @ordered
	 */
	protected Component second = SECOND_EDEFAULT;

	/**
	 * The default value of the '{@link #getStiffness() <em>Stiffness</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStiffness()
	 * @generated
	 * @ordered
	 */
	protected static final double STIFFNESS_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getStiffness() <em>Stiffness</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStiffness()
	 * @generated
	 * @ordered
	 */
	protected double stiffness = STIFFNESS_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected SpringCouplingImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return StructurePackage.Literals.SPRING_COUPLING;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Component getFirst() {
		return first;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setFirst(Component newFirst) {
		Component oldFirst = first;
		first = newFirst == null ? FIRST_EDEFAULT : newFirst;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SPRING_COUPLING__FIRST, oldFirst, first));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Component getSecond() {
		return second;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setSecond(Component newSecond) {
		Component oldSecond = second;
		second = newSecond == null ? SECOND_EDEFAULT : newSecond;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SPRING_COUPLING__SECOND, oldSecond, second));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getStiffness() {
		return stiffness;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setStiffness(double newStiffness) {
		double oldStiffness = stiffness;
		stiffness = newStiffness;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SPRING_COUPLING__STIFFNESS, oldStiffness, stiffness));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case StructurePackage.SPRING_COUPLING__FIRST:
				return getFirst();
			case StructurePackage.SPRING_COUPLING__SECOND:
				return getSecond();
			case StructurePackage.SPRING_COUPLING__STIFFNESS:
				return getStiffness();
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
			case StructurePackage.SPRING_COUPLING__FIRST:
				setFirst((Component)newValue);
				return;
			case StructurePackage.SPRING_COUPLING__SECOND:
				setSecond((Component)newValue);
				return;
			case StructurePackage.SPRING_COUPLING__STIFFNESS:
				setStiffness((Double)newValue);
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
			case StructurePackage.SPRING_COUPLING__FIRST:
				setFirst(FIRST_EDEFAULT);
				return;
			case StructurePackage.SPRING_COUPLING__SECOND:
				setSecond(SECOND_EDEFAULT);
				return;
			case StructurePackage.SPRING_COUPLING__STIFFNESS:
				setStiffness(STIFFNESS_EDEFAULT);
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
			case StructurePackage.SPRING_COUPLING__FIRST:
				return first != FIRST_EDEFAULT;
			case StructurePackage.SPRING_COUPLING__SECOND:
				return second != SECOND_EDEFAULT;
			case StructurePackage.SPRING_COUPLING__STIFFNESS:
				return stiffness != STIFFNESS_EDEFAULT;
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
		result.append(" (first: ");
		result.append(first);
		result.append(", second: ");
		result.append(second);
		result.append(", stiffness: ");
		result.append(stiffness);
		result.append(')');
		return result.toString();
	}

} //SpringCouplingImpl
