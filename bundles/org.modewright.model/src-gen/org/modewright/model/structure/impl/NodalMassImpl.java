/**
 */
package org.modewright.model.structure.impl;

import org.eclipse.emf.common.notify.Notification;
import org.eclipse.emf.common.notify.NotificationChain;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.InternalEObject;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructurePackage;
import org.modewright.model.structure.Vector;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Nodal Mass</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.impl.NodalMassImpl#getNode <em>Node</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.NodalMassImpl#getUx <em>Ux</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.NodalMassImpl#getUy <em>Uy</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.NodalMassImpl#getUz <em>Uz</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.NodalMassImpl#getRx <em>Rx</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.NodalMassImpl#getRy <em>Ry</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.NodalMassImpl#getRz <em>Rz</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.NodalMassImpl#getOffset <em>Offset</em>}</li>
 * </ul>
 *
 * @generated
 */
public class NodalMassImpl extends IdentifiedImpl implements NodalMass {
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
	 * The cached value of the '{@link #getOffset() <em>Offset</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getOffset()
	 * @generated
	 * @ordered
	 */
	protected Vector offset;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected NodalMassImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return StructurePackage.Literals.NODAL_MASS;
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
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.NODAL_MASS__NODE, oldNode, node));
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
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.NODAL_MASS__UX, oldUx, ux));
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
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.NODAL_MASS__UY, oldUy, uy));
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
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.NODAL_MASS__UZ, oldUz, uz));
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
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.NODAL_MASS__RX, oldRx, rx));
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
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.NODAL_MASS__RY, oldRy, ry));
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
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.NODAL_MASS__RZ, oldRz, rz));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Vector getOffset() {
		return offset;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetOffset(Vector newOffset, NotificationChain msgs) {
		Vector oldOffset = offset;
		offset = newOffset;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, StructurePackage.NODAL_MASS__OFFSET, oldOffset, newOffset);
			if (msgs == null) msgs = notification; else msgs.add(notification);
		}
		return msgs;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setOffset(Vector newOffset) {
		if (newOffset != offset) {
			NotificationChain msgs = null;
			if (offset != null)
				msgs = ((InternalEObject)offset).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - StructurePackage.NODAL_MASS__OFFSET, null, msgs);
			if (newOffset != null)
				msgs = ((InternalEObject)newOffset).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - StructurePackage.NODAL_MASS__OFFSET, null, msgs);
			msgs = basicSetOffset(newOffset, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.NODAL_MASS__OFFSET, newOffset, newOffset));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case StructurePackage.NODAL_MASS__OFFSET:
				return basicSetOffset(null, msgs);
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
			case StructurePackage.NODAL_MASS__NODE:
				return getNode();
			case StructurePackage.NODAL_MASS__UX:
				return getUx();
			case StructurePackage.NODAL_MASS__UY:
				return getUy();
			case StructurePackage.NODAL_MASS__UZ:
				return getUz();
			case StructurePackage.NODAL_MASS__RX:
				return getRx();
			case StructurePackage.NODAL_MASS__RY:
				return getRy();
			case StructurePackage.NODAL_MASS__RZ:
				return getRz();
			case StructurePackage.NODAL_MASS__OFFSET:
				return getOffset();
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
			case StructurePackage.NODAL_MASS__NODE:
				setNode((Node)newValue);
				return;
			case StructurePackage.NODAL_MASS__UX:
				setUx((Double)newValue);
				return;
			case StructurePackage.NODAL_MASS__UY:
				setUy((Double)newValue);
				return;
			case StructurePackage.NODAL_MASS__UZ:
				setUz((Double)newValue);
				return;
			case StructurePackage.NODAL_MASS__RX:
				setRx((Double)newValue);
				return;
			case StructurePackage.NODAL_MASS__RY:
				setRy((Double)newValue);
				return;
			case StructurePackage.NODAL_MASS__RZ:
				setRz((Double)newValue);
				return;
			case StructurePackage.NODAL_MASS__OFFSET:
				setOffset((Vector)newValue);
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
			case StructurePackage.NODAL_MASS__NODE:
				setNode((Node)null);
				return;
			case StructurePackage.NODAL_MASS__UX:
				setUx(UX_EDEFAULT);
				return;
			case StructurePackage.NODAL_MASS__UY:
				setUy(UY_EDEFAULT);
				return;
			case StructurePackage.NODAL_MASS__UZ:
				setUz(UZ_EDEFAULT);
				return;
			case StructurePackage.NODAL_MASS__RX:
				setRx(RX_EDEFAULT);
				return;
			case StructurePackage.NODAL_MASS__RY:
				setRy(RY_EDEFAULT);
				return;
			case StructurePackage.NODAL_MASS__RZ:
				setRz(RZ_EDEFAULT);
				return;
			case StructurePackage.NODAL_MASS__OFFSET:
				setOffset((Vector)null);
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
			case StructurePackage.NODAL_MASS__NODE:
				return node != null;
			case StructurePackage.NODAL_MASS__UX:
				return ux != UX_EDEFAULT;
			case StructurePackage.NODAL_MASS__UY:
				return uy != UY_EDEFAULT;
			case StructurePackage.NODAL_MASS__UZ:
				return uz != UZ_EDEFAULT;
			case StructurePackage.NODAL_MASS__RX:
				return rx != RX_EDEFAULT;
			case StructurePackage.NODAL_MASS__RY:
				return ry != RY_EDEFAULT;
			case StructurePackage.NODAL_MASS__RZ:
				return rz != RZ_EDEFAULT;
			case StructurePackage.NODAL_MASS__OFFSET:
				return offset != null;
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

} //NodalMassImpl
