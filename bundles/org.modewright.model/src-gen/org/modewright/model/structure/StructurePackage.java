/**
 */
package org.modewright.model.structure;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EPackage;
import org.eclipse.emf.ecore.EReference;

/**
 * <!-- begin-user-doc -->
 * The <b>Package</b> for the model.
 * It contains accessors for the meta objects to represent
 * <ul>
 *   <li>each class,</li>
 *   <li>each feature of each class,</li>
 *   <li>each enum,</li>
 *   <li>and each data type</li>
 * </ul>
 * <!-- end-user-doc -->
 * @see org.modewright.model.structure.StructureFactory
 * @generated
 */
public interface StructurePackage extends EPackage {
	/**
	 * The package name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	String eNAME = "structure";

	/**
	 * The package namespace URI.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	String eNS_URI = "urn:modewright:structure:1";

	/**
	 * The package namespace name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	String eNS_PREFIX = "structure";

	/**
	 * The singleton instance of the package.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	StructurePackage eINSTANCE = org.modewright.model.structure.impl.StructurePackageImpl.init();

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.IdentifiedImpl <em>Identified</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.IdentifiedImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getIdentified()
	 * @generated
	 */
	int IDENTIFIED = 0;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int IDENTIFIED__ID = 0;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int IDENTIFIED__NAME = 1;

	/**
	 * The number of structural features of the '<em>Identified</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int IDENTIFIED_FEATURE_COUNT = 2;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.StructuralModelImpl <em>Structural Model</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.StructuralModelImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getStructuralModel()
	 * @generated
	 */
	int STRUCTURAL_MODEL = 1;

	/**
	 * The feature id for the '<em><b>Format Version</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__FORMAT_VERSION = 0;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__NAME = 1;

	/**
	 * The feature id for the '<em><b>Title</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__TITLE = 2;

	/**
	 * The feature id for the '<em><b>Notes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__NOTES = 3;

	/**
	 * The feature id for the '<em><b>Units</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__UNITS = 4;

	/**
	 * The feature id for the '<em><b>Gravity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__GRAVITY = 5;

	/**
	 * The feature id for the '<em><b>Mass Formulation</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__MASS_FORMULATION = 6;

	/**
	 * The feature id for the '<em><b>Shear Deformation</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__SHEAR_DEFORMATION = 7;

	/**
	 * The feature id for the '<em><b>Self Mass Factor</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__SELF_MASS_FACTOR = 8;

	/**
	 * The feature id for the '<em><b>Materials</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__MATERIALS = 9;

	/**
	 * The feature id for the '<em><b>Frame Sections</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__FRAME_SECTIONS = 10;

	/**
	 * The feature id for the '<em><b>Groups</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__GROUPS = 11;

	/**
	 * The feature id for the '<em><b>Levels</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__LEVELS = 12;

	/**
	 * The feature id for the '<em><b>Nodes</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__NODES = 13;

	/**
	 * The feature id for the '<em><b>Members</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__MEMBERS = 14;

	/**
	 * The feature id for the '<em><b>Springs</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__SPRINGS = 15;

	/**
	 * The feature id for the '<em><b>Supports</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__SUPPORTS = 16;

	/**
	 * The feature id for the '<em><b>Masses</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__MASSES = 17;

	/**
	 * The feature id for the '<em><b>Rigid Floors</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__RIGID_FLOORS = 18;

	/**
	 * The feature id for the '<em><b>Rigid Links</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__RIGID_LINKS = 19;

	/**
	 * The feature id for the '<em><b>Ties</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__TIES = 20;

	/**
	 * The feature id for the '<em><b>Load Patterns</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__LOAD_PATTERNS = 21;

	/**
	 * The feature id for the '<em><b>Analysis</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__ANALYSIS = 22;

	/**
	 * The feature id for the '<em><b>Audit</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL__AUDIT = 23;

	/**
	 * The number of structural features of the '<em>Structural Model</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURAL_MODEL_FEATURE_COUNT = 24;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.NodeImpl <em>Node</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.NodeImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getNode()
	 * @generated
	 */
	int NODE = 2;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODE__ID = IDENTIFIED__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODE__NAME = IDENTIFIED__NAME;

	/**
	 * The feature id for the '<em><b>X</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODE__X = IDENTIFIED_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Y</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODE__Y = IDENTIFIED_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Z</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODE__Z = IDENTIFIED_FEATURE_COUNT + 2;

	/**
	 * The number of structural features of the '<em>Node</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODE_FEATURE_COUNT = IDENTIFIED_FEATURE_COUNT + 3;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.MaterialImpl <em>Material</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.MaterialImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getMaterial()
	 * @generated
	 */
	int MATERIAL = 3;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL__ID = IDENTIFIED__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL__NAME = IDENTIFIED__NAME;

	/**
	 * The feature id for the '<em><b>Young</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL__YOUNG = IDENTIFIED_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Poisson</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL__POISSON = IDENTIFIED_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Density</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL__DENSITY = IDENTIFIED_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Shear</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL__SHEAR = IDENTIFIED_FEATURE_COUNT + 3;

	/**
	 * The number of structural features of the '<em>Material</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MATERIAL_FEATURE_COUNT = IDENTIFIED_FEATURE_COUNT + 4;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.FrameSectionImpl <em>Frame Section</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.FrameSectionImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getFrameSection()
	 * @generated
	 */
	int FRAME_SECTION = 4;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FRAME_SECTION__ID = IDENTIFIED__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FRAME_SECTION__NAME = IDENTIFIED__NAME;

	/**
	 * The feature id for the '<em><b>Area</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FRAME_SECTION__AREA = IDENTIFIED_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Iy</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FRAME_SECTION__IY = IDENTIFIED_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Iz</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FRAME_SECTION__IZ = IDENTIFIED_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Torsion</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FRAME_SECTION__TORSION = IDENTIFIED_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Shear Area Y</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FRAME_SECTION__SHEAR_AREA_Y = IDENTIFIED_FEATURE_COUNT + 4;

	/**
	 * The feature id for the '<em><b>Shear Area Z</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FRAME_SECTION__SHEAR_AREA_Z = IDENTIFIED_FEATURE_COUNT + 5;

	/**
	 * The number of structural features of the '<em>Frame Section</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FRAME_SECTION_FEATURE_COUNT = IDENTIFIED_FEATURE_COUNT + 6;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.GroupImpl <em>Group</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.GroupImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getGroup()
	 * @generated
	 */
	int GROUP = 5;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP__ID = IDENTIFIED__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP__NAME = IDENTIFIED__NAME;

	/**
	 * The feature id for the '<em><b>Description</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP__DESCRIPTION = IDENTIFIED_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Group</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUP_FEATURE_COUNT = IDENTIFIED_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.LevelImpl <em>Level</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.LevelImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getLevel()
	 * @generated
	 */
	int LEVEL = 6;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEVEL__ID = IDENTIFIED__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEVEL__NAME = IDENTIFIED__NAME;

	/**
	 * The feature id for the '<em><b>Elevation</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEVEL__ELEVATION = IDENTIFIED_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Level</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LEVEL_FEATURE_COUNT = IDENTIFIED_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.GroupedImpl <em>Grouped</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.GroupedImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getGrouped()
	 * @generated
	 */
	int GROUPED = 7;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUPED__ID = IDENTIFIED__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUPED__NAME = IDENTIFIED__NAME;

	/**
	 * The feature id for the '<em><b>Group</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUPED__GROUP = IDENTIFIED_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Grouped</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUPED_FEATURE_COUNT = IDENTIFIED_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.VectorImpl <em>Vector</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.VectorImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getVector()
	 * @generated
	 */
	int VECTOR = 8;

	/**
	 * The feature id for the '<em><b>X</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int VECTOR__X = 0;

	/**
	 * The feature id for the '<em><b>Y</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int VECTOR__Y = 1;

	/**
	 * The feature id for the '<em><b>Z</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int VECTOR__Z = 2;

	/**
	 * The number of structural features of the '<em>Vector</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int VECTOR_FEATURE_COUNT = 3;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.MemberImpl <em>Member</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.MemberImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getMember()
	 * @generated
	 */
	int MEMBER = 9;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__ID = GROUPED__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__NAME = GROUPED__NAME;

	/**
	 * The feature id for the '<em><b>Group</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__GROUP = GROUPED__GROUP;

	/**
	 * The feature id for the '<em><b>Start</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__START = GROUPED_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>End</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__END = GROUPED_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Section</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__SECTION = GROUPED_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Material</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__MATERIAL = GROUPED_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Roll</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__ROLL = GROUPED_FEATURE_COUNT + 4;

	/**
	 * The feature id for the '<em><b>Start Free</b></em>' attribute list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__START_FREE = GROUPED_FEATURE_COUNT + 5;

	/**
	 * The feature id for the '<em><b>End Free</b></em>' attribute list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__END_FREE = GROUPED_FEATURE_COUNT + 6;

	/**
	 * The feature id for the '<em><b>Start Rigid</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__START_RIGID = GROUPED_FEATURE_COUNT + 7;

	/**
	 * The feature id for the '<em><b>End Rigid</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__END_RIGID = GROUPED_FEATURE_COUNT + 8;

	/**
	 * The feature id for the '<em><b>Start Offset</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__START_OFFSET = GROUPED_FEATURE_COUNT + 9;

	/**
	 * The feature id for the '<em><b>End Offset</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__END_OFFSET = GROUPED_FEATURE_COUNT + 10;

	/**
	 * The feature id for the '<em><b>Axial Only</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__AXIAL_ONLY = GROUPED_FEATURE_COUNT + 11;

	/**
	 * The feature id for the '<em><b>Axial Force</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__AXIAL_FORCE = GROUPED_FEATURE_COUNT + 12;

	/**
	 * The feature id for the '<em><b>Mass</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__MASS = GROUPED_FEATURE_COUNT + 13;

	/**
	 * The feature id for the '<em><b>Axial Factor</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__AXIAL_FACTOR = GROUPED_FEATURE_COUNT + 14;

	/**
	 * The feature id for the '<em><b>Shear YFactor</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__SHEAR_YFACTOR = GROUPED_FEATURE_COUNT + 15;

	/**
	 * The feature id for the '<em><b>Shear ZFactor</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__SHEAR_ZFACTOR = GROUPED_FEATURE_COUNT + 16;

	/**
	 * The feature id for the '<em><b>Torsion Factor</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__TORSION_FACTOR = GROUPED_FEATURE_COUNT + 17;

	/**
	 * The feature id for the '<em><b>Bending YFactor</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__BENDING_YFACTOR = GROUPED_FEATURE_COUNT + 18;

	/**
	 * The feature id for the '<em><b>Bending ZFactor</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER__BENDING_ZFACTOR = GROUPED_FEATURE_COUNT + 19;

	/**
	 * The number of structural features of the '<em>Member</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER_FEATURE_COUNT = GROUPED_FEATURE_COUNT + 20;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.SpringCouplingImpl <em>Spring Coupling</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.SpringCouplingImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getSpringCoupling()
	 * @generated
	 */
	int SPRING_COUPLING = 10;

