/**
 */
package org.modewright.model.structure.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructurePackage;
import org.modewright.model.structure.Support;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Support</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.impl.SupportImpl#getNode <em>Node</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SupportImpl#isUx <em>Ux</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SupportImpl#isUy <em>Uy</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SupportImpl#isUz <em>Uz</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SupportImpl#isRx <em>Rx</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SupportImpl#isRy <em>Ry</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SupportImpl#isRz <em>Rz</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SupportImpl#getElasticUx <em>Elastic Ux</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SupportImpl#getElasticUy <em>Elastic Uy</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SupportImpl#getElasticUz <em>Elastic Uz</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SupportImpl#getElasticRx <em>Elastic Rx</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SupportImpl#getElasticRy <em>Elastic Ry</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.SupportImpl#getElasticRz <em>Elastic Rz</em>}</li>
 * </ul>
 *
 * @generated
 */
public class SupportImpl extends IdentifiedImpl implements Support {
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
	 * The default value of the '{@link #isUx() <em>Ux</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isUx()
	 * @generated
	 * @ordered
	 */
	protected static final boolean UX_EDEFAULT = false;

	/**
	 * The cached value of the '{@link #isUx() <em>Ux</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isUx()
	 * @generated
	 * @ordered
	 */
	protected boolean ux = UX_EDEFAULT;

	/**
	 * The default value of the '{@link #isUy() <em>Uy</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isUy()
	 * @generated
	 * @ordered
	 */
	protected static final boolean UY_EDEFAULT = false;

	/**
	 * The cached value of the '{@link #isUy() <em>Uy</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isUy()
	 * @generated
	 * @ordered
	 */
	protected boolean uy = UY_EDEFAULT;

	/**
	 * The default value of the '{@link #isUz() <em>Uz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isUz()
	 * @generated
	 * @ordered
	 */
	protected static final boolean UZ_EDEFAULT = false;

	/**
	 * The cached value of the '{@link #isUz() <em>Uz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isUz()
	 * @generated
	 * @ordered
	 */
	protected boolean uz = UZ_EDEFAULT;

	/**
	 * The default value of the '{@link #isRx() <em>Rx</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isRx()
	 * @generated
	 * @ordered
	 */
	protected static final boolean RX_EDEFAULT = false;

	/**
	 * The cached value of the '{@link #isRx() <em>Rx</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isRx()
	 * @generated
	 * @ordered
	 */
	protected boolean rx = RX_EDEFAULT;

	/**
	 * The default value of the '{@link #isRy() <em>Ry</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isRy()
	 * @generated
	 * @ordered
	 */
	protected static final boolean RY_EDEFAULT = false;

	/**
	 * The cached value of the '{@link #isRy() <em>Ry</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isRy()
	 * @generated
	 * @ordered
	 */
	protected boolean ry = RY_EDEFAULT;

	/**
	 * The default value of the '{@link #isRz() <em>Rz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isRz()
	 * @generated
	 * @ordered
	 */
	protected static final boolean RZ_EDEFAULT = false;

	/**
	 * The cached value of the '{@link #isRz() <em>Rz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isRz()
	 * @generated
	 * @ordered
	 */
	protected boolean rz = RZ_EDEFAULT;

	/**
	 * The default value of the '{@link #getElasticUx() <em>Elastic Ux</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getElasticUx()
	 * @generated
	 * @ordered
	 */
	protected static final double ELASTIC_UX_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getElasticUx() <em>Elastic Ux</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getElasticUx()
	 * @generated
	 * @ordered
	 */
	protected double elasticUx = ELASTIC_UX_EDEFAULT;

	/**
	 * The default value of the '{@link #getElasticUy() <em>Elastic Uy</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getElasticUy()
	 * @generated
	 * @ordered
	 */
	protected static final double ELASTIC_UY_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getElasticUy() <em>Elastic Uy</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getElasticUy()
	 * @generated
	 * @ordered
	 */
	protected double elasticUy = ELASTIC_UY_EDEFAULT;

	/**
	 * The default value of the '{@link #getElasticUz() <em>Elastic Uz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getElasticUz()
	 * @generated
	 * @ordered
	 */
	protected static final double ELASTIC_UZ_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getElasticUz() <em>Elastic Uz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getElasticUz()
	 * @generated
	 * @ordered
	 */
	protected double elasticUz = ELASTIC_UZ_EDEFAULT;

	/**
	 * The default value of the '{@link #getElasticRx() <em>Elastic Rx</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getElasticRx()
	 * @generated
	 * @ordered
	 */
	protected static final double ELASTIC_RX_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getElasticRx() <em>Elastic Rx</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getElasticRx()
	 * @generated
	 * @ordered
	 */
	protected double elasticRx = ELASTIC_RX_EDEFAULT;

