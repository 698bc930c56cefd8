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

import org.eclipse.emf.ecore.util.EDataTypeUniqueEList;

import org.modewright.model.structure.Component;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructurePackage;
import org.modewright.model.structure.Vector;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Member</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#getStart <em>Start</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#getEnd <em>End</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#getSection <em>Section</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#getMaterial <em>Material</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#getRoll <em>Roll</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#getStartFree <em>Start Free</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#getEndFree <em>End Free</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#getStartRigid <em>Start Rigid</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#getEndRigid <em>End Rigid</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#getStartOffset <em>Start Offset</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#getEndOffset <em>End Offset</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#isAxialOnly <em>Axial Only</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#getAxialForce <em>Axial Force</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#getMass <em>Mass</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#getAxialFactor <em>Axial Factor</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#getShearYFactor <em>Shear YFactor</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#getShearZFactor <em>Shear ZFactor</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#getTorsionFactor <em>Torsion Factor</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#getBendingYFactor <em>Bending YFactor</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.MemberImpl#getBendingZFactor <em>Bending ZFactor</em>}</li>
 * </ul>
 *
 * @generated
 */
public class MemberImpl extends GroupedImpl implements Member {
	/**
	 * The cached value of the '{@link #getStart() <em>Start</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStart()
	 * @generated
	 * @ordered
	 */
	protected Node start;

	/**
	 * The cached value of the '{@link #getEnd() <em>End</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getEnd()
	 * @generated
	 * @ordered
	 */
	protected Node end;

	/**
	 * The cached value of the '{@link #getSection() <em>Section</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSection()
	 * @generated
	 * @ordered
	 */
	protected FrameSection section;

	/**
	 * The cached value of the '{@link #getMaterial() <em>Material</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMaterial()
	 * @generated
	 * @ordered
	 */
	protected Material material;

	/**
	 * The default value of the '{@link #getRoll() <em>Roll</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRoll()
	 * @generated
	 * @ordered
	 */
	protected static final double ROLL_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getRoll() <em>Roll</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRoll()
	 * @generated
	 * @ordered
	 */
	protected double roll = ROLL_EDEFAULT;

	/**
	 * The cached value of the '{@link #getStartFree() <em>Start Free</em>}' attribute list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStartFree()
	 * @generated
	 * @ordered
	 */
	protected EList<Component> startFree;

	/**
	 * The cached value of the '{@link #getEndFree() <em>End Free</em>}' attribute list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getEndFree()
	 * @generated
	 * @ordered
	 */
	protected EList<Component> endFree;

	/**
	 * The default value of the '{@link #getStartRigid() <em>Start Rigid</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStartRigid()
	 * @generated
	 * @ordered
	 */
	protected static final double START_RIGID_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getStartRigid() <em>Start Rigid</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStartRigid()
	 * @generated
	 * @ordered
	 */
	protected double startRigid = START_RIGID_EDEFAULT;

	/**
	 * The default value of the '{@link #getEndRigid() <em>End Rigid</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getEndRigid()
	 * @generated
	 * @ordered
	 */
	protected static final double END_RIGID_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getEndRigid() <em>End Rigid</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getEndRigid()
	 * @generated
	 * @ordered
	 */
	protected double endRigid = END_RIGID_EDEFAULT;

	/**
	 * The cached value of the '{@link #getStartOffset() <em>Start Offset</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStartOffset()
	 * @generated
	 * @ordered
	 */
	protected Vector startOffset;

	/**
	 * The cached value of the '{@link #getEndOffset() <em>End Offset</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getEndOffset()
	 * @generated
	 * @ordered
	 */
	protected Vector endOffset;

	/**
	 * The default value of the '{@link #isAxialOnly() <em>Axial Only</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isAxialOnly()
	 * @generated
	 * @ordered
	 */
	protected static final boolean AXIAL_ONLY_EDEFAULT = false;

