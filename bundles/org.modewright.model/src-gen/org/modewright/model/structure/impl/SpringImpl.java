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

import org.modewright.model.structure.Node;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.SpringCoupling;
import org.modewright.model.structure.StructurePackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Spring</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.impl.SpringImpl#getNode <em>Node</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SpringImpl#getTo <em>To</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SpringImpl#getUx <em>Ux</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SpringImpl#getUy <em>Uy</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SpringImpl#getUz <em>Uz</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SpringImpl#getRx <em>Rx</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SpringImpl#getRy <em>Ry</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SpringImpl#getRz <em>Rz</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SpringImpl#getCouplings <em>Couplings</em>}</li>
 * </ul>
 *
 * @generated
 */
public class SpringImpl extends GroupedImpl implements Spring {
	/**
	 * The cached value of the '{@link #getNode() <em>Node</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getNode()
	 * @generated
	 * @ordered
	 */
	protected Node node;

	/**
	 * The cached value of the '{@link #getTo() <em>To</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTo()
	 * @generated
	 * @ordered
	 */
	protected Node to;

	/**
	 * The default value of the '{@link #getUx() <em>Ux</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getUx()
	 * @generated
	 * @ordered
	 */
	protected static final double UX_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getUx() <em>Ux</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getUx()
	 * @generated
	 * @ordered
	 */
	protected double ux = UX_EDEFAULT;

	/**
	 * The default value of the '{@link #getUy() <em>Uy</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getUy()
	 * @generated
	 * @ordered
	 */
	protected static final double UY_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getUy() <em>Uy</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getUy()
	 * @generated
	 * @ordered
	 */
	protected double uy = UY_EDEFAULT;

	/**
	 * The default value of the '{@link #getUz() <em>Uz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getUz()
	 * @generated
	 * @ordered
	 */
	protected static final double UZ_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getUz() <em>Uz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getUz()
	 * @generated
	 * @ordered
	 */
	protected double uz = UZ_EDEFAULT;

	/**
	 * The default value of the '{@link #getRx() <em>Rx</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRx()
	 * @generated
	 * @ordered
	 */
	protected static final double RX_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getRx() <em>Rx</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRx()
	 * @generated
	 * @ordered
	 */
	protected double rx = RX_EDEFAULT;

	/**
	 * The default value of the '{@link #getRy() <em>Ry</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRy()
	 * @generated
	 * @ordered
	 */
	protected static final double RY_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getRy() <em>Ry</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRy()
	 * @generated
	 * @ordered
	 */
	protected double ry = RY_EDEFAULT;

	/**
	 * The default value of the '{@link #getRz() <em>Rz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRz()
	 * @generated
	 * @ordered
	 */
	protected static final double RZ_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getRz() <em>Rz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRz()
	 * @generated
	 * @ordered
	 */
	protected double rz = RZ_EDEFAULT;