	/**
	 * The default value of the '{@link #getElasticRy() <em>Elastic Ry</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getElasticRy()
	 * @generated
	 * @ordered
	 */
	protected static final double ELASTIC_RY_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getElasticRy() <em>Elastic Ry</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getElasticRy()
	 * @generated
	 * @ordered
	 */
	protected double elasticRy = ELASTIC_RY_EDEFAULT;

	/**
	 * The default value of the '{@link #getElasticRz() <em>Elastic Rz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getElasticRz()
	 * @generated
	 * @ordered
	 */
	protected static final double ELASTIC_RZ_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getElasticRz() <em>Elastic Rz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getElasticRz()
	 * @generated
	 * @ordered
	 */
	protected double elasticRz = ELASTIC_RZ_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected SupportImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return StructurePackage.Literals.SUPPORT;
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
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SUPPORT__NODE, oldNode, node));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean isUx() {
		return ux;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setUx(boolean newUx) {
		boolean oldUx = ux;
		ux = newUx;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SUPPORT__UX, oldUx, ux));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean isUy() {
		return uy;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setUy(boolean newUy) {
		boolean oldUy = uy;
		uy = newUy;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SUPPORT__UY, oldUy, uy));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean isUz() {
		return uz;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setUz(boolean newUz) {
		boolean oldUz = uz;
		uz = newUz;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SUPPORT__UZ, oldUz, uz));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean isRx() {
		return rx;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRx(boolean newRx) {
		boolean oldRx = rx;
		rx = newRx;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SUPPORT__RX, oldRx, rx));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean isRy() {
		return ry;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRy(boolean newRy) {
		boolean oldRy = ry;
		ry = newRy;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SUPPORT__RY, oldRy, ry));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean isRz() {
		return rz;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRz(boolean newRz) {
		boolean oldRz = rz;
		rz = newRz;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SUPPORT__RZ, oldRz, rz));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getElasticUx() {
		return elasticUx;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setElasticUx(double newElasticUx) {
		double oldElasticUx = elasticUx;
		elasticUx = newElasticUx;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SUPPORT__ELASTIC_UX, oldElasticUx, elasticUx));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getElasticUy() {
		return elasticUy;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setElasticUy(double newElasticUy) {
		double oldElasticUy = elasticUy;
		elasticUy = newElasticUy;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SUPPORT__ELASTIC_UY, oldElasticUy, elasticUy));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getElasticUz() {
		return elasticUz;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setElasticUz(double newElasticUz) {
		double oldElasticUz = elasticUz;
		elasticUz = newElasticUz;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SUPPORT__ELASTIC_UZ, oldElasticUz, elasticUz));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getElasticRx() {
		return elasticRx;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setElasticRx(double newElasticRx) {
		double oldElasticRx = elasticRx;
		elasticRx = newElasticRx;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SUPPORT__ELASTIC_RX, oldElasticRx, elasticRx));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getElasticRy() {
		return elasticRy;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setElasticRy(double newElasticRy) {
		double oldElasticRy = elasticRy;
		elasticRy = newElasticRy;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SUPPORT__ELASTIC_RY, oldElasticRy, elasticRy));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getElasticRz() {
		return elasticRz;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setElasticRz(double newElasticRz) {
		double oldElasticRz = elasticRz;
		elasticRz = newElasticRz;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.SUPPORT__ELASTIC_RZ, oldElasticRz, elasticRz));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case StructurePackage.SUPPORT__NODE:
				return getNode();
			case StructurePackage.SUPPORT__UX:
				return isUx();
			case StructurePackage.SUPPORT__UY:
				return isUy();
			case StructurePackage.SUPPORT__UZ:
				return isUz();
			case StructurePackage.SUPPORT__RX:
				return isRx();
			case StructurePackage.SUPPORT__RY:
				return isRy();
			case StructurePackage.SUPPORT__RZ:
				return isRz();
			case StructurePackage.SUPPORT__ELASTIC_UX:
				return getElasticUx();
			case StructurePackage.SUPPORT__ELASTIC_UY:
				return getElasticUy();
			case StructurePackage.SUPPORT__ELASTIC_UZ:
				return getElasticUz();
			case StructurePackage.SUPPORT__ELASTIC_RX:
				return getElasticRx();
			case StructurePackage.SUPPORT__ELASTIC_RY:
				return getElasticRy();
			case StructurePackage.SUPPORT__ELASTIC_RZ:
				return getElasticRz();
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
			case StructurePackage.SUPPORT__NODE:
				setNode((Node)newValue);
				return;
			case StructurePackage.SUPPORT__UX:
				setUx((Boolean)newValue);
				return;
			case StructurePackage.SUPPORT__UY:
				setUy((Boolean)newValue);
				return;
			case StructurePackage.SUPPORT__UZ:
				setUz((Boolean)newValue);
				return;
			case StructurePackage.SUPPORT__RX:
				setRx((Boolean)newValue);
				return;
			case StructurePackage.SUPPORT__RY:
				setRy((Boolean)newValue);
				return;
			case StructurePackage.SUPPORT__RZ:
				setRz((Boolean)newValue);
				return;
			case StructurePackage.SUPPORT__ELASTIC_UX:
				setElasticUx((Double)newValue);
				return;
			case StructurePackage.SUPPORT__ELASTIC_UY:
				setElasticUy((Double)newValue);
				return;
			case StructurePackage.SUPPORT__ELASTIC_UZ:
				setElasticUz((Double)newValue);
				return;
			case StructurePackage.SUPPORT__ELASTIC_RX:
				setElasticRx((Double)newValue);
				return;
			case StructurePackage.SUPPORT__ELASTIC_RY:
				setElasticRy((Double)newValue);
				return;
			case StructurePackage.SUPPORT__ELASTIC_RZ:
				setElasticRz((Double)newValue);
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
			case StructurePackage.SUPPORT__NODE:
				setNode((Node)null);
				return;
			case StructurePackage.SUPPORT__UX:
				setUx(UX_EDEFAULT);
				return;
			case StructurePackage.SUPPORT__UY:
				setUy(UY_EDEFAULT);
				return;
			case StructurePackage.SUPPORT__UZ:
				setUz(UZ_EDEFAULT);
				return;
			case StructurePackage.SUPPORT__RX:
				setRx(RX_EDEFAULT);
				return;
			case StructurePackage.SUPPORT__RY:
				setRy(RY_EDEFAULT);
				return;
			case StructurePackage.SUPPORT__RZ:
				setRz(RZ_EDEFAULT);
				return;
			case StructurePackage.SUPPORT__ELASTIC_UX:
				setElasticUx(ELASTIC_UX_EDEFAULT);
				return;
			case StructurePackage.SUPPORT__ELASTIC_UY:
				setElasticUy(ELASTIC_UY_EDEFAULT);
				return;
			case StructurePackage.SUPPORT__ELASTIC_UZ:
				setElasticUz(ELASTIC_UZ_EDEFAULT);
				return;
			case StructurePackage.SUPPORT__ELASTIC_RX:
				setElasticRx(ELASTIC_RX_EDEFAULT);
				return;
			case StructurePackage.SUPPORT__ELASTIC_RY:
				setElasticRy(ELASTIC_RY_EDEFAULT);
				return;
			case StructurePackage.SUPPORT__ELASTIC_RZ:
				setElasticRz(ELASTIC_RZ_EDEFAULT);
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
			case StructurePackage.SUPPORT__NODE:
				return node != null;
			case StructurePackage.SUPPORT__UX:
				return ux != UX_EDEFAULT;
			case StructurePackage.SUPPORT__UY:
				return uy != UY_EDEFAULT;
			case StructurePackage.SUPPORT__UZ:
				return uz != UZ_EDEFAULT;
			case StructurePackage.SUPPORT__RX:
				return rx != RX_EDEFAULT;
			case StructurePackage.SUPPORT__RY:
				return ry != RY_EDEFAULT;
			case StructurePackage.SUPPORT__RZ:
				return rz != RZ_EDEFAULT;
			case StructurePackage.SUPPORT__ELASTIC_UX:
				return elasticUx != ELASTIC_UX_EDEFAULT;
			case StructurePackage.SUPPORT__ELASTIC_UY:
				return elasticUy != ELASTIC_UY_EDEFAULT;
			case StructurePackage.SUPPORT__ELASTIC_UZ:
				return elasticUz != ELASTIC_UZ_EDEFAULT;
			case StructurePackage.SUPPORT__ELASTIC_RX:
				return elasticRx != ELASTIC_RX_EDEFAULT;
			case StructurePackage.SUPPORT__ELASTIC_RY:
				return elasticRy != ELASTIC_RY_EDEFAULT;
			case StructurePackage.SUPPORT__ELASTIC_RZ:
				return elasticRz != ELASTIC_RZ_EDEFAULT;
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
		result.append(", elasticUx: ");
		result.append(elasticUx);
		result.append(", elasticUy: ");
		result.append(elasticUy);
		result.append(", elasticUz: ");
		result.append(elasticUz);
		result.append(", elasticRx: ");
		result.append(elasticRx);
		result.append(", elasticRy: ");
		result.append(elasticRy);
		result.append(", elasticRz: ");
		result.append(elasticRz);
		result.append(')');
		return result.toString();
	}

} //SupportImpl