	/**
	 * The feature id for the '<em><b>First</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SPRING_COUPLING__FIRST = 0;

	/**
	 * The feature id for the '<em><b>Second</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SPRING_COUPLING__SECOND = 1;

	/**
	 * The feature id for the '<em><b>Stiffness</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SPRING_COUPLING__STIFFNESS = 2;

	/**
	 * The number of structural features of the '<em>Spring Coupling</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SPRING_COUPLING_FEATURE_COUNT = 3;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.SpringImpl <em>Spring</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.SpringImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getSpring()
	 * @generated
	 */
	int SPRING = 11;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SPRING__ID = GROUPED__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SPRING__NAME = GROUPED__NAME;

	/**
	 * The feature id for the '<em><b>Group</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SPRING__GROUP = GROUPED__GROUP;

	/**
	 * The feature id for the '<em><b>Node</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SPRING__NODE = GROUPED_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>To</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SPRING__TO = GROUPED_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Ux</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SPRING__UX = GROUPED_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Uy</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SPRING__UY = GROUPED_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Uz</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SPRING__UZ = GROUPED_FEATURE_COUNT + 4;

	/**
	 * The feature id for the '<em><b>Rx</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SPRING__RX = GROUPED_FEATURE_COUNT + 5;

	/**
	 * The feature id for the '<em><b>Ry</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SPRING__RY = GROUPED_FEATURE_COUNT + 6;

	/**
	 * The feature id for the '<em><b>Rz</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SPRING__RZ = GROUPED_FEATURE_COUNT + 7;

	/**
	 * The feature id for the '<em><b>Couplings</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SPRING__COUPLINGS = GROUPED_FEATURE_COUNT + 8;

	/**
	 * The number of structural features of the '<em>Spring</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SPRING_FEATURE_COUNT = GROUPED_FEATURE_COUNT + 9;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.SupportImpl <em>Support</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.SupportImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getSupport()
	 * @generated
	 */
	int SUPPORT = 12;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SUPPORT__ID = IDENTIFIED__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SUPPORT__NAME = IDENTIFIED__NAME;

	/**
	 * The feature id for the '<em><b>Node</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SUPPORT__NODE = IDENTIFIED_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Ux</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SUPPORT__UX = IDENTIFIED_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Uy</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SUPPORT__UY = IDENTIFIED_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Uz</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SUPPORT__UZ = IDENTIFIED_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Rx</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SUPPORT__RX = IDENTIFIED_FEATURE_COUNT + 4;

	/**
	 * The feature id for the '<em><b>Ry</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SUPPORT__RY = IDENTIFIED_FEATURE_COUNT + 5;

	/**
	 * The feature id for the '<em><b>Rz</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SUPPORT__RZ = IDENTIFIED_FEATURE_COUNT + 6;

	/**
	 * The feature id for the '<em><b>Elastic Ux</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SUPPORT__ELASTIC_UX = IDENTIFIED_FEATURE_COUNT + 7;

	/**
	 * The feature id for the '<em><b>Elastic Uy</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SUPPORT__ELASTIC_UY = IDENTIFIED_FEATURE_COUNT + 8;

	/**
	 * The feature id for the '<em><b>Elastic Uz</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SUPPORT__ELASTIC_UZ = IDENTIFIED_FEATURE_COUNT + 9;

	/**
	 * The feature id for the '<em><b>Elastic Rx</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SUPPORT__ELASTIC_RX = IDENTIFIED_FEATURE_COUNT + 10;

	/**
	 * The feature id for the '<em><b>Elastic Ry</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SUPPORT__ELASTIC_RY = IDENTIFIED_FEATURE_COUNT + 11;

	/**
	 * The feature id for the '<em><b>Elastic Rz</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SUPPORT__ELASTIC_RZ = IDENTIFIED_FEATURE_COUNT + 12;

	/**
	 * The number of structural features of the '<em>Support</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SUPPORT_FEATURE_COUNT = IDENTIFIED_FEATURE_COUNT + 13;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.NodalMassImpl <em>Nodal Mass</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.NodalMassImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getNodalMass()
	 * @generated
	 */
	int NODAL_MASS = 13;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODAL_MASS__ID = IDENTIFIED__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODAL_MASS__NAME = IDENTIFIED__NAME;

	/**
	 * The feature id for the '<em><b>Node</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODAL_MASS__NODE = IDENTIFIED_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Ux</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODAL_MASS__UX = IDENTIFIED_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Uy</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODAL_MASS__UY = IDENTIFIED_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Uz</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODAL_MASS__UZ = IDENTIFIED_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Rx</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODAL_MASS__RX = IDENTIFIED_FEATURE_COUNT + 4;

	/**
	 * The feature id for the '<em><b>Ry</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODAL_MASS__RY = IDENTIFIED_FEATURE_COUNT + 5;

	/**
	 * The feature id for the '<em><b>Rz</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODAL_MASS__RZ = IDENTIFIED_FEATURE_COUNT + 6;

	/**
	 * The feature id for the '<em><b>Offset</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODAL_MASS__OFFSET = IDENTIFIED_FEATURE_COUNT + 7;

	/**
	 * The number of structural features of the '<em>Nodal Mass</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODAL_MASS_FEATURE_COUNT = IDENTIFIED_FEATURE_COUNT + 8;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.RigidFloorImpl <em>Rigid Floor</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.RigidFloorImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getRigidFloor()
	 * @generated
	 */
	int RIGID_FLOOR = 14;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RIGID_FLOOR__ID = IDENTIFIED__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RIGID_FLOOR__NAME = IDENTIFIED__NAME;

	/**
	 * The feature id for the '<em><b>Nodes</b></em>' reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RIGID_FLOOR__NODES = IDENTIFIED_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Rigid Floor</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RIGID_FLOOR_FEATURE_COUNT = IDENTIFIED_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.RigidLinkImpl <em>Rigid Link</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.RigidLinkImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getRigidLink()
	 * @generated
	 */
	int RIGID_LINK = 15;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RIGID_LINK__ID = IDENTIFIED__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RIGID_LINK__NAME = IDENTIFIED__NAME;

	/**
	 * The feature id for the '<em><b>From</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RIGID_LINK__FROM = IDENTIFIED_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>To</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RIGID_LINK__TO = IDENTIFIED_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Components</b></em>' attribute list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RIGID_LINK__COMPONENTS = IDENTIFIED_FEATURE_COUNT + 2;

	/**
	 * The number of structural features of the '<em>Rigid Link</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int RIGID_LINK_FEATURE_COUNT = IDENTIFIED_FEATURE_COUNT + 3;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.TieTermImpl <em>Tie Term</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.TieTermImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getTieTerm()
	 * @generated
	 */
	int TIE_TERM = 16;

	/**
	 * The feature id for the '<em><b>Node</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TIE_TERM__NODE = 0;

	/**
	 * The feature id for the '<em><b>Component</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TIE_TERM__COMPONENT = 1;

	/**
	 * The feature id for the '<em><b>Factor</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TIE_TERM__FACTOR = 2;

	/**
	 * The number of structural features of the '<em>Tie Term</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TIE_TERM_FEATURE_COUNT = 3;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.MultiPointTieImpl <em>Multi Point Tie</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.MultiPointTieImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getMultiPointTie()
	 * @generated
	 */
	int MULTI_POINT_TIE = 17;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MULTI_POINT_TIE__ID = IDENTIFIED__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MULTI_POINT_TIE__NAME = IDENTIFIED__NAME;

	/**
	 * The feature id for the '<em><b>Terms</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MULTI_POINT_TIE__TERMS = IDENTIFIED_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Multi Point Tie</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MULTI_POINT_TIE_FEATURE_COUNT = IDENTIFIED_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.LoadPatternImpl <em>Load Pattern</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.LoadPatternImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getLoadPattern()
	 * @generated
	 */
	int LOAD_PATTERN = 18;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LOAD_PATTERN__ID = IDENTIFIED__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LOAD_PATTERN__NAME = IDENTIFIED__NAME;

	/**
	 * The feature id for the '<em><b>Mass Factor</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LOAD_PATTERN__MASS_FACTOR = IDENTIFIED_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Loads</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LOAD_PATTERN__LOADS = IDENTIFIED_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Load Pattern</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LOAD_PATTERN_FEATURE_COUNT = IDENTIFIED_FEATURE_COUNT + 2;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.GravityLoadImpl <em>Gravity Load</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.GravityLoadImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getGravityLoad()
	 * @generated
	 */
	int GRAVITY_LOAD = 19;

	/**
	 * The feature id for the '<em><b>Value</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GRAVITY_LOAD__VALUE = 0;

	/**
	 * The number of structural features of the '<em>Gravity Load</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GRAVITY_LOAD_FEATURE_COUNT = 1;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.NodeLoadImpl <em>Node Load</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.NodeLoadImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getNodeLoad()
	 * @generated
	 */
	int NODE_LOAD = 20;

	/**
	 * The feature id for the '<em><b>Value</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODE_LOAD__VALUE = GRAVITY_LOAD__VALUE;

	/**
	 * The feature id for the '<em><b>Node</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODE_LOAD__NODE = GRAVITY_LOAD_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Node Load</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NODE_LOAD_FEATURE_COUNT = GRAVITY_LOAD_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.MemberLoadImpl <em>Member Load</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.MemberLoadImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getMemberLoad()
	 * @generated
	 */
	int MEMBER_LOAD = 21;