	/**
	 * The cached value of the '{@link #isAxialOnly() <em>Axial Only</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isAxialOnly()
	 * @generated
	 * @ordered
	 */
	protected boolean axialOnly = AXIAL_ONLY_EDEFAULT;

	/**
	 * The default value of the '{@link #getAxialForce() <em>Axial Force</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAxialForce()
	 * @generated
	 * @ordered
	 */
	protected static final double AXIAL_FORCE_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getAxialForce() <em>Axial Force</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAxialForce()
	 * @generated
	 * @ordered
	 */
	protected double axialForce = AXIAL_FORCE_EDEFAULT;

	/**
	 * The default value of the '{@link #getMass() <em>Mass</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMass()
	 * @generated
	 * @ordered
	 */
	protected static final MemberMass MASS_EDEFAULT = MemberMass.INHERIT;

	/**
	 * The cached value of the '{@link #getMass() <em>Mass</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMass()
	 * @generated
	 * @ordered
	 */
	protected MemberMass mass = MASS_EDEFAULT;

	/**
	 * The default value of the '{@link #getAxialFactor() <em>Axial Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAxialFactor()
	 * @generated
	 * @ordered
	 */
	protected static final double AXIAL_FACTOR_EDEFAULT = 1.0;

	/**
	 * The cached value of the '{@link #getAxialFactor() <em>Axial Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAxialFactor()
	 * @generated
	 * @ordered
	 */
	protected double axialFactor = AXIAL_FACTOR_EDEFAULT;

	/**
	 * The default value of the '{@link #getShearYFactor() <em>Shear YFactor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getShearYFactor()
	 * @generated
	 * @ordered
	 */
	protected static final double SHEAR_YFACTOR_EDEFAULT = 1.0;

	/**
	 * The cached value of the '{@link #getShearYFactor() <em>Shear YFactor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getShearYFactor()
	 * @generated
	 * @ordered
	 */
	protected double shearYFactor = SHEAR_YFACTOR_EDEFAULT;

	/**
	 * The default value of the '{@link #getShearZFactor() <em>Shear ZFactor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getShearZFactor()
	 * @generated
	 * @ordered
	 */
	protected static final double SHEAR_ZFACTOR_EDEFAULT = 1.0;

	/**
	 * The cached value of the '{@link #getShearZFactor() <em>Shear ZFactor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getShearZFactor()
	 * @generated
	 * @ordered
	 */
	protected double shearZFactor = SHEAR_ZFACTOR_EDEFAULT;

	/**
	 * The default value of the '{@link #getTorsionFactor() <em>Torsion Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTorsionFactor()
	 * @generated
	 * @ordered
	 */
	protected static final double TORSION_FACTOR_EDEFAULT = 1.0;

	/**
	 * The cached value of the '{@link #getTorsionFactor() <em>Torsion Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTorsionFactor()
	 * @generated
	 * @ordered
	 */
	protected double torsionFactor = TORSION_FACTOR_EDEFAULT;

	/**
	 * The default value of the '{@link #getBendingYFactor() <em>Bending YFactor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBendingYFactor()
	 * @generated
	 * @ordered
	 */
	protected static final double BENDING_YFACTOR_EDEFAULT = 1.0;

	/**
	 * The cached value of the '{@link #getBendingYFactor() <em>Bending YFactor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBendingYFactor()
	 * @generated
	 * @ordered
	 */
	protected double bendingYFactor = BENDING_YFACTOR_EDEFAULT;

	/**
	 * The default value of the '{@link #getBendingZFactor() <em>Bending ZFactor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBendingZFactor()
	 * @generated
	 * @ordered
	 */
	protected static final double BENDING_ZFACTOR_EDEFAULT = 1.0;

