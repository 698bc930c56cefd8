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
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

import org.eclipse.emf.ecore.util.EObjectContainmentEList;
import org.eclipse.emf.ecore.util.InternalEList;

import org.modewright.model.structure.AnalysisSettings;
import org.modewright.model.structure.AuditSettings;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Group;
import org.modewright.model.structure.Level;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.MassFormulation;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MultiPointTie;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.RigidFloor;
import org.modewright.model.structure.RigidLink;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage;
import org.modewright.model.structure.Support;
import org.modewright.model.structure.UnitSystem;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Structural Model</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getFormatVersion <em>Format Version</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getName <em>Name</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getTitle <em>Title</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getNotes <em>Notes</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getUnits <em>Units</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getGravity <em>Gravity</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getMassFormulation <em>Mass Formulation</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#isShearDeformation <em>Shear Deformation</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getSelfMassFactor <em>Self Mass Factor</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getMaterials <em>Materials</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getFrameSections <em>Frame Sections</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getGroups <em>Groups</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getLevels <em>Levels</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getNodes <em>Nodes</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getMembers <em>Members</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getSprings <em>Springs</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getSupports <em>Supports</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getMasses <em>Masses</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getRigidFloors <em>Rigid Floors</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getRigidLinks <em>Rigid Links</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getTies <em>Ties</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getLoadPatterns <em>Load Patterns</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getAnalysis <em>Analysis</em>}</li>
 *   <li>{@link org.modewright.model.structure.impl.StructuralModelImpl#getAudit <em>Audit</em>}</li>
 * </ul>
 *
 * @generated
 */
public class StructuralModelImpl extends MinimalEObjectImpl.Container implements StructuralModel {
	/**
	 * The default value of the '{@link #getFormatVersion() <em>Format Version</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFormatVersion()
	 * @generated
	 * @ordered
	 */
	protected static final int FORMAT_VERSION_EDEFAULT = 1;

	/**
	 * The cached value of the '{@link #getFormatVersion() <em>Format Version</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFormatVersion()
	 * @generated
	 * @ordered
	 */
	protected int formatVersion = FORMAT_VERSION_EDEFAULT;

	/**
	 * The default value of the '{@link #getName() <em>Name</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getName()
	 * @generated
	 * @ordered
	 */
	protected static final String NAME_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getName() <em>Name</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getName()
	 * @generated
	 * @ordered
	 */
	protected String name = NAME_EDEFAULT;

	/**
	 * The default value of the '{@link #getTitle() <em>Title</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTitle()
	 * @generated
	 * @ordered
	 */
	protected static final String TITLE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getTitle() <em>Title</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTitle()
	 * @generated
	 * @ordered
	 */
	protected String title = TITLE_EDEFAULT;

	/**
	 * The default value of the '{@link #getNotes() <em>Notes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getNotes()
	 * @generated
	 * @ordered
	 */
	protected static final String NOTES_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getNotes() <em>Notes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getNotes()
	 * @generated
	 * @ordered
	 */
	protected String notes = NOTES_EDEFAULT;

	/**
	 * The default value of the '{@link #getUnits() <em>Units</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getUnits()
	 * @generated
	 * @ordered
	 */
	protected static final UnitSystem UNITS_EDEFAULT = UnitSystem.KILONEWTON_METRE;

	/**
	 * The cached value of the '{@link #getUnits() <em>Units</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getUnits()
	 * @generated
	 * @ordered
	 */
	protected UnitSystem units = UNITS_EDEFAULT;

	/**
	 * The default value of the '{@link #getGravity() <em>Gravity</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getGravity()
	 * @generated
	 * @ordered
	 */
	protected static final double GRAVITY_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getGravity() <em>Gravity</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getGravity()
	 * @generated
	 * @ordered
	 */
	protected double gravity = GRAVITY_EDEFAULT;

	/**
	 * The default value of the '{@link #getMassFormulation() <em>Mass Formulation</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMassFormulation()
	 * @generated
	 * @ordered
	 */
	protected static final MassFormulation MASS_FORMULATION_EDEFAULT = MassFormulation.CONSISTENT;

	/**
	 * The cached value of the '{@link #getMassFormulation() <em>Mass Formulation</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMassFormulation()
	 * @generated
	 * @ordered
	 */
	protected MassFormulation massFormulation = MASS_FORMULATION_EDEFAULT;

	/**
	 * The default value of the '{@link #isShearDeformation() <em>Shear Deformation</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isShearDeformation()
	 * @generated
	 * @ordered
	 */
	protected static final boolean SHEAR_DEFORMATION_EDEFAULT = true;

	/**
	 * The cached value of the '{@link #isShearDeformation() <em>Shear Deformation</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isShearDeformation()
	 * @generated
	 * @ordered
	 */
	protected boolean shearDeformation = SHEAR_DEFORMATION_EDEFAULT;

	/**
	 * The default value of the '{@link #getSelfMassFactor() <em>Self Mass Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSelfMassFactor()
	 * @generated
	 * @ordered
	 */
	protected static final double SELF_MASS_FACTOR_EDEFAULT = 1.0;

	/**
	 * The cached value of the '{@link #getSelfMassFactor() <em>Self Mass Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSelfMassFactor()
	 * @generated
	 * @ordered
	 */
	protected double selfMassFactor = SELF_MASS_FACTOR_EDEFAULT;

	/**
	 * The cached value of the '{@link #getMaterials() <em>Materials</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMaterials()
	 * @generated
	 * @ordered
	 */
	protected EList<Material> materials;

	/**
	 * The cached value of the '{@link #getFrameSections() <em>Frame Sections</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFrameSections()
	 * @generated
	 * @ordered
	 */
	protected EList<FrameSection> frameSections;

	/**
	 * The cached value of the '{@link #getGroups() <em>Groups</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getGroups()
	 * @generated
	 * @ordered
	 */
	protected EList<Group> groups;

	/**
	 * The cached value of the '{@link #getLevels() <em>Levels</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLevels()
	 * @generated
	 * @ordered
	 */
	protected EList<Level> levels;

	/**
	 * The cached value of the '{@link #getNodes() <em>Nodes</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getNodes()
	 * @generated
	 * @ordered
	 */
	protected EList<Node> nodes;

	/**
	 * The cached value of the '{@link #getMembers() <em>Members</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMembers()
	 * @generated
	 * @ordered
	 */
	protected EList<Member> members;

	/**
	 * The cached value of the '{@link #getSprings() <em>Springs</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSprings()
	 * @generated
	 * @ordered
	 */
	protected EList<Spring> springs;

	/**
	 * The cached value of the '{@link #getSupports() <em>Supports</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSupports()
	 * @generated
	 * @ordered
	 */
	protected EList<Support> supports;

	/**
	 * The cached value of the '{@link #getMasses() <em>Masses</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMasses()
	 * @generated
	 * @ordered
	 */
	protected EList<NodalMass> masses;

	/**
	 * The cached value of the '{@link #getRigidFloors() <em>Rigid Floors</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRigidFloors()
	 * @generated
	 * @ordered
	 */
	protected EList<RigidFloor> rigidFloors;

	/**
	 * The cached value of the '{@link #getRigidLinks() <em>Rigid Links</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRigidLinks()
	 * @generated
	 * @ordered
	 */
	protected EList<RigidLink> rigidLinks;

	/**
	 * The cached value of the '{@link #getTies() <em>Ties</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTies()
	 * @generated
	 * @ordered
	 */
	protected EList<MultiPointTie> ties;

	/**
	 * The cached value of the '{@link #getLoadPatterns() <em>Load Patterns</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLoadPatterns()
	 * @generated
	 * @ordered
	 */
	protected EList<LoadPattern> loadPatterns;

	/**
	 * The cached value of the '{@link #getAnalysis() <em>Analysis</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAnalysis()
	 * @generated
	 * @ordered
	 */
	protected AnalysisSettings analysis;

	/**
	 * The cached value of the '{@link #getAudit() <em>Audit</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAudit()
	 * @generated
	 * @ordered
	 */
	protected AuditSettings audit;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected StructuralModelImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return StructurePackage.Literals.STRUCTURAL_MODEL;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public int getFormatVersion() {
		return formatVersion;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setFormatVersion(int newFormatVersion) {
		int oldFormatVersion = formatVersion;
		formatVersion = newFormatVersion;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.STRUCTURAL_MODEL__FORMAT_VERSION, oldFormatVersion, formatVersion));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getName() {
		return name;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setName(String newName) {
		String oldName = name;
		name = newName;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.STRUCTURAL_MODEL__NAME, oldName, name));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getTitle() {
		return title;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setTitle(String newTitle) {
		String oldTitle = title;
		title = newTitle;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.STRUCTURAL_MODEL__TITLE, oldTitle, title));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getNotes() {
		return notes;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setNotes(String newNotes) {
		String oldNotes = notes;
		notes = newNotes;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.STRUCTURAL_MODEL__NOTES, oldNotes, notes));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public UnitSystem getUnits() {
		return units;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setUnits(UnitSystem newUnits) {
		UnitSystem oldUnits = units;
		units = newUnits == null ? UNITS_EDEFAULT : newUnits;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.STRUCTURAL_MODEL__UNITS, oldUnits, units));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getGravity() {
		return gravity;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setGravity(double newGravity) {
		double oldGravity = gravity;
		gravity = newGravity;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.STRUCTURAL_MODEL__GRAVITY, oldGravity, gravity));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public MassFormulation getMassFormulation() {
		return massFormulation;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setMassFormulation(MassFormulation newMassFormulation) {
		MassFormulation oldMassFormulation = massFormulation;
		massFormulation = newMassFormulation == null ? MASS_FORMULATION_EDEFAULT : newMassFormulation;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.STRUCTURAL_MODEL__MASS_FORMULATION, oldMassFormulation, massFormulation));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean isShearDeformation() {
		return shearDeformation;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setShearDeformation(boolean newShearDeformation) {
		boolean oldShearDeformation = shearDeformation;
		shearDeformation = newShearDeformation;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.STRUCTURAL_MODEL__SHEAR_DEFORMATION, oldShearDeformation, shearDeformation));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getSelfMassFactor() {
		return selfMassFactor;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setSelfMassFactor(double newSelfMassFactor) {
		double oldSelfMassFactor = selfMassFactor;
		selfMassFactor = newSelfMassFactor;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.STRUCTURAL_MODEL__SELF_MASS_FACTOR, oldSelfMassFactor, selfMassFactor));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Material> getMaterials() {
		if (materials == null) {
			materials = new EObjectContainmentEList<Material>(Material.class, this, StructurePackage.STRUCTURAL_MODEL__MATERIALS);
		}
		return materials;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<FrameSection> getFrameSections() {
		if (frameSections == null) {
			frameSections = new EObjectContainmentEList<FrameSection>(FrameSection.class, this, StructurePackage.STRUCTURAL_MODEL__FRAME_SECTIONS);
		}
		return frameSections;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Group> getGroups() {
		if (groups == null) {
			groups = new EObjectContainmentEList<Group>(Group.class, this, StructurePackage.STRUCTURAL_MODEL__GROUPS);
		}
		return groups;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Level> getLevels() {
		if (levels == null) {
			levels = new EObjectContainmentEList<Level>(Level.class, this, StructurePackage.STRUCTURAL_MODEL__LEVELS);
		}
		return levels;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Node> getNodes() {
		if (nodes == null) {
			nodes = new EObjectContainmentEList<Node>(Node.class, this, StructurePackage.STRUCTURAL_MODEL__NODES);
		}
		return nodes;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Member> getMembers() {
		if (members == null) {
			members = new EObjectContainmentEList<Member>(Member.class, this, StructurePackage.STRUCTURAL_MODEL__MEMBERS);
		}
		return members;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Spring> getSprings() {
		if (springs == null) {
			springs = new EObjectContainmentEList<Spring>(Spring.class, this, StructurePackage.STRUCTURAL_MODEL__SPRINGS);
		}
		return springs;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Support> getSupports() {
		if (supports == null) {
			supports = new EObjectContainmentEList<Support>(Support.class, this, StructurePackage.STRUCTURAL_MODEL__SUPPORTS);
		}
		return supports;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<NodalMass> getMasses() {
		if (masses == null) {
			masses = new EObjectContainmentEList<NodalMass>(NodalMass.class, this, StructurePackage.STRUCTURAL_MODEL__MASSES);
		}
		return masses;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<RigidFloor> getRigidFloors() {
		if (rigidFloors == null) {
			rigidFloors = new EObjectContainmentEList<RigidFloor>(RigidFloor.class, this, StructurePackage.STRUCTURAL_MODEL__RIGID_FLOORS);
		}
		return rigidFloors;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<RigidLink> getRigidLinks() {
		if (rigidLinks == null) {
			rigidLinks = new EObjectContainmentEList<RigidLink>(RigidLink.class, this, StructurePackage.STRUCTURAL_MODEL__RIGID_LINKS);
		}
		return rigidLinks;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<MultiPointTie> getTies() {
		if (ties == null) {
			ties = new EObjectContainmentEList<MultiPointTie>(MultiPointTie.class, this, StructurePackage.STRUCTURAL_MODEL__TIES);
		}
		return ties;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<LoadPattern> getLoadPatterns() {
		if (loadPatterns == null) {
			loadPatterns = new EObjectContainmentEList<LoadPattern>(LoadPattern.class, this, StructurePackage.STRUCTURAL_MODEL__LOAD_PATTERNS);
		}
		return loadPatterns;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public AnalysisSettings getAnalysis() {
		return analysis;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetAnalysis(AnalysisSettings newAnalysis, NotificationChain msgs) {
		AnalysisSettings oldAnalysis = analysis;
		analysis = newAnalysis;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, StructurePackage.STRUCTURAL_MODEL__ANALYSIS, oldAnalysis, newAnalysis);
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
	public void setAnalysis(AnalysisSettings newAnalysis) {
		if (newAnalysis != analysis) {
			NotificationChain msgs = null;
			if (analysis != null)
				msgs = ((InternalEObject)analysis).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - StructurePackage.STRUCTURAL_MODEL__ANALYSIS, null, msgs);
			if (newAnalysis != null)
				msgs = ((InternalEObject)newAnalysis).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - StructurePackage.STRUCTURAL_MODEL__ANALYSIS, null, msgs);
			msgs = basicSetAnalysis(newAnalysis, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.STRUCTURAL_MODEL__ANALYSIS, newAnalysis, newAnalysis));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public AuditSettings getAudit() {
		return audit;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetAudit(AuditSettings newAudit, NotificationChain msgs) {
		AuditSettings oldAudit = audit;
		audit = newAudit;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, StructurePackage.STRUCTURAL_MODEL__AUDIT, oldAudit, newAudit);
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
	public void setAudit(AuditSettings newAudit) {
		if (newAudit != audit) {
			NotificationChain msgs = null;
			if (audit != null)
				msgs = ((InternalEObject)audit).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - StructurePackage.STRUCTURAL_MODEL__AUDIT, null, msgs);
			if (newAudit != null)
				msgs = ((InternalEObject)newAudit).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - StructurePackage.STRUCTURAL_MODEL__AUDIT, null, msgs);
			msgs = basicSetAudit(newAudit, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, StructurePackage.STRUCTURAL_MODEL__AUDIT, newAudit, newAudit));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case StructurePackage.STRUCTURAL_MODEL__MATERIALS:
				return ((InternalEList<?>)getMaterials()).basicRemove(otherEnd, msgs);
			case StructurePackage.STRUCTURAL_MODEL__FRAME_SECTIONS:
				return ((InternalEList<?>)getFrameSections()).basicRemove(otherEnd, msgs);
			case StructurePackage.STRUCTURAL_MODEL__GROUPS:
				return ((InternalEList<?>)getGroups()).basicRemove(otherEnd, msgs);
			case StructurePackage.STRUCTURAL_MODEL__LEVELS:
				return ((InternalEList<?>)getLevels()).basicRemove(otherEnd, msgs);
			case StructurePackage.STRUCTURAL_MODEL__NODES:
				return ((InternalEList<?>)getNodes()).basicRemove(otherEnd, msgs);
			case StructurePackage.STRUCTURAL_MODEL__MEMBERS:
				return ((InternalEList<?>)getMembers()).basicRemove(otherEnd, msgs);
			case StructurePackage.STRUCTURAL_MODEL__SPRINGS:
				return ((InternalEList<?>)getSprings()).basicRemove(otherEnd, msgs);
			case StructurePackage.STRUCTURAL_MODEL__SUPPORTS:
				return ((InternalEList<?>)getSupports()).basicRemove(otherEnd, msgs);
			case StructurePackage.STRUCTURAL_MODEL__MASSES:
				return ((InternalEList<?>)getMasses()).basicRemove(otherEnd, msgs);
			case StructurePackage.STRUCTURAL_MODEL__RIGID_FLOORS:
				return ((InternalEList<?>)getRigidFloors()).basicRemove(otherEnd, msgs);
			case StructurePackage.STRUCTURAL_MODEL__RIGID_LINKS:
				return ((InternalEList<?>)getRigidLinks()).basicRemove(otherEnd, msgs);
			case StructurePackage.STRUCTURAL_MODEL__TIES:
				return ((InternalEList<?>)getTies()).basicRemove(otherEnd, msgs);
			case StructurePackage.STRUCTURAL_MODEL__LOAD_PATTERNS:
				return ((InternalEList<?>)getLoadPatterns()).basicRemove(otherEnd, msgs);
			case StructurePackage.STRUCTURAL_MODEL__ANALYSIS:
				return basicSetAnalysis(null, msgs);
			case StructurePackage.STRUCTURAL_MODEL__AUDIT:
				return basicSetAudit(null, msgs);
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
			case StructurePackage.STRUCTURAL_MODEL__FORMAT_VERSION:
				return getFormatVersion();
			case StructurePackage.STRUCTURAL_MODEL__NAME:
				return getName();
			case StructurePackage.STRUCTURAL_MODEL__TITLE:
				return getTitle();
			case StructurePackage.STRUCTURAL_MODEL__NOTES:
				return getNotes();
			case StructurePackage.STRUCTURAL_MODEL__UNITS:
				return getUnits();
			case StructurePackage.STRUCTURAL_MODEL__GRAVITY:
				return getGravity();
			case StructurePackage.STRUCTURAL_MODEL__MASS_FORMULATION:
				return getMassFormulation();
			case StructurePackage.STRUCTURAL_MODEL__SHEAR_DEFORMATION:
				return isShearDeformation();
			case StructurePackage.STRUCTURAL_MODEL__SELF_MASS_FACTOR:
				return getSelfMassFactor();
			case StructurePackage.STRUCTURAL_MODEL__MATERIALS:
				return getMaterials();
			case StructurePackage.STRUCTURAL_MODEL__FRAME_SECTIONS:
				return getFrameSections();
			case StructurePackage.STRUCTURAL_MODEL__GROUPS:
				return getGroups();
			case StructurePackage.STRUCTURAL_MODEL__LEVELS:
				return getLevels();
			case StructurePackage.STRUCTURAL_MODEL__NODES:
				return getNodes();
			case StructurePackage.STRUCTURAL_MODEL__MEMBERS:
				return getMembers();
			case StructurePackage.STRUCTURAL_MODEL__SPRINGS:
				return getSprings();
			case StructurePackage.STRUCTURAL_MODEL__SUPPORTS:
				return getSupports();
			case StructurePackage.STRUCTURAL_MODEL__MASSES:
				return getMasses();
			case StructurePackage.STRUCTURAL_MODEL__RIGID_FLOORS:
				return getRigidFloors();
			case StructurePackage.STRUCTURAL_MODEL__RIGID_LINKS:
				return getRigidLinks();
			case StructurePackage.STRUCTURAL_MODEL__TIES:
				return getTies();
			case StructurePackage.STRUCTURAL_MODEL__LOAD_PATTERNS:
				return getLoadPatterns();
			case StructurePackage.STRUCTURAL_MODEL__ANALYSIS:
				return getAnalysis();
			case StructurePackage.STRUCTURAL_MODEL__AUDIT:
				return getAudit();
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
			case StructurePackage.STRUCTURAL_MODEL__FORMAT_VERSION:
				setFormatVersion((Integer)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__NAME:
				setName((String)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__TITLE:
				setTitle((String)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__NOTES:
				setNotes((String)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__UNITS:
				setUnits((UnitSystem)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__GRAVITY:
				setGravity((Double)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__MASS_FORMULATION:
				setMassFormulation((MassFormulation)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__SHEAR_DEFORMATION:
				setShearDeformation((Boolean)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__SELF_MASS_FACTOR:
				setSelfMassFactor((Double)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__MATERIALS:
				getMaterials().clear();
				getMaterials().addAll((Collection<? extends Material>)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__FRAME_SECTIONS:
				getFrameSections().clear();
				getFrameSections().addAll((Collection<? extends FrameSection>)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__GROUPS:
				getGroups().clear();
				getGroups().addAll((Collection<? extends Group>)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__LEVELS:
				getLevels().clear();
				getLevels().addAll((Collection<? extends Level>)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__NODES:
				getNodes().clear();
				getNodes().addAll((Collection<? extends Node>)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__MEMBERS:
				getMembers().clear();
				getMembers().addAll((Collection<? extends Member>)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__SPRINGS:
				getSprings().clear();
				getSprings().addAll((Collection<? extends Spring>)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__SUPPORTS:
				getSupports().clear();
				getSupports().addAll((Collection<? extends Support>)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__MASSES:
				getMasses().clear();
				getMasses().addAll((Collection<? extends NodalMass>)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__RIGID_FLOORS:
				getRigidFloors().clear();
				getRigidFloors().addAll((Collection<? extends RigidFloor>)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__RIGID_LINKS:
				getRigidLinks().clear();
				getRigidLinks().addAll((Collection<? extends RigidLink>)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__TIES:
				getTies().clear();
				getTies().addAll((Collection<? extends MultiPointTie>)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__LOAD_PATTERNS:
				getLoadPatterns().clear();
				getLoadPatterns().addAll((Collection<? extends LoadPattern>)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__ANALYSIS:
				setAnalysis((AnalysisSettings)newValue);
				return;
			case StructurePackage.STRUCTURAL_MODEL__AUDIT:
				setAudit((AuditSettings)newValue);
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
			case StructurePackage.STRUCTURAL_MODEL__FORMAT_VERSION:
				setFormatVersion(FORMAT_VERSION_EDEFAULT);
				return;
			case StructurePackage.STRUCTURAL_MODEL__NAME:
				setName(NAME_EDEFAULT);
				return;
			case StructurePackage.STRUCTURAL_MODEL__TITLE:
				setTitle(TITLE_EDEFAULT);
				return;
			case StructurePackage.STRUCTURAL_MODEL__NOTES:
				setNotes(NOTES_EDEFAULT);
				return;
			case StructurePackage.STRUCTURAL_MODEL__UNITS:
				setUnits(UNITS_EDEFAULT);
				return;
			case StructurePackage.STRUCTURAL_MODEL__GRAVITY:
				setGravity(GRAVITY_EDEFAULT);
				return;
			case StructurePackage.STRUCTURAL_MODEL__MASS_FORMULATION:
				setMassFormulation(MASS_FORMULATION_EDEFAULT);
				return;
			case StructurePackage.STRUCTURAL_MODEL__SHEAR_DEFORMATION:
				setShearDeformation(SHEAR_DEFORMATION_EDEFAULT);
				return;
			case StructurePackage.STRUCTURAL_MODEL__SELF_MASS_FACTOR:
				setSelfMassFactor(SELF_MASS_FACTOR_EDEFAULT);
				return;
			case StructurePackage.STRUCTURAL_MODEL__MATERIALS:
				getMaterials().clear();
				return;
			case StructurePackage.STRUCTURAL_MODEL__FRAME_SECTIONS:
				getFrameSections().clear();
				return;
			case StructurePackage.STRUCTURAL_MODEL__GROUPS:
				getGroups().clear();
				return;
			case StructurePackage.STRUCTURAL_MODEL__LEVELS:
				getLevels().clear();
				return;
			case StructurePackage.STRUCTURAL_MODEL__NODES:
				getNodes().clear();
				return;
			case StructurePackage.STRUCTURAL_MODEL__MEMBERS:
				getMembers().clear();
				return;
			case StructurePackage.STRUCTURAL_MODEL__SPRINGS:
				getSprings().clear();
				return;
			case StructurePackage.STRUCTURAL_MODEL__SUPPORTS:
				getSupports().clear();
				return;
			case StructurePackage.STRUCTURAL_MODEL__MASSES:
				getMasses().clear();
				return;
			case StructurePackage.STRUCTURAL_MODEL__RIGID_FLOORS:
				getRigidFloors().clear();
				return;
			case StructurePackage.STRUCTURAL_MODEL__RIGID_LINKS:
				getRigidLinks().clear();
				return;
			case StructurePackage.STRUCTURAL_MODEL__TIES:
				getTies().clear();
				return;
			case StructurePackage.STRUCTURAL_MODEL__LOAD_PATTERNS:
				getLoadPatterns().clear();
				return;
			case StructurePackage.STRUCTURAL_MODEL__ANALYSIS:
				setAnalysis((AnalysisSettings)null);
				return;
			case StructurePackage.STRUCTURAL_MODEL__AUDIT:
				setAudit((AuditSettings)null);
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
			case StructurePackage.STRUCTURAL_MODEL__FORMAT_VERSION:
				return formatVersion != FORMAT_VERSION_EDEFAULT;
			case StructurePackage.STRUCTURAL_MODEL__NAME:
				return NAME_EDEFAULT == null ? name != null : !NAME_EDEFAULT.equals(name);
			case StructurePackage.STRUCTURAL_MODEL__TITLE:
				return TITLE_EDEFAULT == null ? title != null : !TITLE_EDEFAULT.equals(title);
			case StructurePackage.STRUCTURAL_MODEL__NOTES:
				return NOTES_EDEFAULT == null ? notes != null : !NOTES_EDEFAULT.equals(notes);
			case StructurePackage.STRUCTURAL_MODEL__UNITS:
				return units != UNITS_EDEFAULT;
			case StructurePackage.STRUCTURAL_MODEL__GRAVITY:
				return gravity != GRAVITY_EDEFAULT;
			case StructurePackage.STRUCTURAL_MODEL__MASS_FORMULATION:
				return massFormulation != MASS_FORMULATION_EDEFAULT;
			case StructurePackage.STRUCTURAL_MODEL__SHEAR_DEFORMATION:
				return shearDeformation != SHEAR_DEFORMATION_EDEFAULT;
			case StructurePackage.STRUCTURAL_MODEL__SELF_MASS_FACTOR:
				return selfMassFactor != SELF_MASS_FACTOR_EDEFAULT;
			case StructurePackage.STRUCTURAL_MODEL__MATERIALS:
				return materials != null && !materials.isEmpty();
			case StructurePackage.STRUCTURAL_MODEL__FRAME_SECTIONS:
				return frameSections != null && !frameSections.isEmpty();
			case StructurePackage.STRUCTURAL_MODEL__GROUPS:
				return groups != null && !groups.isEmpty();
			case StructurePackage.STRUCTURAL_MODEL__LEVELS:
				return levels != null && !levels.isEmpty();
			case StructurePackage.STRUCTURAL_MODEL__NODES:
				return nodes != null && !nodes.isEmpty();
			case StructurePackage.STRUCTURAL_MODEL__MEMBERS:
				return members != null && !members.isEmpty();
			case StructurePackage.STRUCTURAL_MODEL__SPRINGS:
				return springs != null && !springs.isEmpty();
			case StructurePackage.STRUCTURAL_MODEL__SUPPORTS:
				return supports != null && !supports.isEmpty();
			case StructurePackage.STRUCTURAL_MODEL__MASSES:
				return masses != null && !masses.isEmpty();
			case StructurePackage.STRUCTURAL_MODEL__RIGID_FLOORS:
				return rigidFloors != null && !rigidFloors.isEmpty();
			case StructurePackage.STRUCTURAL_MODEL__RIGID_LINKS:
				return rigidLinks != null && !rigidLinks.isEmpty();
			case StructurePackage.STRUCTURAL_MODEL__TIES:
				return ties != null && !ties.isEmpty();
			case StructurePackage.STRUCTURAL_MODEL__LOAD_PATTERNS:
				return loadPatterns != null && !loadPatterns.isEmpty();
			case StructurePackage.STRUCTURAL_MODEL__ANALYSIS:
				return analysis != null;
			case StructurePackage.STRUCTURAL_MODEL__AUDIT:
				return audit != null;
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
		result.append(" (formatVersion: ");
		result.append(formatVersion);
		result.append(", name: ");
		result.append(name);
		result.append(", title: ");
		result.append(title);
		result.append(", notes: ");
		result.append(notes);
		result.append(", units: ");
		result.append(units);
		result.append(", gravity: ");
		result.append(gravity);
		result.append(", massFormulation: ");
		result.append(massFormulation);
		result.append(", shearDeformation: ");
		result.append(shearDeformation);
		result.append(", selfMassFactor: ");
		result.append(selfMassFactor);
		result.append(')');
		return result.toString();
	}

} //StructuralModelImpl