	/**
	 * The feature id for the '<em><b>Value</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER_LOAD__VALUE = GRAVITY_LOAD__VALUE;

	/**
	 * The feature id for the '<em><b>Member</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER_LOAD__MEMBER = GRAVITY_LOAD_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Member Load</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int MEMBER_LOAD_FEATURE_COUNT = GRAVITY_LOAD_FEATURE_COUNT + 1;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.AnalysisSettingsImpl <em>Analysis Settings</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.AnalysisSettingsImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getAnalysisSettings()
	 * @generated
	 */
	int ANALYSIS_SETTINGS = 22;

	/**
	 * The feature id for the '<em><b>Modes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ANALYSIS_SETTINGS__MODES = 0;

	/**
	 * The feature id for the '<em><b>Below</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ANALYSIS_SETTINGS__BELOW = 1;

	/**
	 * The number of structural features of the '<em>Analysis Settings</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ANALYSIS_SETTINGS_FEATURE_COUNT = 2;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.impl.AuditSettingsImpl <em>Audit Settings</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.impl.AuditSettingsImpl
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getAuditSettings()
	 * @generated
	 */
	int AUDIT_SETTINGS = 23;

	/**
	 * The feature id for the '<em><b>Rule Pack</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int AUDIT_SETTINGS__RULE_PACK = 0;

	/**
	 * The feature id for the '<em><b>X</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int AUDIT_SETTINGS__X = 1;

	/**
	 * The feature id for the '<em><b>Y</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int AUDIT_SETTINGS__Y = 2;

	/**
	 * The feature id for the '<em><b>Z</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int AUDIT_SETTINGS__Z = 3;

	/**
	 * The feature id for the '<em><b>Local Nodes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int AUDIT_SETTINGS__LOCAL_NODES = 4;

	/**
	 * The feature id for the '<em><b>Coincidence</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int AUDIT_SETTINGS__COINCIDENCE = 5;

	/**
	 * The number of structural features of the '<em>Audit Settings</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int AUDIT_SETTINGS_FEATURE_COUNT = 6;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.UnitSystem <em>Unit System</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.UnitSystem
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getUnitSystem()
	 * @generated
	 */
	int UNIT_SYSTEM = 24;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.MassFormulation <em>Mass Formulation</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.MassFormulation
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getMassFormulation()
	 * @generated
	 */
	int MASS_FORMULATION = 25;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.MemberMass <em>Member Mass</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.MemberMass
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getMemberMass()
	 * @generated
	 */
	int MEMBER_MASS = 26;

	/**
	 * The meta object id for the '{@link org.modewright.model.structure.Component <em>Component</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.modewright.model.structure.Component
	 * @see org.modewright.model.structure.impl.StructurePackageImpl#getComponent()
	 * @generated
	 */
	int COMPONENT = 27;


	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.Identified <em>Identified</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Identified</em>'.
	 * @see org.modewright.model.structure.Identified
	 * @generated
	 */
	EClass getIdentified();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Identified#getId <em>Id</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Id</em>'.
	 * @see org.modewright.model.structure.Identified#getId()
	 * @see #getIdentified()
	 * @generated
	 */
	EAttribute getIdentified_Id();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Identified#getName <em>Name</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Name</em>'.
	 * @see org.modewright.model.structure.Identified#getName()
	 * @see #getIdentified()
	 * @generated
	 */
	EAttribute getIdentified_Name();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.StructuralModel <em>Structural Model</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Structural Model</em>'.
	 * @see org.modewright.model.structure.StructuralModel
	 * @generated
	 */
	EClass getStructuralModel();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.StructuralModel#getFormatVersion <em>Format Version</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Format Version</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getFormatVersion()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EAttribute getStructuralModel_FormatVersion();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.StructuralModel#getName <em>Name</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Name</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getName()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EAttribute getStructuralModel_Name();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.StructuralModel#getTitle <em>Title</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Title</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getTitle()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EAttribute getStructuralModel_Title();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.StructuralModel#getNotes <em>Notes</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Notes</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getNotes()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EAttribute getStructuralModel_Notes();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.StructuralModel#getUnits <em>Units</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Units</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getUnits()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EAttribute getStructuralModel_Units();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.StructuralModel#getGravity <em>Gravity</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Gravity</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getGravity()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EAttribute getStructuralModel_Gravity();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.StructuralModel#getMassFormulation <em>Mass Formulation</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Mass Formulation</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getMassFormulation()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EAttribute getStructuralModel_MassFormulation();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.StructuralModel#isShearDeformation <em>Shear Deformation</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Shear Deformation</em>'.
	 * @see org.modewright.model.structure.StructuralModel#isShearDeformation()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EAttribute getStructuralModel_ShearDeformation();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.StructuralModel#getSelfMassFactor <em>Self Mass Factor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Self Mass Factor</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getSelfMassFactor()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EAttribute getStructuralModel_SelfMassFactor();

	/**
	 * Returns the meta object for the containment reference list '{@link org.modewright.model.structure.StructuralModel#getMaterials <em>Materials</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Materials</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getMaterials()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EReference getStructuralModel_Materials();

	/**
	 * Returns the meta object for the containment reference list '{@link org.modewright.model.structure.StructuralModel#getFrameSections <em>Frame Sections</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Frame Sections</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getFrameSections()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EReference getStructuralModel_FrameSections();

	/**
	 * Returns the meta object for the containment reference list '{@link org.modewright.model.structure.StructuralModel#getGroups <em>Groups</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Groups</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getGroups()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EReference getStructuralModel_Groups();

	/**
	 * Returns the meta object for the containment reference list '{@link org.modewright.model.structure.StructuralModel#getLevels <em>Levels</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Levels</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getLevels()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EReference getStructuralModel_Levels();

	/**
	 * Returns the meta object for the containment reference list '{@link org.modewright.model.structure.StructuralModel#getNodes <em>Nodes</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Nodes</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getNodes()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EReference getStructuralModel_Nodes();

	/**
	 * Returns the meta object for the containment reference list '{@link org.modewright.model.structure.StructuralModel#getMembers <em>Members</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Members</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getMembers()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EReference getStructuralModel_Members();

	/**
	 * Returns the meta object for the containment reference list '{@link org.modewright.model.structure.StructuralModel#getSprings <em>Springs</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Springs</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getSprings()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EReference getStructuralModel_Springs();

	/**
	 * Returns the meta object for the containment reference list '{@link org.modewright.model.structure.StructuralModel#getSupports <em>Supports</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Supports</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getSupports()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EReference getStructuralModel_Supports();

	/**
	 * Returns the meta object for the containment reference list '{@link org.modewright.model.structure.StructuralModel#getMasses <em>Masses</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Masses</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getMasses()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EReference getStructuralModel_Masses();

	/**
	 * Returns the meta object for the containment reference list '{@link org.modewright.model.structure.StructuralModel#getRigidFloors <em>Rigid Floors</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Rigid Floors</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getRigidFloors()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EReference getStructuralModel_RigidFloors();

	/**
	 * Returns the meta object for the containment reference list '{@link org.modewright.model.structure.StructuralModel#getRigidLinks <em>Rigid Links</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Rigid Links</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getRigidLinks()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EReference getStructuralModel_RigidLinks();

	/**
	 * Returns the meta object for the containment reference list '{@link org.modewright.model.structure.StructuralModel#getTies <em>Ties</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Ties</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getTies()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EReference getStructuralModel_Ties();

	/**
	 * Returns the meta object for the containment reference list '{@link org.modewright.model.structure.StructuralModel#getLoadPatterns <em>Load Patterns</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Load Patterns</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getLoadPatterns()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EReference getStructuralModel_LoadPatterns();

	/**
	 * Returns the meta object for the containment reference '{@link org.modewright.model.structure.StructuralModel#getAnalysis <em>Analysis</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Analysis</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getAnalysis()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EReference getStructuralModel_Analysis();

	/**
	 * Returns the meta object for the containment reference '{@link org.modewright.model.structure.StructuralModel#getAudit <em>Audit</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Audit</em>'.
	 * @see org.modewright.model.structure.StructuralModel#getAudit()
	 * @see #getStructuralModel()
	 * @generated
	 */
	EReference getStructuralModel_Audit();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.Node <em>Node</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Node</em>'.
	 * @see org.modewright.model.structure.Node
	 * @generated
	 */
	EClass getNode();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Node#getX <em>X</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>X</em>'.
	 * @see org.modewright.model.structure.Node#getX()
	 * @see #getNode()
	 * @generated
	 */
	EAttribute getNode_X();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Node#getY <em>Y</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Y</em>'.
	 * @see org.modewright.model.structure.Node#getY()
	 * @see #getNode()
	 * @generated
	 */
	EAttribute getNode_Y();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Node#getZ <em>Z</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Z</em>'.
	 * @see org.modewright.model.structure.Node#getZ()
	 * @see #getNode()
	 * @generated
	 */
	EAttribute getNode_Z();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.Material <em>Material</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Material</em>'.
	 * @see org.modewright.model.structure.Material
	 * @generated
	 */
	EClass getMaterial();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Material#getYoung <em>Young</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Young</em>'.
	 * @see org.modewright.model.structure.Material#getYoung()
	 * @see #getMaterial()
	 * @generated
	 */
	EAttribute getMaterial_Young();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Material#getPoisson <em>Poisson</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Poisson</em>'.
	 * @see org.modewright.model.structure.Material#getPoisson()
	 * @see #getMaterial()
	 * @generated
	 */
	EAttribute getMaterial_Poisson();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Material#getDensity <em>Density</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Density</em>'.
	 * @see org.modewright.model.structure.Material#getDensity()
	 * @see #getMaterial()
	 * @generated
	 */
	EAttribute getMaterial_Density();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Material#getShear <em>Shear</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Shear</em>'.
	 * @see org.modewright.model.structure.Material#getShear()
	 * @see #getMaterial()
	 * @generated
	 */
	EAttribute getMaterial_Shear();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.FrameSection <em>Frame Section</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Frame Section</em>'.
	 * @see org.modewright.model.structure.FrameSection
	 * @generated
	 */
	EClass getFrameSection();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.FrameSection#getArea <em>Area</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Area</em>'.
	 * @see org.modewright.model.structure.FrameSection#getArea()
	 * @see #getFrameSection()
	 * @generated
	 */
	EAttribute getFrameSection_Area();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.FrameSection#getIy <em>Iy</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Iy</em>'.
	 * @see org.modewright.model.structure.FrameSection#getIy()
	 * @see #getFrameSection()
	 * @generated
	 */
	EAttribute getFrameSection_Iy();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.FrameSection#getIz <em>Iz</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Iz</em>'.
	 * @see org.modewright.model.structure.FrameSection#getIz()
	 * @see #getFrameSection()
	 * @generated
	 */
	EAttribute getFrameSection_Iz();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.FrameSection#getTorsion <em>Torsion</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Torsion</em>'.
	 * @see org.modewright.model.structure.FrameSection#getTorsion()
	 * @see #getFrameSection()
	 * @generated
	 */
	EAttribute getFrameSection_Torsion();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.FrameSection#getShearAreaY <em>Shear Area Y</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Shear Area Y</em>'.
	 * @see org.modewright.model.structure.FrameSection#getShearAreaY()
	 * @see #getFrameSection()
	 * @generated
	 */
	EAttribute getFrameSection_ShearAreaY();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.FrameSection#getShearAreaZ <em>Shear Area Z</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Shear Area Z</em>'.
	 * @see org.modewright.model.structure.FrameSection#getShearAreaZ()
	 * @see #getFrameSection()
	 * @generated
	 */
	EAttribute getFrameSection_ShearAreaZ();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.Group <em>Group</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Group</em>'.
	 * @see org.modewright.model.structure.Group
	 * @generated
	 */
	EClass getGroup();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Group#getDescription <em>Description</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Description</em>'.
	 * @see org.modewright.model.structure.Group#getDescription()
	 * @see #getGroup()
	 * @generated
	 */
	EAttribute getGroup_Description();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.Level <em>Level</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Level</em>'.
	 * @see org.modewright.model.structure.Level
	 * @generated
	 */
	EClass getLevel();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Level#getElevation <em>Elevation</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Elevation</em>'.
	 * @see org.modewright.model.structure.Level#getElevation()
	 * @see #getLevel()
	 * @generated
	 */
	EAttribute getLevel_Elevation();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.Grouped <em>Grouped</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Grouped</em>'.
	 * @see org.modewright.model.structure.Grouped
	 * @generated
	 */
	EClass getGrouped();