	/**
	 * The cached value of the '{@link #getCouplings() <em>Couplings</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCouplings()
	 * @generated
	 * @ordered
	 */
	protected EList<SpringCoupling> couplings;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected SpringImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return StructurePackage.Literals.SPRING;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Node getNode() {
		return node;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setNode(Node newNode) {
		Node oldNode = node;
		node = newNode;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SPRING__NODE, oldNode, node));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Node getTo() {
		return to;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setTo(Node newTo) {
		Node oldTo = to;
		to = newTo;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SPRING__TO, oldTo, to));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getUx() {
		return ux;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setUx(double newUx) {
		double oldUx = ux;
		ux = newUx;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SPRING__UX, oldUx, ux));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getUy() {
		return uy;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setUy(double newUy) {
		double oldUy = uy;
		uy = newUy;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SPRING__UY, oldUy, uy));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getUz() {
		return uz;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setUz(double newUz) {
		double oldUz = uz;
		uz = newUz;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SPRING__UZ, oldUz, uz));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getRx() {
		return rx;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRx(double newRx) {
		double oldRx = rx;
		rx = newRx;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SPRING__RX, oldRx, rx));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getRy() {
		return ry;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRy(double newRy) {
		double oldRy = ry;
		ry = newRy;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SPRING__RY, oldRy, ry));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getRz() {
		return rz;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRz(double newRz) {
		double oldRz = rz;
		rz = newRz;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SPRING__RZ, oldRz, rz));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<SpringCoupling> getCouplings() {
		if (couplings == null) {
			couplings = new EObjectContainmentEList<SpringCoupling>(SpringCoupling.class, this, StructurePackage.SPRING__COUPLINGS);
		}
		return couplings;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case StructurePackage.SPRING__COUPLINGS:
				return ((InternalEList<?>)getCouplings()).basicRemove(otherEnd, msgs);
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
			case StructurePackage.SPRING__NODE:
				return getNode();
			case StructurePackage.SPRING__TO:
				return getTo();
			case StructurePackage.SPRING__UX:
				return getUx();
			case StructurePackage.SPRING__UY:
				return getUy();
			case StructurePackage.SPRING__UZ:
				return getUz();
			case StructurePackage.SPRING__RX:
				return getRx();
			case StructurePackage.SPRING__RY:
				return getRy();
			case StructurePackage.SPRING__RZ:
				return getRz();
			case StructurePackage.SPRING__COUPLINGS:
				return getCouplings();
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
			case StructurePackage.SPRING__NODE:
				setNode((Node)newValue);
				return;
			case StructurePackage.SPRING__TO:
				setTo((Node)newValue);
				return;
			case StructurePackage.SPRING__UX:
				setUx((Double)newValue);
				return;
			case StructurePackage.SPRING__UY:
				setUy((Double)newValue);
				return;
			case StructurePackage.SPRING__UZ:
				setUz((Double)newValue);
				return;
			case StructurePackage.SPRING__RX:
				setRx((Double)newValue);
				return;
			case StructurePackage.SPRING__RY:
				setRy((Double)newValue);
				return;
			case StructurePackage.SPRING__RZ:
				setRz((Double)newValue);
				return;
			case StructurePackage.SPRING__COUPLINGS:
				getCouplings().clear();
				getCouplings().addAll((Collection<? extends SpringCoupling>)newValue);
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
			case StructurePackage.SPRING__NODE:
				setNode((Node)null);
				return;
			case StructurePackage.SPRING__TO:
				setTo((Node)null);
				return;
			case StructurePackage.SPRING__UX:
				setUx(UX_EDEFAULT);
				return;
			case StructurePackage.SPRING__UY:
				setUy(UY_EDEFAULT);
				return;
			case StructurePackage.SPRING__UZ:
				setUz(UZ_EDEFAULT);
				return;
			case StructurePackage.SPRING__RX:
				setRx(RX_EDEFAULT);
				return;
			case StructurePackage.SPRING__RY:
				setRy(RY_EDEFAULT);
				return;
			case StructurePackage.SPRING__RZ:
				setRz(RZ_EDEFAULT);
				return;
			case StructurePackage.SPRING__COUPLINGS:
				getCouplings().clear();
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
			case StructurePackage.SPRING__NODE:
				return node != null;
			case StructurePackage.SPRING__TO:
				return to != null;
			case StructurePackage.SPRING__UX:
				return ux != UX_EDEFAULT;
			case StructurePackage.SPRING__UY:
				return uy != UY_EDEFAULT;
			case StructurePackage.SPRING__UZ:
				return uz != UZ_EDEFAULT;
			case StructurePackage.SPRING__RX:
				return rx != RX_EDEFAULT;
			case StructurePackage.SPRING__RY:
				return ry != RY_EDEFAULT;
			case StructurePackage.SPRING__RZ:
				return rz != RZ_EDEFAULT;
			case StructurePackage.SPRING__COUPLINGS:
				return couplings != null && !couplings.isEmpty();
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
		result.append(" (ux: ");
		result.append(ux);
		result.append(", uy: ");
		result.append(uy);
		result.append(", uz: ");
		result.append(uz);
		result.append(", rx: ");
		result.append(rx);
		result.append(", ry: ");
		result.append(ry);
		result.append(", rz: ");
		result.append(rz);
		result.append(')');
		return result.toString();
	}

} //SpringImpl