	/**
	 * The cached value of the '{@link #getBendingZFactor() <em>Bending ZFactor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBendingZFactor()
	 * @generated
	 * @ordered
	 */
	protected double bendingZFactor = BENDING_ZFACTOR_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected MemberImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return StructurePackage.Literals.MEMBER;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Node getStart() {
		return start;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setStart(Node newStart) {
		Node oldStart = start;
		start = newStart;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__START, oldStart, start));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Node getEnd() {
		return end;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setEnd(Node newEnd) {
		Node oldEnd = end;
		end = newEnd;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__END, oldEnd, end));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public FrameSection getSection() {
		return section;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setSection(FrameSection newSection) {
		FrameSection oldSection = section;
		section = newSection;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__SECTION, oldSection, section));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Material getMaterial() {
		return material;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setMaterial(Material newMaterial) {
		Material oldMaterial = material;
		material = newMaterial;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__MATERIAL, oldMaterial, material));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getRoll() {
		return roll;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRoll(double newRoll) {
		double oldRoll = roll;
		roll = newRoll;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__ROLL, oldRoll, roll));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Component> getStartFree() {
		if (startFree == null) {
			startFree = new EDataTypeUniqueEList<Component>(Component.class, this, StructurePackage.MEMBER__START_FREE);
		}
		return startFree;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Component> getEndFree() {
		if (endFree == null) {
			endFree = new EDataTypeUniqueEList<Component>(Component.class, this, StructurePackage.MEMBER__END_FREE);
		}
		return endFree;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getStartRigid() {
		return startRigid;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setStartRigid(double newStartRigid) {
		double oldStartRigid = startRigid;
		startRigid = newStartRigid;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__START_RIGID, oldStartRigid, startRigid));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getEndRigid() {
		return endRigid;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setEndRigid(double newEndRigid) {
		double oldEndRigid = endRigid;
		endRigid = newEndRigid;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__END_RIGID, oldEndRigid, endRigid));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Vector getStartOffset() {
		return startOffset;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetStartOffset(Vector newStartOffset, NotificationChain msgs) {
		Vector oldStartOffset = startOffset;
		startOffset = newStartOffset;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__START_OFFSET, oldStartOffset, newStartOffset);
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
	public void setStartOffset(Vector newStartOffset) {
		if (newStartOffset != startOffset) {
			NotificationChain msgs = null;
			if (startOffset != null)
				msgs = ((InternalEObject)startOffset).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - StructurePackage.MEMBER__START_OFFSET, null, msgs);
			if (newStartOffset != null)
				msgs = ((InternalEObject)newStartOffset).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - StructurePackage.MEMBER__START_OFFSET, null, msgs);
			msgs = basicSetStartOffset(newStartOffset, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__START_OFFSET, newStartOffset, newStartOffset));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Vector getEndOffset() {
		return endOffset;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetEndOffset(Vector newEndOffset, NotificationChain msgs) {
		Vector oldEndOffset = endOffset;
		endOffset = newEndOffset;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__END_OFFSET, oldEndOffset, newEndOffset);
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
	public void setEndOffset(Vector newEndOffset) {
		if (newEndOffset != endOffset) {
			NotificationChain msgs = null;
			if (endOffset != null)
				msgs = ((InternalEObject)endOffset).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - StructurePackage.MEMBER__END_OFFSET, null, msgs);
			if (newEndOffset != null)
				msgs = ((InternalEObject)newEndOffset).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - StructurePackage.MEMBER__END_OFFSET, null, msgs);
			msgs = basicSetEndOffset(newEndOffset, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__END_OFFSET, newEndOffset, newEndOffset));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean isAxialOnly() {
		return axialOnly;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setAxialOnly(boolean newAxialOnly) {
		boolean oldAxialOnly = axialOnly;
		axialOnly = newAxialOnly;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__AXIAL_ONLY, oldAxialOnly, axialOnly));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getAxialForce() {
		return axialForce;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setAxialForce(double newAxialForce) {
		double oldAxialForce = axialForce;
		axialForce = newAxialForce;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__AXIAL_FORCE, oldAxialForce, axialForce));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public MemberMass getMass() {
		return mass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setMass(MemberMass newMass) {
		MemberMass oldMass = mass;
		mass = newMass == null ? MASS_EDEFAULT : newMass;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__MASS, oldMass, mass));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getAxialFactor() {
		return axialFactor;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setAxialFactor(double newAxialFactor) {
		double oldAxialFactor = axialFactor;
		axialFactor = newAxialFactor;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__AXIAL_FACTOR, oldAxialFactor, axialFactor));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getShearYFactor() {
		return shearYFactor;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setShearYFactor(double newShearYFactor) {
		double oldShearYFactor = shearYFactor;
		shearYFactor = newShearYFactor;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__SHEAR_YFACTOR, oldShearYFactor, shearYFactor));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getShearZFactor() {
		return shearZFactor;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setShearZFactor(double newShearZFactor) {
		double oldShearZFactor = shearZFactor;
		shearZFactor = newShearZFactor;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__SHEAR_ZFACTOR, oldShearZFactor, shearZFactor));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getTorsionFactor() {
		return torsionFactor;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setTorsionFactor(double newTorsionFactor) {
		double oldTorsionFactor = torsionFactor;
		torsionFactor = newTorsionFactor;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__TORSION_FACTOR, oldTorsionFactor, torsionFactor));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getBendingYFactor() {
		return bendingYFactor;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setBendingYFactor(double newBendingYFactor) {
		double oldBendingYFactor = bendingYFactor;
		bendingYFactor = newBendingYFactor;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__BENDING_YFACTOR, oldBendingYFactor, bendingYFactor));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getBendingZFactor() {
		return bendingZFactor;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setBendingZFactor(double newBendingZFactor) {
		double oldBendingZFactor = bendingZFactor;
		bendingZFactor = newBendingZFactor;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.MEMBER__BENDING_ZFACTOR, oldBendingZFactor, bendingZFactor));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case StructurePackage.MEMBER__START_OFFSET:
				return basicSetStartOffset(null, msgs);
			case StructurePackage.MEMBER__END_OFFSET:
				return basicSetEndOffset(null, msgs);
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
			case StructurePackage.MEMBER__START:
				return getStart();
			case StructurePackage.MEMBER__END:
				return getEnd();
			case StructurePackage.MEMBER__SECTION:
				return getSection();
			case StructurePackage.MEMBER__MATERIAL:
				return getMaterial();
			case StructurePackage.MEMBER__ROLL:
				return getRoll();
			case StructurePackage.MEMBER__START_FREE:
				return getStartFree();
			case StructurePackage.MEMBER__END_FREE:
				return getEndFree();
			case StructurePackage.MEMBER__START_RIGID:
				return getStartRigid();
			case StructurePackage.MEMBER__END_RIGID:
				return getEndRigid();
			case StructurePackage.MEMBER__START_OFFSET:
				return getStartOffset();
			case StructurePackage.MEMBER__END_OFFSET:
				return getEndOffset();
			case StructurePackage.MEMBER__AXIAL_ONLY:
				return isAxialOnly();
			case StructurePackage.MEMBER__AXIAL_FORCE:
				return getAxialForce();
			case StructurePackage.MEMBER__MASS:
				return getMass();
			case StructurePackage.MEMBER__AXIAL_FACTOR:
				return getAxialFactor();
			case StructurePackage.MEMBER__SHEAR_YFACTOR:
				return getShearYFactor();
			case StructurePackage.MEMBER__SHEAR_ZFACTOR:
				return getShearZFactor();
			case StructurePackage.MEMBER__TORSION_FACTOR:
				return getTorsionFactor();
			case StructurePackage.MEMBER__BENDING_YFACTOR:
				return getBendingYFactor();
			case StructurePackage.MEMBER__BENDING_ZFACTOR:
				return getBendingZFactor();
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
			case StructurePackage.MEMBER__START:
				setStart((Node)newValue);
				return;
			case StructurePackage.MEMBER__END:
				setEnd((Node)newValue);
				return;
			case StructurePackage.MEMBER__SECTION:
				setSection((FrameSection)newValue);
				return;
			case StructurePackage.MEMBER__MATERIAL:
				setMaterial((Material)newValue);
				return;
			case StructurePackage.MEMBER__ROLL:
				setRoll((Double)newValue);
				return;
			case StructurePackage.MEMBER__START_FREE:
				getStartFree().clear();
				getStartFree().addAll((Collection<? extends Component>)newValue);
				return;
			case StructurePackage.MEMBER__END_FREE:
				getEndFree().clear();
				getEndFree().addAll((Collection<? extends Component>)newValue);
				return;
			case StructurePackage.MEMBER__START_RIGID:
				setStartRigid((Double)newValue);
				return;
			case StructurePackage.MEMBER__END_RIGID:
				setEndRigid((Double)newValue);
				return;
			case StructurePackage.MEMBER__START_OFFSET:
				setStartOffset((Vector)newValue);
				return;
			case StructurePackage.MEMBER__END_OFFSET:
				setEndOffset((Vector)newValue);
				return;
			case StructurePackage.MEMBER__AXIAL_ONLY:
				setAxialOnly((Boolean)newValue);
				return;
			case StructurePackage.MEMBER__AXIAL_FORCE:
				setAxialForce((Double)newValue);
				return;
			case StructurePackage.MEMBER__MASS:
				setMass((MemberMass)newValue);
				return;
			case StructurePackage.MEMBER__AXIAL_FACTOR:
				setAxialFactor((Double)newValue);
				return;
			case StructurePackage.MEMBER__SHEAR_YFACTOR:
				setShearYFactor((Double)newValue);
				return;
			case StructurePackage.MEMBER__SHEAR_ZFACTOR:
				setShearZFactor((Double)newValue);
				return;
			case StructurePackage.MEMBER__TORSION_FACTOR:
				setTorsionFactor((Double)newValue);
				return;
			case StructurePackage.MEMBER__BENDING_YFACTOR:
				setBendingYFactor((Double)newValue);
				return;
			case StructurePackage.MEMBER__BENDING_ZFACTOR:
				setBendingZFactor((Double)newValue);
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
			case StructurePackage.MEMBER__START:
				setStart((Node)null);
				return;
			case StructurePackage.MEMBER__END:
				setEnd((Node)null);
				return;
			case StructurePackage.MEMBER__SECTION:
				setSection((FrameSection)null);
				return;
			case StructurePackage.MEMBER__MATERIAL:
				setMaterial((Material)null);
				return;
			case StructurePackage.MEMBER__ROLL:
				setRoll(ROLL_EDEFAULT);
				return;
			case StructurePackage.MEMBER__START_FREE:
				getStartFree().clear();
				return;
			case StructurePackage.MEMBER__END_FREE:
				getEndFree().clear();
				return;
			case StructurePackage.MEMBER__START_RIGID:
				setStartRigid(START_RIGID_EDEFAULT);
				return;
			case StructurePackage.MEMBER__END_RIGID:
				setEndRigid(END_RIGID_EDEFAULT);
				return;
			case StructurePackage.MEMBER__START_OFFSET:
				setStartOffset((Vector)null);
				return;
			case StructurePackage.MEMBER__END_OFFSET:
				setEndOffset((Vector)null);
				return;
			case StructurePackage.MEMBER__AXIAL_ONLY:
				setAxialOnly(AXIAL_ONLY_EDEFAULT);
				return;
			case StructurePackage.MEMBER__AXIAL_FORCE:
				setAxialForce(AXIAL_FORCE_EDEFAULT);
				return;
			case StructurePackage.MEMBER__MASS:
				setMass(MASS_EDEFAULT);
				return;
			case StructurePackage.MEMBER__AXIAL_FACTOR:
				setAxialFactor(AXIAL_FACTOR_EDEFAULT);
				return;
			case StructurePackage.MEMBER__SHEAR_YFACTOR:
				setShearYFactor(SHEAR_YFACTOR_EDEFAULT);
				return;
			case StructurePackage.MEMBER__SHEAR_ZFACTOR:
				setShearZFactor(SHEAR_ZFACTOR_EDEFAULT);
				return;
			case StructurePackage.MEMBER__TORSION_FACTOR:
				setTorsionFactor(TORSION_FACTOR_EDEFAULT);
				return;
			case StructurePackage.MEMBER__BENDING_YFACTOR:
				setBendingYFactor(BENDING_YFACTOR_EDEFAULT);
				return;
			case StructurePackage.MEMBER__BENDING_ZFACTOR:
				setBendingZFactor(BENDING_ZFACTOR_EDEFAULT);
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
			case StructurePackage.MEMBER__START:
				return start != null;
			case StructurePackage.MEMBER__END:
				return end != null;
			case StructurePackage.MEMBER__SECTION:
				return section != null;
			case StructurePackage.MEMBER__MATERIAL:
				return material != null;
			case StructurePackage.MEMBER__ROLL:
				return roll != ROLL_EDEFAULT;
			case StructurePackage.MEMBER__START_FREE:
				return startFree != null && !startFree.isEmpty();
			case StructurePackage.MEMBER__END_FREE:
				return endFree != null && !endFree.isEmpty();
			case StructurePackage.MEMBER__START_RIGID:
				return startRigid != START_RIGID_EDEFAULT;
			case StructurePackage.MEMBER__END_RIGID:
				return endRigid != END_RIGID_EDEFAULT;
			case StructurePackage.MEMBER__START_OFFSET:
				return startOffset != null;
			case StructurePackage.MEMBER__END_OFFSET:
				return endOffset != null;
			case StructurePackage.MEMBER__AXIAL_ONLY:
				return axialOnly != AXIAL_ONLY_EDEFAULT;
			case StructurePackage.MEMBER__AXIAL_FORCE:
				return axialForce != AXIAL_FORCE_EDEFAULT;
			case StructurePackage.MEMBER__MASS:
				return mass != MASS_EDEFAULT;
			case StructurePackage.MEMBER__AXIAL_FACTOR:
				return axialFactor != AXIAL_FACTOR_EDEFAULT;
			case StructurePackage.MEMBER__SHEAR_YFACTOR:
				return shearYFactor != SHEAR_YFACTOR_EDEFAULT;
			case StructurePackage.MEMBER__SHEAR_ZFACTOR:
				return shearZFactor != SHEAR_ZFACTOR_EDEFAULT;
			case StructurePackage.MEMBER__TORSION_FACTOR:
				return torsionFactor != TORSION_FACTOR_EDEFAULT;
			case StructurePackage.MEMBER__BENDING_YFACTOR:
				return bendingYFactor != BENDING_YFACTOR_EDEFAULT;
			case StructurePackage.MEMBER__BENDING_ZFACTOR:
				return bendingZFactor != BENDING_ZFACTOR_EDEFAULT;
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
		result.append(" (roll: ");
		result.append(roll);
		result.append(", startFree: ");
		result.append(startFree);
		result.append(", endFree: ");
		result.append(endFree);
		result.append(", startRigid: ");
		result.append(startRigid);
		result.append(", endRigid: ");
		result.append(endRigid);
		result.append(", axialOnly: ");
		result.append(axialOnly);
		result.append(", axialForce: ");
		result.append(axialForce);
		result.append(", mass: ");
		result.append(mass);
		result.append(", axialFactor: ");
		result.append(axialFactor);
		result.append(", shearYFactor: ");
		result.append(shearYFactor);
		result.append(", shearZFactor: ");
		result.append(shearZFactor);
		result.append(", torsionFactor: ");
		result.append(torsionFactor);
		result.append(", bendingYFactor: ");
		result.append(bendingYFactor);
		result.append(", bendingZFactor: ");
		result.append(bendingZFactor);
		result.append(')');
		return result.toString();
	}

} //MemberImpl