	/**
	 * Returns the meta object for the reference '{@link org.modewright.model.structure.Grouped#getGroup <em>Group</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>Group</em>'.
	 * @see org.modewright.model.structure.Grouped#getGroup()
	 * @see #getGrouped()
	 * @generated
	 */
	EReference getGrouped_Group();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.Vector <em>Vector</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Vector</em>'.
	 * @see org.modewright.model.structure.Vector
	 * @generated
	 */
	EClass getVector();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Vector#getX <em>X</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>X</em>'.
	 * @see org.modewright.model.structure.Vector#getX()
	 * @see #getVector()
	 * @generated
	 */
	EAttribute getVector_X();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Vector#getY <em>Y</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Y</em>'.
	 * @see org.modewright.model.structure.Vector#getY()
	 * @see #getVector()
	 * @generated
	 */
	EAttribute getVector_Y();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Vector#getZ <em>Z</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Z</em>'.
	 * @see org.modewright.model.structure.Vector#getZ()
	 * @see #getVector()
	 * @generated
	 */
	EAttribute getVector_Z();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.Member <em>Member</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Member</em>'.
	 * @see org.modewright.model.structure.Member
	 * @generated
	 */
	EClass getMember();

	/**
	 * Returns the meta object for the reference '{@link org.modewright.model.structure.Member#getStart <em>Start</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>Start</em>'.
	 * @see org.modewright.model.structure.Member#getStart()
	 * @see #getMember()
	 * @generated
	 */
	EReference getMember_Start();

	/**
	 * Returns the meta object for the reference '{@link org.modewright.model.structure.Member#getEnd <em>End</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>End</em>'.
	 * @see org.modewright.model.structure.Member#getEnd()
	 * @see #getMember()
	 * @generated
	 */
	EReference getMember_End();

	/**
	 * Returns the meta object for the reference '{@link org.modewright.model.structure.Member#getSection <em>Section</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>Section</em>'.
	 * @see org.modewright.model.structure.Member#getSection()
	 * @see #getMember()
	 * @generated
	 */
	EReference getMember_Section();

	/**
	 * Returns the meta object for the reference '{@link org.modewright.model.structure.Member#getMaterial <em>Material</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>Material</em>'.
	 * @see org.modewright.model.structure.Member#getMaterial()
	 * @see #getMember()
	 * @generated
	 */
	EReference getMember_Material();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Member#getRoll <em>Roll</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Roll</em>'.
	 * @see org.modewright.model.structure.Member#getRoll()
	 * @see #getMember()
	 * @generated
	 */
	EAttribute getMember_Roll();

	/**
	 * Returns the meta object for the attribute list '{@link org.modewright.model.structure.Member#getStartFree <em>Start Free</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute list '<em>Start Free</em>'.
	 * @see org.modewright.model.structure.Member#getStartFree()
	 * @see #getMember()
	 * @generated
	 */
	EAttribute getMember_StartFree();

	/**
	 * Returns the meta object for the attribute list '{@link org.modewright.model.structure.Member#getEndFree <em>End Free</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute list '<em>End Free</em>'.
	 * @see org.modewright.model.structure.Member#getEndFree()
	 * @see #getMember()
	 * @generated
	 */
	EAttribute getMember_EndFree();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Member#getStartRigid <em>Start Rigid</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Start Rigid</em>'.
	 * @see org.modewright.model.structure.Member#getStartRigid()
	 * @see #getMember()
	 * @generated
	 */
	EAttribute getMember_StartRigid();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Member#getEndRigid <em>End Rigid</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>End Rigid</em>'.
	 * @see org.modewright.model.structure.Member#getEndRigid()
	 * @see #getMember()
	 * @generated
	 */
	EAttribute getMember_EndRigid();

	/**
	 * Returns the meta object for the containment reference '{@link org.modewright.model.structure.Member#getStartOffset <em>Start Offset</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Start Offset</em>'.
	 * @see org.modewright.model.structure.Member#getStartOffset()
	 * @see #getMember()
	 * @generated
	 */
	EReference getMember_StartOffset();

	/**
	 * Returns the meta object for the containment reference '{@link org.modewright.model.structure.Member#getEndOffset <em>End Offset</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>End Offset</em>'.
	 * @see org.modewright.model.structure.Member#getEndOffset()
	 * @see #getMember()
	 * @generated
	 */
	EReference getMember_EndOffset();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Member#isAxialOnly <em>Axial Only</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Axial Only</em>'.
	 * @see org.modewright.model.structure.Member#isAxialOnly()
	 * @see #getMember()
	 * @generated
	 */
	EAttribute getMember_AxialOnly();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Member#getAxialForce <em>Axial Force</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Axial Force</em>'.
	 * @see org.modewright.model.structure.Member#getAxialForce()
	 * @see #getMember()
	 * @generated
	 */
	EAttribute getMember_AxialForce();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Member#getMass <em>Mass</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Mass</em>'.
	 * @see org.modewright.model.structure.Member#getMass()
	 * @see #getMember()
	 * @generated
	 */
	EAttribute getMember_Mass();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Member#getAxialFactor <em>Axial Factor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Axial Factor</em>'.
	 * @see org.modewright.model.structure.Member#getAxialFactor()
	 * @see #getMember()
	 * @generated
	 */
	EAttribute getMember_AxialFactor();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Member#getShearYFactor <em>Shear YFactor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Shear YFactor</em>'.
	 * @see org.modewright.model.structure.Member#getShearYFactor()
	 * @see #getMember()
	 * @generated
	 */
	EAttribute getMember_ShearYFactor();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Member#getShearZFactor <em>Shear ZFactor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Shear ZFactor</em>'.
	 * @see org.modewright.model.structure.Member#getShearZFactor()
	 * @see #getMember()
	 * @generated
	 */
	EAttribute getMember_ShearZFactor();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Member#getTorsionFactor <em>Torsion Factor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Torsion Factor</em>'.
	 * @see org.modewright.model.structure.Member#getTorsionFactor()
	 * @see #getMember()
	 * @generated
	 */
	EAttribute getMember_TorsionFactor();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Member#getBendingYFactor <em>Bending YFactor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Bending YFactor</em>'.
	 * @see org.modewright.model.structure.Member#getBendingYFactor()
	 * @see #getMember()
	 * @generated
	 */
	EAttribute getMember_BendingYFactor();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Member#getBendingZFactor <em>Bending ZFactor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Bending ZFactor</em>'.
	 * @see org.modewright.model.structure.Member#getBendingZFactor()
	 * @see #getMember()
	 * @generated
	 */
	EAttribute getMember_BendingZFactor();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.SpringCoupling <em>Spring Coupling</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Spring Coupling</em>'.
	 * @see org.modewright.model.structure.SpringCoupling
	 * @generated
	 */
	EClass getSpringCoupling();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.SpringCoupling#getFirst <em>First</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>First</em>'.
	 * @see org.modewright.model.structure.SpringCoupling#getFirst()
	 * @see #getSpringCoupling()
	 * @generated
	 */
	EAttribute getSpringCoupling_First();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.SpringCoupling#getSecond <em>Second</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Second</em>'.
	 * @see org.modewright.model.structure.SpringCoupling#getSecond()
	 * @see #getSpringCoupling()
	 * @generated
	 */
	EAttribute getSpringCoupling_Second();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.SpringCoupling#getStiffness <em>Stiffness</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Stiffness</em>'.
	 * @see org.modewright.model.structure.SpringCoupling#getStiffness()
	 * @see #getSpringCoupling()
	 * @generated
	 */
	EAttribute getSpringCoupling_Stiffness();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.Spring <em>Spring</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Spring</em>'.
	 * @see org.modewright.model.structure.Spring
	 * @generated
	 */
	EClass getSpring();

	/**
	 * Returns the meta object for the reference '{@link org.modewright.model.structure.Spring#getNode <em>Node</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>Node</em>'.
	 * @see org.modewright.model.structure.Spring#getNode()
	 * @see #getSpring()
	 * @generated
	 */
	EReference getSpring_Node();

