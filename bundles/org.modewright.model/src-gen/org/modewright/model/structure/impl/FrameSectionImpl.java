/**
 */
package org.modewright.model.structure.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.StructurePackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Frame Section</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.impl.FrameSectionImpl#getArea <em>Area</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.FrameSectionImpl#getIy <em>Iy</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.FrameSectionImpl#getIz <em>Iz</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.FrameSectionImpl#getTorsion <em>Torsion</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.FrameSectionImpl#getShearAreaY <em>Shear Area Y</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.FrameSectionImpl#getShearAreaZ <em>Shear Area Z</em>}</li>
 * </ul>
 *
 * @generated
 */
public class FrameSectionImpl extends IdentifiedImpl implements FrameSection {
	/**
	 * The default value of the '{@link #getArea() <em>Area</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getArea()
	 * @generated
	 * @ordered
	 */
	protected static final double AREA_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getArea() <em>Area</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getArea()
	 * @generated
	 * @ordered
	 */
	protected double area = AREA_EDEFAULT;

	/**
	 * The default value of the '{@link #getIy() <em>Iy</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getIy()
	 * @generated
	 * @ordered
	 */
	protected static final double IY_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getIy() <em>Iy</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getIy()
	 * @generated
	 * @ordered
	 */
	protected double iy = IY_EDEFAULT;

	/**
	 * The default value of the '{@link #getIz() <em>Iz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getIz()
	 * @generated
	 * @ordered
	 */
	protected static final double IZ_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getIz() <em>Iz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getIz()
	 * @generated
	 * @ordered
	 */
	protected double iz = IZ_EDEFAULT;

	/**
	 * The default value of the '{@link #getTorsion() <em>Torsion</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTorsion()
	 * @generated
	 * @ordered
	 */
	protected static final double TORSION_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getTorsion() <em>Torsion</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTorsion()
	 * @generated
	 * @ordered
	 */
	protected double torsion = TORSION_EDEFAULT;

	/**
	 * The default value of the '{@link #getShearAreaY() <em>Shear Area Y</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getShearAreaY()
	 * @generated
	 * @ordered
	 */
	protected static final double SHEAR_AREA_Y_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getShearAreaY() <em>Shear Area Y</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getShearAreaY()
	 * @generated
	 * @ordered
	 */
	protected double shearAreaY = SHEAR_AREA_Y_EDEFAULT;

	/**
	 * The default value of the '{@link #getShearAreaZ() <em>Shear Area Z</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getShearAreaZ()
	 * @generated
	 * @ordered
	 */
	protected static final double SHEAR_AREA_Z_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getShearAreaZ() <em>Shear Area Z</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getShearAreaZ()
	 * @generated
	 * @ordered
	 */
	protected double shearAreaZ = SHEAR_AREA_Z_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected FrameSectionImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return StructurePackage.Literals.FRAME_SECTION;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getArea() {
		return area;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setArea(double newArea) {
		double oldArea = area;
		area = newArea;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.FRAME_SECTION__AREA, oldArea, area));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getIy() {
		return iy;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setIy(double newIy) {
		double oldIy = iy;
		iy = newIy;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.FRAME_SECTION__IY, oldIy, iy));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getIz() {
		return iz;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setIz(double newIz) {
		double oldIz = iz;
		iz = newIz;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.FRAME_SECTION__IZ, oldIz, iz));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getTorsion() {
		return torsion;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setTorsion(double newTorsion) {
		double oldTorsion = torsion;
		torsion = newTorsion;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.FRAME_SECTION__TORSION, oldTorsion, torsion));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getShearAreaY() {
		return shearAreaY;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setShearAreaY(double newShearAreaY) {
		double oldShearAreaY = shearAreaY;
		shearAreaY = newShearAreaY;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.FRAME_SECTION__SHEAR_AREA_Y, oldShearAreaY, shearAreaY));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getShearAreaZ() {
		return shearAreaZ;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setShearAreaZ(double newShearAreaZ) {
		double oldShearAreaZ = shearAreaZ;
		shearAreaZ = newShearAreaZ;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.FRAME_SECTION__SHEAR_AREA_Z, oldShearAreaZ, shearAreaZ));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case StructurePackage.FRAME_SECTION__AREA:
				return getArea();
			case StructurePackage.FRAME_SECTION__IY:
				return getIy();
			case StructurePackage.FRAME_SECTION__IZ:
				return getIz();
			case StructurePackage.FRAME_SECTION__TORSION:
				return getTorsion();
			case StructurePackage.FRAME_SECTION__SHEAR_AREA_Y:
				return getShearAreaY();
			case StructurePackage.FRAME_SECTION__SHEAR_AREA_Z:
				return getShearAreaZ();
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
			case StructurePackage.FRAME_SECTION__AREA:
				setArea((Double)newValue);
				return;
			case StructurePackage.FRAME_SECTION__IY:
				setIy((Double)newValue);
				return;
			case StructurePackage.FRAME_SECTION__IZ:
				setIz((Double)newValue);
				return;
			case StructurePackage.FRAME_SECTION__TORSION:
				setTorsion((Double)newValue);
				return;
			case StructurePackage.FRAME_SECTION__SHEAR_AREA_Y:
				setShearAreaY((Double)newValue);
				return;
			case StructurePackage.FRAME_SECTION__SHEAR_AREA_Z:
				setShearAreaZ((Double)newValue);
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
			case StructurePackage.FRAME_SECTION__AREA:
				setArea(AREA_EDEFAULT);
				return;
			case StructurePackage.FRAME_SECTION__IY:
				setIy(IY_EDEFAULT);
				return;
			case StructurePackage.FRAME_SECTION__IZ:
				setIz(IZ_EDEFAULT);
				return;
			case StructurePackage.FRAME_SECTION__TORSION:
				setTorsion(TORSION_EDEFAULT);
				return;
			case StructurePackage.FRAME_SECTION__SHEAR_AREA_Y:
				setShearAreaY(SHEAR_AREA_Y_EDEFAULT);
				return;
			case StructurePackage.FRAME_SECTION__SHEAR_AREA_Z:
				setShearAreaZ(SHEAR_AREA_Z_EDEFAULT);
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
			case StructurePackage.FRAME_SECTION__AREA:
				return area != AREA_EDEFAULT;
			case StructurePackage.FRAME_SECTION__IY:
				return iy != IY_EDEFAULT;
			case StructurePackage.FRAME_SECTION__IZ:
				return iz != IZ_EDEFAULT;
			case StructurePackage.FRAME_SECTION__TORSION:
				return torsion != TORSION_EDEFAULT;
			case StructurePackage.FRAME_SECTION__SHEAR_AREA_Y:
				return shearAreaY != SHEAR_AREA_Y_EDEFAULT;
			case StructurePackage.FRAME_SECTION__SHEAR_AREA_Z:
				return shearAreaZ != SHEAR_AREA_Z_EDEFAULT;
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
		result.append(" (area: ");
		result.append(area);
		result.append(", iy: ");
		result.append(iy);
		result.append(", iz: ");
		result.append(iz);
		result.append(", torsion: ");
		result.append(torsion);
		result.append(", shearAreaY: ");
		result.append(shearAreaY);
		result.append(", shearAreaZ: ");
		result.append(shearAreaZ);
		result.append(')');
		return result.toString();
	}

} //FrameSectionImpl