	/**
	 * Returns the meta object for the reference '{@link org.modewright.model.structure.Spring#getTo <em>To</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>To</em>'.
	 * @see org.modewright.model.structure.Spring#getTo()
	 * @see #getSpring()
	 * @generated
	 */
	EReference getSpring_To();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Spring#getUx <em>Ux</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Ux</em>'.
	 * @see org.modewright.model.structure.Spring#getUx()
	 * @see #getSpring()
	 * @generated
	 */
	EAttribute getSpring_Ux();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Spring#getUy <em>Uy</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Uy</em>'.
	 * @see org.modewright.model.structure.Spring#getUy()
	 * @see #getSpring()
	 * @generated
	 */
	EAttribute getSpring_Uy();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Spring#getUz <em>Uz</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Uz</em>'.
	 * @see org.modewright.model.structure.Spring#getUz()
	 * @see #getSpring()
	 * @generated
	 */
	EAttribute getSpring_Uz();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Spring#getRx <em>Rx</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Rx</em>'.
	 * @see org.modewright.model.structure.Spring#getRx()
	 * @see #getSpring()
	 * @generated
	 */
	EAttribute getSpring_Rx();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Spring#getRy <em>Ry</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Ry</em>'.
	 * @see org.modewright.model.structure.Spring#getRy()
	 * @see #getSpring()
	 * @generated
	 */
	EAttribute getSpring_Ry();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Spring#getRz <em>Rz</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Rz</em>'.
	 * @see org.modewright.model.structure.Spring#getRz()
	 * @see #getSpring()
	 * @generated
	 */
	EAttribute getSpring_Rz();

	/**
	 * Returns the meta object for the containment reference list '{@link org.modewright.model.structure.Spring#getCouplings <em>Couplings</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Couplings</em>'.
	 * @see org.modewright.model.structure.Spring#getCouplings()
	 * @see #getSpring()
	 * @generated
	 */
	EReference getSpring_Couplings();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.Support <em>Support</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Support</em>'.
	 * @see org.modewright.model.structure.Support
	 * @generated
	 */
	EClass getSupport();

	/**
	 * Returns the meta object for the reference '{@link org.modewright.model.structure.Support#getNode <em>Node</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>Node</em>'.
	 * @see org.modewright.model.structure.Support#getNode()
	 * @see #getSupport()
	 * @generated
	 */
	EReference getSupport_Node();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Support#isUx <em>Ux</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Ux</em>'.
	 * @see org.modewright.model.structure.Support#isUx()
	 * @see #getSupport()
	 * @generated
	 */
	EAttribute getSupport_Ux();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Support#isUy <em>Uy</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Uy</em>'.
	 * @see org.modewright.model.structure.Support#isUy()
	 * @see #getSupport()
	 * @generated
	 */
	EAttribute getSupport_Uy();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Support#isUz <em>Uz</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Uz</em>'.
	 * @see org.modewright.model.structure.Support#isUz()
	 * @see #getSupport()
	 * @generated
	 */
	EAttribute getSupport_Uz();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Support#isRx <em>Rx</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Rx</em>'.
	 * @see org.modewright.model.structure.Support#isRx()
	 * @see #getSupport()
	 * @generated
	 */
	EAttribute getSupport_Rx();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Support#isRy <em>Ry</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Ry</em>'.
	 * @see org.modewright.model.structure.Support#isRy()
	 * @see #getSupport()
	 * @generated
	 */
	EAttribute getSupport_Ry();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Support#isRz <em>Rz</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Rz</em>'.
	 * @see org.modewright.model.structure.Support#isRz()
	 * @see #getSupport()
	 * @generated
	 */
	EAttribute getSupport_Rz();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Support#getElasticUx <em>Elastic Ux</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Elastic Ux</em>'.
	 * @see org.modewright.model.structure.Support#getElasticUx()
	 * @see #getSupport()
	 * @generated
	 */
	EAttribute getSupport_ElasticUx();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Support#getElasticUy <em>Elastic Uy</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Elastic Uy</em>'.
	 * @see org.modewright.model.structure.Support#getElasticUy()
	 * @see #getSupport()
	 * @generated
	 */
	EAttribute getSupport_ElasticUy();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Support#getElasticUz <em>Elastic Uz</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Elastic Uz</em>'.
	 * @see org.modewright.model.structure.Support#getElasticUz()
	 * @see #getSupport()
	 * @generated
	 */
	EAttribute getSupport_ElasticUz();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Support#getElasticRx <em>Elastic Rx</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Elastic Rx</em>'.
	 * @see org.modewright.model.structure.Support#getElasticRx()
	 * @see #getSupport()
	 * @generated
	 */
	EAttribute getSupport_ElasticRx();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Support#getElasticRy <em>Elastic Ry</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Elastic Ry</em>'.
	 * @see org.modewright.model.structure.Support#getElasticRy()
	 * @see #getSupport()
	 * @generated
	 */
	EAttribute getSupport_ElasticRy();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.Support#getElasticRz <em>Elastic Rz</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Elastic Rz</em>'.
	 * @see org.modewright.model.structure.Support#getElasticRz()
	 * @see #getSupport()
	 * @generated
	 */
	EAttribute getSupport_ElasticRz();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.NodalMass <em>Nodal Mass</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Nodal Mass</em>'.
	 * @see org.modewright.model.structure.NodalMass
	 * @generated
	 */
	EClass getNodalMass();

	/**
	 * Returns the meta object for the reference '{@link org.modewright.model.structure.NodalMass#getNode <em>Node</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>Node</em>'.
	 * @see org.modewright.model.structure.NodalMass#getNode()
	 * @see #getNodalMass()
	 * @generated
	 */
	EReference getNodalMass_Node();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.NodalMass#getUx <em>Ux</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Ux</em>'.
	 * @see org.modewright.model.structure.NodalMass#getUx()
	 * @see #getNodalMass()
	 * @generated
	 */
	EAttribute getNodalMass_Ux();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.NodalMass#getUy <em>Uy</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Uy</em>'.
	 * @see org.modewright.model.structure.NodalMass#getUy()
	 * @see #getNodalMass()
	 * @generated
	 */
	EAttribute getNodalMass_Uy();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.NodalMass#getUz <em>Uz</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Uz</em>'.
	 * @see org.modewright.model.structure.NodalMass#getUz()
	 * @see #getNodalMass()
	 * @generated
	 */
	EAttribute getNodalMass_Uz();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.NodalMass#getRx <em>Rx</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Rx</em>'.
	 * @see org.modewright.model.structure.NodalMass#getRx()
	 * @see #getNodalMass()
	 * @generated
	 */
	EAttribute getNodalMass_Rx();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.NodalMass#getRy <em>Ry</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Ry</em>'.
	 * @see org.modewright.model.structure.NodalMass#getRy()
	 * @see #getNodalMass()
	 * @generated
	 */
	EAttribute getNodalMass_Ry();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.NodalMass#getRz <em>Rz</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Rz</em>'.
	 * @see org.modewright.model.structure.NodalMass#getRz()
	 * @see #getNodalMass()
	 * @generated
	 */
	EAttribute getNodalMass_Rz();

	/**
	 * Returns the meta object for the containment reference '{@link org.modewright.model.structure.NodalMass#getOffset <em>Offset</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Offset</em>'.
	 * @see org.modewright.model.structure.NodalMass#getOffset()
	 * @see #getNodalMass()
	 * @generated
	 */
	EReference getNodalMass_Offset();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.RigidFloor <em>Rigid Floor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Rigid Floor</em>'.
	 * @see org.modewright.model.structure.RigidFloor
	 * @generated
	 */
	EClass getRigidFloor();

	/**
	 * Returns the meta object for the reference list '{@link org.modewright.model.structure.RigidFloor#getNodes <em>Nodes</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference list '<em>Nodes</em>'.
	 * @see org.modewright.model.structure.RigidFloor#getNodes()
	 * @see #getRigidFloor()
	 * @generated
	 */
	EReference getRigidFloor_Nodes();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.RigidLink <em>Rigid Link</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Rigid Link</em>'.
	 * @see org.modewright.model.structure.RigidLink
	 * @generated
	 */
	EClass getRigidLink();

	/**
	 * Returns the meta object for the reference '{@link org.modewright.model.structure.RigidLink#getFrom <em>From</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>From</em>'.
	 * @see org.modewright.model.structure.RigidLink#getFrom()
	 * @see #getRigidLink()
	 * @generated
	 */
	EReference getRigidLink_From();

	/**
	 * Returns the meta object for the reference '{@link org.modewright.model.structure.RigidLink#getTo <em>To</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>To</em>'.
	 * @see org.modewright.model.structure.RigidLink#getTo()
	 * @see #getRigidLink()
	 * @generated
	 */
	EReference getRigidLink_To();

	/**
	 * Returns the meta object for the attribute list '{@link org.modewright.model.structure.RigidLink#getComponents <em>Components</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute list '<em>Components</em>'.
	 * @see org.modewright.model.structure.RigidLink#getComponents()
	 * @see #getRigidLink()
	 * @generated
	 */
	EAttribute getRigidLink_Components();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.TieTerm <em>Tie Term</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Tie Term</em>'.
	 * @see org.modewright.model.structure.TieTerm
	 * @generated
	 */
	EClass getTieTerm();

	/**
	 * Returns the meta object for the reference '{@link org.modewright.model.structure.TieTerm#getNode <em>Node</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>Node</em>'.
	 * @see org.modewright.model.structure.TieTerm#getNode()
	 * @see #getTieTerm()
	 * @generated
	 */
	EReference getTieTerm_Node();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.TieTerm#getComponent <em>Component</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Component</em>'.
	 * @see org.modewright.model.structure.TieTerm#getComponent()
	 * @see #getTieTerm()
	 * @generated
	 */
	EAttribute getTieTerm_Component();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.TieTerm#getFactor <em>Factor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Factor</em>'.
	 * @see org.modewright.model.structure.TieTerm#getFactor()
	 * @see #getTieTerm()
	 * @generated
	 */
	EAttribute getTieTerm_Factor();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.MultiPointTie <em>Multi Point Tie</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Multi Point Tie</em>'.
	 * @see org.modewright.model.structure.MultiPointTie
	 * @generated
	 */
	EClass getMultiPointTie();

	/**
	 * Returns the meta object for the containment reference list '{@link org.modewright.model.structure.MultiPointTie#getTerms <em>Terms</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Terms</em>'.
	 * @see org.modewright.model.structure.MultiPointTie#getTerms()
	 * @see #getMultiPointTie()
	 * @generated
	 */
	EReference getMultiPointTie_Terms();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.LoadPattern <em>Load Pattern</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Load Pattern</em>'.
	 * @see org.modewright.model.structure.LoadPattern
	 * @generated
	 */
	EClass getLoadPattern();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.LoadPattern#getMassFactor <em>Mass Factor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Mass Factor</em>'.
	 * @see org.modewright.model.structure.LoadPattern#getMassFactor()
	 * @see #getLoadPattern()
	 * @generated
	 */
	EAttribute getLoadPattern_MassFactor();

	/**
	 * Returns the meta object for the containment reference list '{@link org.modewright.model.structure.LoadPattern#getLoads <em>Loads</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Loads</em>'.
	 * @see org.modewright.model.structure.LoadPattern#getLoads()
	 * @see #getLoadPattern()
	 * @generated
	 */
	EReference getLoadPattern_Loads();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.GravityLoad <em>Gravity Load</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Gravity Load</em>'.
	 * @see org.modewright.model.structure.GravityLoad
	 * @generated
	 */
	EClass getGravityLoad();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.GravityLoad#getValue <em>Value</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Value</em>'.
	 * @see org.modewright.model.structure.GravityLoad#getValue()
	 * @see #getGravityLoad()
	 * @generated
	 */
	EAttribute getGravityLoad_Value();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.NodeLoad <em>Node Load</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Node Load</em>'.
	 * @see org.modewright.model.structure.NodeLoad
	 * @generated
	 */
	EClass getNodeLoad();

	/**
	 * Returns the meta object for the reference '{@link org.modewright.model.structure.NodeLoad#getNode <em>Node</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>Node</em>'.
	 * @see org.modewright.model.structure.NodeLoad#getNode()
	 * @see #getNodeLoad()
	 * @generated
	 */
	EReference getNodeLoad_Node();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.MemberLoad <em>Member Load</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Member Load</em>'.
	 * @see org.modewright.model.structure.MemberLoad
	 * @generated
	 */
	EClass getMemberLoad();

	/**
	 * Returns the meta object for the reference '{@link org.modewright.model.structure.MemberLoad#getMember <em>Member</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>Member</em>'.
	 * @see org.modewright.model.structure.MemberLoad#getMember()
	 * @see #getMemberLoad()
	 * @generated
	 */
	EReference getMemberLoad_Member();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.AnalysisSettings <em>Analysis Settings</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Analysis Settings</em>'.
	 * @see org.modewright.model.structure.AnalysisSettings
	 * @generated
	 */
	EClass getAnalysisSettings();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.AnalysisSettings#getModes <em>Modes</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Modes</em>'.
	 * @see org.modewright.model.structure.AnalysisSettings#getModes()
	 * @see #getAnalysisSettings()
	 * @generated
	 */
	EAttribute getAnalysisSettings_Modes();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.AnalysisSettings#getBelow <em>Below</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Below</em>'.
	 * @see org.modewright.model.structure.AnalysisSettings#getBelow()
	 * @see #getAnalysisSettings()
	 * @generated
	 */
	EAttribute getAnalysisSettings_Below();

	/**
	 * Returns the meta object for class '{@link org.modewright.model.structure.AuditSettings <em>Audit Settings</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Audit Settings</em>'.
	 * @see org.modewright.model.structure.AuditSettings
	 * @generated
	 */
	EClass getAuditSettings();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.AuditSettings#getRulePack <em>Rule Pack</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Rule Pack</em>'.
	 * @see org.modewright.model.structure.AuditSettings#getRulePack()
	 * @see #getAuditSettings()
	 * @generated
	 */
	EAttribute getAuditSettings_RulePack();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.AuditSettings#isX <em>X</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>X</em>'.
	 * @see org.modewright.model.structure.AuditSettings#isX()
	 * @see #getAuditSettings()
	 * @generated
	 */
	EAttribute getAuditSettings_X();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.AuditSettings#isY <em>Y</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Y</em>'.
	 * @see org.modewright.model.structure.AuditSettings#isY()
	 * @see #getAuditSettings()
	 * @generated
	 */
	EAttribute getAuditSettings_Y();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.AuditSettings#isZ <em>Z</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Z</em>'.
	 * @see org.modewright.model.structure.AuditSettings#isZ()
	 * @see #getAuditSettings()
	 * @generated
	 */
	EAttribute getAuditSettings_Z();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.AuditSettings#getLocalNodes <em>Local Nodes</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Local Nodes</em>'.
	 * @see org.modewright.model.structure.AuditSettings#getLocalNodes()
	 * @see #getAuditSettings()
	 * @generated
	 */
	EAttribute getAuditSettings_LocalNodes();

	/**
	 * Returns the meta object for the attribute '{@link org.modewright.model.structure.AuditSettings#getCoincidence <em>Coincidence</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Coincidence</em>'.
	 * @see org.modewright.model.structure.AuditSettings#getCoincidence()
	 * @see #getAuditSettings()
	 * @generated
	 */
	EAttribute getAuditSettings_Coincidence();

	/**
	 * Returns the meta object for enum '{@link org.modewright.model.structure.UnitSystem <em>Unit System</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Unit System</em>'.
	 * @see org.modewright.model.structure.UnitSystem
	 * @generated
	 */
	EEnum getUnitSystem();

	/**
	 * Returns the meta object for enum '{@link org.modewright.model.structure.MassFormulation <em>Mass Formulation</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Mass Formulation</em>'.
	 * @see org.modewright.model.structure.MassFormulation
	 * @generated
	 */
	EEnum getMassFormulation();

	/**
	 * Returns the meta object for enum '{@link org.modewright.model.structure.MemberMass <em>Member Mass</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Member Mass</em>'.
	 * @see org.modewright.model.structure.MemberMass
	 * @generated
	 */
	EEnum getMemberMass();

	/**
	 * Returns the meta object for enum '{@link org.modewright.model.structure.Component <em>Component</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Component</em>'.
	 * @see org.modewright.model.structure.Component
	 * @generated
	 */
	EEnum getComponent();

	/**
	 * Returns the factory that creates the instances of the model.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the factory that creates the instances of the model.
	 * @generated
	 */
	StructureFactory getStructureFactory();

	/**
	 * <!-- begin-user-doc -->
	 * Defines literals for the meta objects that represent
	 * <ul>
	 *   <li>each class,</li>
	 *   <li>each feature of each class,</li>
	 *   <li>each enum,</li>
	 *   <li>and each data type</li>
	 * </ul>
	 * <!-- end-user-doc -->
	 * @generated
	 */
	interface Literals {
		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.IdentifiedImpl <em>Identified</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.IdentifiedImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getIdentified()
		 * @generated
		 */
		EClass IDENTIFIED = eINSTANCE.getIdentified();

		/**
		 * The meta object literal for the '<em><b>Id</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute IDENTIFIED__ID = eINSTANCE.getIdentified_Id();

		/**
		 * The meta object literal for the '<em><b>Name</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute IDENTIFIED__NAME = eINSTANCE.getIdentified_Name();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.StructuralModelImpl <em>Structural Model</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.StructuralModelImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getStructuralModel()
		 * @generated
		 */
		EClass STRUCTURAL_MODEL = eINSTANCE.getStructuralModel();

		/**
		 * The meta object literal for the '<em><b>Format Version</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STRUCTURAL_MODEL__FORMAT_VERSION = eINSTANCE.getStructuralModel_FormatVersion();

		/**
		 * The meta object literal for the '<em><b>Name</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STRUCTURAL_MODEL__NAME = eINSTANCE.getStructuralModel_Name();

		/**
		 * The meta object literal for the '<em><b>Title</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STRUCTURAL_MODEL__TITLE = eINSTANCE.getStructuralModel_Title();

		/**
		 * The meta object literal for the '<em><b>Notes</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STRUCTURAL_MODEL__NOTES = eINSTANCE.getStructuralModel_Notes();

		/**
		 * The meta object literal for the '<em><b>Units</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STRUCTURAL_MODEL__UNITS = eINSTANCE.getStructuralModel_Units();

		/**
		 * The meta object literal for the '<em><b>Gravity</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STRUCTURAL_MODEL__GRAVITY = eINSTANCE.getStructuralModel_Gravity();

		/**
		 * The meta object literal for the '<em><b>Mass Formulation</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STRUCTURAL_MODEL__MASS_FORMULATION = eINSTANCE.getStructuralModel_MassFormulation();

		/**
		 * The meta object literal for the '<em><b>Shear Deformation</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STRUCTURAL_MODEL__SHEAR_DEFORMATION = eINSTANCE.getStructuralModel_ShearDeformation();

		/**
		 * The meta object literal for the '<em><b>Self Mass Factor</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STRUCTURAL_MODEL__SELF_MASS_FACTOR = eINSTANCE.getStructuralModel_SelfMassFactor();

		/**
		 * The meta object literal for the '<em><b>Materials</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRUCTURAL_MODEL__MATERIALS = eINSTANCE.getStructuralModel_Materials();

		/**
		 * The meta object literal for the '<em><b>Frame Sections</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRUCTURAL_MODEL__FRAME_SECTIONS = eINSTANCE.getStructuralModel_FrameSections();

		/**
		 * The meta object literal for the '<em><b>Groups</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRUCTURAL_MODEL__GROUPS = eINSTANCE.getStructuralModel_Groups();

		/**
		 * The meta object literal for the '<em><b>Levels</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRUCTURAL_MODEL__LEVELS = eINSTANCE.getStructuralModel_Levels();

		/**
		 * The meta object literal for the '<em><b>Nodes</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRUCTURAL_MODEL__NODES = eINSTANCE.getStructuralModel_Nodes();

		/**
		 * The meta object literal for the '<em><b>Members</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRUCTURAL_MODEL__MEMBERS = eINSTANCE.getStructuralModel_Members();

		/**
		 * The meta object literal for the '<em><b>Springs</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRUCTURAL_MODEL__SPRINGS = eINSTANCE.getStructuralModel_Springs();

		/**
		 * The meta object literal for the '<em><b>Supports</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRUCTURAL_MODEL__SUPPORTS = eINSTANCE.getStructuralModel_Supports();

		/**
		 * The meta object literal for the '<em><b>Masses</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRUCTURAL_MODEL__MASSES = eINSTANCE.getStructuralModel_Masses();

		/**
		 * The meta object literal for the '<em><b>Rigid Floors</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRUCTURAL_MODEL__RIGID_FLOORS = eINSTANCE.getStructuralModel_RigidFloors();

		/**
		 * The meta object literal for the '<em><b>Rigid Links</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRUCTURAL_MODEL__RIGID_LINKS = eINSTANCE.getStructuralModel_RigidLinks();

		/**
		 * The meta object literal for the '<em><b>Ties</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRUCTURAL_MODEL__TIES = eINSTANCE.getStructuralModel_Ties();

		/**
		 * The meta object literal for the '<em><b>Load Patterns</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRUCTURAL_MODEL__LOAD_PATTERNS = eINSTANCE.getStructuralModel_LoadPatterns();

		/**
		 * The meta object literal for the '<em><b>Analysis</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRUCTURAL_MODEL__ANALYSIS = eINSTANCE.getStructuralModel_Analysis();

		/**
		 * The meta object literal for the '<em><b>Audit</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRUCTURAL_MODEL__AUDIT = eINSTANCE.getStructuralModel_Audit();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.NodeImpl <em>Node</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.NodeImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getNode()
		 * @generated
		 */
		EClass NODE = eINSTANCE.getNode();

		/**
		 * The meta object literal for the '<em><b>X</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute NODE__X = eINSTANCE.getNode_X();

		/**
		 * The meta object literal for the '<em><b>Y</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute NODE__Y = eINSTANCE.getNode_Y();

		/**
		 * The meta object literal for the '<em><b>Z</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute NODE__Z = eINSTANCE.getNode_Z();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.MaterialImpl <em>Material</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.MaterialImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getMaterial()
		 * @generated
		 */
		EClass MATERIAL = eINSTANCE.getMaterial();

		/**
		 * The meta object literal for the '<em><b>Young</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MATERIAL__YOUNG = eINSTANCE.getMaterial_Young();

		/**
		 * The meta object literal for the '<em><b>Poisson</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MATERIAL__POISSON = eINSTANCE.getMaterial_Poisson();

		/**
		 * The meta object literal for the '<em><b>Density</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MATERIAL__DENSITY = eINSTANCE.getMaterial_Density();

		/**
		 * The meta object literal for the '<em><b>Shear</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MATERIAL__SHEAR = eINSTANCE.getMaterial_Shear();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.FrameSectionImpl <em>Frame Section</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.FrameSectionImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getFrameSection()
		 * @generated
		 */
		EClass FRAME_SECTION = eINSTANCE.getFrameSection();

		/**
		 * The meta object literal for the '<em><b>Area</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FRAME_SECTION__AREA = eINSTANCE.getFrameSection_Area();

		/**
		 * The meta object literal for the '<em><b>Iy</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FRAME_SECTION__IY = eINSTANCE.getFrameSection_Iy();

		/**
		 * The meta object literal for the '<em><b>Iz</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FRAME_SECTION__IZ = eINSTANCE.getFrameSection_Iz();

		/**
		 * The meta object literal for the '<em><b>Torsion</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FRAME_SECTION__TORSION = eINSTANCE.getFrameSection_Torsion();

		/**
		 * The meta object literal for the '<em><b>Shear Area Y</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FRAME_SECTION__SHEAR_AREA_Y = eINSTANCE.getFrameSection_ShearAreaY();

		/**
		 * The meta object literal for the '<em><b>Shear Area Z</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FRAME_SECTION__SHEAR_AREA_Z = eINSTANCE.getFrameSection_ShearAreaZ();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.GroupImpl <em>Group</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.GroupImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getGroup()
		 * @generated
		 */
		EClass GROUP = eINSTANCE.getGroup();

		/**
		 * The meta object literal for the '<em><b>Description</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GROUP__DESCRIPTION = eINSTANCE.getGroup_Description();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.LevelImpl <em>Level</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.LevelImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getLevel()
		 * @generated
		 */
		EClass LEVEL = eINSTANCE.getLevel();

		/**
		 * The meta object literal for the '<em><b>Elevation</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LEVEL__ELEVATION = eINSTANCE.getLevel_Elevation();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.GroupedImpl <em>Grouped</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.GroupedImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getGrouped()
		 * @generated
		 */
		EClass GROUPED = eINSTANCE.getGrouped();

		/**
		 * The meta object literal for the '<em><b>Group</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference GROUPED__GROUP = eINSTANCE.getGrouped_Group();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.VectorImpl <em>Vector</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.VectorImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getVector()
		 * @generated
		 */
		EClass VECTOR = eINSTANCE.getVector();

		/**
		 * The meta object literal for the '<em><b>X</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute VECTOR__X = eINSTANCE.getVector_X();

		/**
		 * The meta object literal for the '<em><b>Y</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute VECTOR__Y = eINSTANCE.getVector_Y();

		/**
		 * The meta object literal for the '<em><b>Z</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute VECTOR__Z = eINSTANCE.getVector_Z();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.MemberImpl <em>Member</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.MemberImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getMember()
		 * @generated
		 */
		EClass MEMBER = eINSTANCE.getMember();

		/**
		 * The meta object literal for the '<em><b>Start</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference MEMBER__START = eINSTANCE.getMember_Start();

		/**
		 * The meta object literal for the '<em><b>End</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference MEMBER__END = eINSTANCE.getMember_End();

		/**
		 * The meta object literal for the '<em><b>Section</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference MEMBER__SECTION = eINSTANCE.getMember_Section();

		/**
		 * The meta object literal for the '<em><b>Material</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference MEMBER__MATERIAL = eINSTANCE.getMember_Material();

		/**
		 * The meta object literal for the '<em><b>Roll</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MEMBER__ROLL = eINSTANCE.getMember_Roll();

		/**
		 * The meta object literal for the '<em><b>Start Free</b></em>' attribute list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MEMBER__START_FREE = eINSTANCE.getMember_StartFree();

		/**
		 * The meta object literal for the '<em><b>End Free</b></em>' attribute list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MEMBER__END_FREE = eINSTANCE.getMember_EndFree();

		/**
		 * The meta object literal for the '<em><b>Start Rigid</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MEMBER__START_RIGID = eINSTANCE.getMember_StartRigid();

		/**
		 * The meta object literal for the '<em><b>End Rigid</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MEMBER__END_RIGID = eINSTANCE.getMember_EndRigid();

		/**
		 * The meta object literal for the '<em><b>Start Offset</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference MEMBER__START_OFFSET = eINSTANCE.getMember_StartOffset();

		/**
		 * The meta object literal for the '<em><b>End Offset</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference MEMBER__END_OFFSET = eINSTANCE.getMember_EndOffset();

		/**
		 * The meta object literal for the '<em><b>Axial Only</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MEMBER__AXIAL_ONLY = eINSTANCE.getMember_AxialOnly();

		/**
		 * The meta object literal for the '<em><b>Axial Force</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MEMBER__AXIAL_FORCE = eINSTANCE.getMember_AxialForce();

		/**
		 * The meta object literal for the '<em><b>Mass</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MEMBER__MASS = eINSTANCE.getMember_Mass();

		/**
		 * The meta object literal for the '<em><b>Axial Factor</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MEMBER__AXIAL_FACTOR = eINSTANCE.getMember_AxialFactor();

		/**
		 * The meta object literal for the '<em><b>Shear YFactor</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MEMBER__SHEAR_YFACTOR = eINSTANCE.getMember_ShearYFactor();

		/**
		 * The meta object literal for the '<em><b>Shear ZFactor</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MEMBER__SHEAR_ZFACTOR = eINSTANCE.getMember_ShearZFactor();

		/**
		 * The meta object literal for the '<em><b>Torsion Factor</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MEMBER__TORSION_FACTOR = eINSTANCE.getMember_TorsionFactor();

		/**
		 * The meta object literal for the '<em><b>Bending YFactor</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MEMBER__BENDING_YFACTOR = eINSTANCE.getMember_BendingYFactor();

		/**
		 * The meta object literal for the '<em><b>Bending ZFactor</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute MEMBER__BENDING_ZFACTOR = eINSTANCE.getMember_BendingZFactor();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.SpringCouplingImpl <em>Spring Coupling</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.SpringCouplingImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getSpringCoupling()
		 * @generated
		 */
		EClass SPRING_COUPLING = eINSTANCE.getSpringCoupling();

		/**
		 * The meta object literal for the '<em><b>First</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SPRING_COUPLING__FIRST = eINSTANCE.getSpringCoupling_First();

		/**
		 * The meta object literal for the '<em><b>Second</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SPRING_COUPLING__SECOND = eINSTANCE.getSpringCoupling_Second();

		/**
		 * The meta object literal for the '<em><b>Stiffness</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SPRING_COUPLING__STIFFNESS = eINSTANCE.getSpringCoupling_Stiffness();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.SpringImpl <em>Spring</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.SpringImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getSpring()
		 * @generated
		 */
		EClass SPRING = eINSTANCE.getSpring();

		/**
		 * The meta object literal for the '<em><b>Node</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference SPRING__NODE = eINSTANCE.getSpring_Node();

		/**
		 * The meta object literal for the '<em><b>To</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference SPRING__TO = eINSTANCE.getSpring_To();

		/**
		 * The meta object literal for the '<em><b>Ux</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SPRING__UX = eINSTANCE.getSpring_Ux();

		/**
		 * The meta object literal for the '<em><b>Uy</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SPRING__UY = eINSTANCE.getSpring_Uy();

		/**
		 * The meta object literal for the '<em><b>Uz</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SPRING__UZ = eINSTANCE.getSpring_Uz();

		/**
		 * The meta object literal for the '<em><b>Rx</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SPRING__RX = eINSTANCE.getSpring_Rx();

		/**
		 * The meta object literal for the '<em><b>Ry</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SPRING__RY = eINSTANCE.getSpring_Ry();

		/**
		 * The meta object literal for the '<em><b>Rz</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SPRING__RZ = eINSTANCE.getSpring_Rz();

		/**
		 * The meta object literal for the '<em><b>Couplings</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference SPRING__COUPLINGS = eINSTANCE.getSpring_Couplings();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.SupportImpl <em>Support</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.SupportImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getSupport()
		 * @generated
		 */
		EClass SUPPORT = eINSTANCE.getSupport();

		/**
		 * The meta object literal for the '<em><b>Node</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference SUPPORT__NODE = eINSTANCE.getSupport_Node();

		/**
		 * The meta object literal for the '<em><b>Ux</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SUPPORT__UX = eINSTANCE.getSupport_Ux();

		/**
		 * The meta object literal for the '<em><b>Uy</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SUPPORT__UY = eINSTANCE.getSupport_Uy();

		/**
		 * The meta object literal for the '<em><b>Uz</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SUPPORT__UZ = eINSTANCE.getSupport_Uz();

		/**
		 * The meta object literal for the '<em><b>Rx</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SUPPORT__RX = eINSTANCE.getSupport_Rx();

		/**
		 * The meta object literal for the '<em><b>Ry</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SUPPORT__RY = eINSTANCE.getSupport_Ry();

		/**
		 * The meta object literal for the '<em><b>Rz</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SUPPORT__RZ = eINSTANCE.getSupport_Rz();

		/**
		 * The meta object literal for the '<em><b>Elastic Ux</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SUPPORT__ELASTIC_UX = eINSTANCE.getSupport_ElasticUx();

		/**
		 * The meta object literal for the '<em><b>Elastic Uy</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SUPPORT__ELASTIC_UY = eINSTANCE.getSupport_ElasticUy();

		/**
		 * The meta object literal for the '<em><b>Elastic Uz</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SUPPORT__ELASTIC_UZ = eINSTANCE.getSupport_ElasticUz();

		/**
		 * The meta object literal for the '<em><b>Elastic Rx</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SUPPORT__ELASTIC_RX = eINSTANCE.getSupport_ElasticRx();

		/**
		 * The meta object literal for the '<em><b>Elastic Ry</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SUPPORT__ELASTIC_RY = eINSTANCE.getSupport_ElasticRy();

		/**
		 * The meta object literal for the '<em><b>Elastic Rz</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SUPPORT__ELASTIC_RZ = eINSTANCE.getSupport_ElasticRz();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.NodalMassImpl <em>Nodal Mass</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.NodalMassImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getNodalMass()
		 * @generated
		 */
		EClass NODAL_MASS = eINSTANCE.getNodalMass();

		/**
		 * The meta object literal for the '<em><b>Node</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference NODAL_MASS__NODE = eINSTANCE.getNodalMass_Node();

		/**
		 * The meta object literal for the '<em><b>Ux</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute NODAL_MASS__UX = eINSTANCE.getNodalMass_Ux();

		/**
		 * The meta object literal for the '<em><b>Uy</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute NODAL_MASS__UY = eINSTANCE.getNodalMass_Uy();

		/**
		 * The meta object literal for the '<em><b>Uz</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute NODAL_MASS__UZ = eINSTANCE.getNodalMass_Uz();

		/**
		 * The meta object literal for the '<em><b>Rx</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute NODAL_MASS__RX = eINSTANCE.getNodalMass_Rx();

		/**
		 * The meta object literal for the '<em><b>Ry</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute NODAL_MASS__RY = eINSTANCE.getNodalMass_Ry();

		/**
		 * The meta object literal for the '<em><b>Rz</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute NODAL_MASS__RZ = eINSTANCE.getNodalMass_Rz();

		/**
		 * The meta object literal for the '<em><b>Offset</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference NODAL_MASS__OFFSET = eINSTANCE.getNodalMass_Offset();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.RigidFloorImpl <em>Rigid Floor</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.RigidFloorImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getRigidFloor()
		 * @generated
		 */
		EClass RIGID_FLOOR = eINSTANCE.getRigidFloor();

		/**
		 * The meta object literal for the '<em><b>Nodes</b></em>' reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference RIGID_FLOOR__NODES = eINSTANCE.getRigidFloor_Nodes();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.RigidLinkImpl <em>Rigid Link</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.RigidLinkImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getRigidLink()
		 * @generated
		 */
		EClass RIGID_LINK = eINSTANCE.getRigidLink();

		/**
		 * The meta object literal for the '<em><b>From</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference RIGID_LINK__FROM = eINSTANCE.getRigidLink_From();

		/**
		 * The meta object literal for the '<em><b>To</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference RIGID_LINK__TO = eINSTANCE.getRigidLink_To();

		/**
		 * The meta object literal for the '<em><b>Components</b></em>' attribute list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute RIGID_LINK__COMPONENTS = eINSTANCE.getRigidLink_Components();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.TieTermImpl <em>Tie Term</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.TieTermImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getTieTerm()
		 * @generated
		 */
		EClass TIE_TERM = eINSTANCE.getTieTerm();

		/**
		 * The meta object literal for the '<em><b>Node</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference TIE_TERM__NODE = eINSTANCE.getTieTerm_Node();

		/**
		 * The meta object literal for the '<em><b>Component</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute TIE_TERM__COMPONENT = eINSTANCE.getTieTerm_Component();

		/**
		 * The meta object literal for the '<em><b>Factor</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute TIE_TERM__FACTOR = eINSTANCE.getTieTerm_Factor();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.MultiPointTieImpl <em>Multi Point Tie</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.MultiPointTieImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getMultiPointTie()
		 * @generated
		 */
		EClass MULTI_POINT_TIE = eINSTANCE.getMultiPointTie();

		/**
		 * The meta object literal for the '<em><b>Terms</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference MULTI_POINT_TIE__TERMS = eINSTANCE.getMultiPointTie_Terms();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.LoadPatternImpl <em>Load Pattern</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.LoadPatternImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getLoadPattern()
		 * @generated
		 */
		EClass LOAD_PATTERN = eINSTANCE.getLoadPattern();

		/**
		 * The meta object literal for the '<em><b>Mass Factor</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LOAD_PATTERN__MASS_FACTOR = eINSTANCE.getLoadPattern_MassFactor();

		/**
		 * The meta object literal for the '<em><b>Loads</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference LOAD_PATTERN__LOADS = eINSTANCE.getLoadPattern_Loads();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.GravityLoadImpl <em>Gravity Load</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.GravityLoadImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getGravityLoad()
		 * @generated
		 */
		EClass GRAVITY_LOAD = eINSTANCE.getGravityLoad();

		/**
		 * The meta object literal for the '<em><b>Value</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GRAVITY_LOAD__VALUE = eINSTANCE.getGravityLoad_Value();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.NodeLoadImpl <em>Node Load</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.NodeLoadImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getNodeLoad()
		 * @generated
		 */
		EClass NODE_LOAD = eINSTANCE.getNodeLoad();

		/**
		 * The meta object literal for the '<em><b>Node</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference NODE_LOAD__NODE = eINSTANCE.getNodeLoad_Node();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.MemberLoadImpl <em>Member Load</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.MemberLoadImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getMemberLoad()
		 * @generated
		 */
		EClass MEMBER_LOAD = eINSTANCE.getMemberLoad();

		/**
		 * The meta object literal for the '<em><b>Member</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference MEMBER_LOAD__MEMBER = eINSTANCE.getMemberLoad_Member();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.AnalysisSettingsImpl <em>Analysis Settings</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.AnalysisSettingsImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getAnalysisSettings()
		 * @generated
		 */
		EClass ANALYSIS_SETTINGS = eINSTANCE.getAnalysisSettings();

		/**
		 * The meta object literal for the '<em><b>Modes</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ANALYSIS_SETTINGS__MODES = eINSTANCE.getAnalysisSettings_Modes();

		/**
		 * The meta object literal for the '<em><b>Below</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ANALYSIS_SETTINGS__BELOW = eINSTANCE.getAnalysisSettings_Below();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.impl.AuditSettingsImpl <em>Audit Settings</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.impl.AuditSettingsImpl
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getAuditSettings()
		 * @generated
		 */
		EClass AUDIT_SETTINGS = eINSTANCE.getAuditSettings();

		/**
		 * The meta object literal for the '<em><b>Rule Pack</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute AUDIT_SETTINGS__RULE_PACK = eINSTANCE.getAuditSettings_RulePack();

		/**
		 * The meta object literal for the '<em><b>X</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute AUDIT_SETTINGS__X = eINSTANCE.getAuditSettings_X();

		/**
		 * The meta object literal for the '<em><b>Y</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute AUDIT_SETTINGS__Y = eINSTANCE.getAuditSettings_Y();

		/**
		 * The meta object literal for the '<em><b>Z</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute AUDIT_SETTINGS__Z = eINSTANCE.getAuditSettings_Z();

		/**
		 * The meta object literal for the '<em><b>Local Nodes</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute AUDIT_SETTINGS__LOCAL_NODES = eINSTANCE.getAuditSettings_LocalNodes();

		/**
		 * The meta object literal for the '<em><b>Coincidence</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute AUDIT_SETTINGS__COINCIDENCE = eINSTANCE.getAuditSettings_Coincidence();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.UnitSystem <em>Unit System</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.UnitSystem
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getUnitSystem()
		 * @generated
		 */
		EEnum UNIT_SYSTEM = eINSTANCE.getUnitSystem();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.MassFormulation <em>Mass Formulation</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.MassFormulation
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getMassFormulation()
		 * @generated
		 */
		EEnum MASS_FORMULATION = eINSTANCE.getMassFormulation();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.MemberMass <em>Member Mass</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.MemberMass
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getMemberMass()
		 * @generated
		 */
		EEnum MEMBER_MASS = eINSTANCE.getMemberMass();

		/**
		 * The meta object literal for the '{@link org.modewright.model.structure.Component <em>Component</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see org.modewright.model.structure.Component
		 * @see org.modewright.model.structure.impl.StructurePackageImpl#getComponent()
		 * @generated
		 */
		EEnum COMPONENT = eINSTANCE.getComponent();

	}

} //StructurePackage
