/**
 */
package org.modewright.model.structure.impl;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EDataType;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EPackage;

import org.eclipse.emf.ecore.impl.EFactoryImpl;

import org.eclipse.emf.ecore.plugin.EcorePlugin;

import org.modewright.model.structure.*;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model <b>Factory</b>.
 * <!-- end-user-doc -->
 * @generated
 */
public class StructureFactoryImpl extends EFactoryImpl implements StructureFactory {
	/**
	 * Creates the default factory implementation.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static StructureFactory init() {
		try {
			StructureFactory theStructureFactory = (StructureFactory)EPackage.Registry.INSTANCE.getEFactory(StructurePackage.eNS_URI);
			if (theStructureFactory != null) {
				return theStructureFactory;
			}
		}
		catch (Exception exception) {
			EcorePlugin.INSTANCE.log(exception);
		}
		return new StructureFactoryImpl();
	}

	/**
	 * Creates an instance of the factory.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public StructureFactoryImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EObject create(EClass eClass) {
		switch (eClass.getClassifierID()) {
			case StructurePackage.STRUCTURAL_MODEL: return createStructuralModel();
			case StructurePackage.NODE: return createNode();
			case StructurePackage.MATERIAL: return createMaterial();
			case StructurePackage.FRAME_SECTION: return createFrameSection();
			case StructurePackage.GROUP: return createGroup();
			case StructurePackage.LEVEL: return createLevel();
			case StructurePackage.VECTOR: return createVector();
			case StructurePackage.MEMBER: return createMember();
			case StructurePackage.SPRING_COUPLING: return createSpringCoupling();
			case StructurePackage.SPRING: return createSpring();
			case StructurePackage.SUPPORT: return createSupport();
			case StructurePackage.NODAL_MASS: return createNodalMass();
			case StructurePackage.RIGID_FLOOR: return createRigidFloor();
			case StructurePackage.RIGID_LINK: return createRigidLink();
			case StructurePackage.TIE_TERM: return createTieTerm();
			case StructurePackage.MULTI_POINT_TIE: return createMultiPointTie();
			case StructurePackage.LOAD_PATTERN: return createLoadPattern();
			case StructurePackage.NODE_LOAD: return createNodeLoad();
			case StructurePackage.MEMBER_LOAD: return createMemberLoad();
			case StructurePackage.ANALYSIS_SETTINGS: return createAnalysisSettings();
			case StructurePackage.AUDIT_SETTINGS: return createAuditSettings();
			default:
				throw new IllegalArgumentException("The class '" + eClass.getName() + "' is not a valid classifier");
		}
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object createFromString(EDataType eDataType, String initialValue) {
		switch (eDataType.getClassifierID()) {
			case StructurePackage.UNIT_SYSTEM:
				return createUnitSystemFromString(eDataType, initialValue);
			case StructurePackage.MASS_FORMULATION:
				return createMassFormulationFromString(eDataType, initialValue);
			case StructurePackage.MEMBER_MASS:
				return createMemberMassFromString(eDataType, initialValue);
			case StructurePackage.COMPONENT:
				return createComponentFromString(eDataType, initialValue);
			default:
				throw new IllegalArgumentException("The datatype '" + eDataType.getName() + "' is not a valid classifier");
		}
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String convertToString(EDataType eDataType, Object instanceValue) {
		switch (eDataType.getClassifierID()) {
			case StructurePackage.UNIT_SYSTEM:
				return convertUnitSystemToString(eDataType, instanceValue);
			case StructurePackage.MASS_FORMULATION:
				return convertMassFormulationToString(eDataType, instanceValue);
			case StructurePackage.MEMBER_MASS:
				return convertMemberMassToString(eDataType, instanceValue);
			case StructurePackage.COMPONENT:
				return convertComponentToString(eDataType, instanceValue);
			default:
				throw new IllegalArgumentException("The datatype '" + eDataType.getName() + "' is not a valid classifier");
		}
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public StructuralModel createStructuralModel() {
		StructuralModelImpl structuralModel = new StructuralModelImpl();
		return structuralModel;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Node createNode() {
		NodeImpl node = new NodeImpl();
		return node;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Material createMaterial() {
		MaterialImpl material = new MaterialImpl();
		return material;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public FrameSection createFrameSection() {
		FrameSectionImpl frameSection = new FrameSectionImpl();
		return frameSection;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Group createGroup() {
		GroupImpl group = new GroupImpl();
		return group;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Level createLevel() {
		LevelImpl level = new LevelImpl();
		return level;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Vector createVector() {
		VectorImpl vector = new VectorImpl();
		return vector;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Member createMember() {
		MemberImpl member = new MemberImpl();
		return member;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public SpringCoupling createSpringCoupling() {
		SpringCouplingImpl springCoupling = new SpringCouplingImpl();
		return springCoupling;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Spring createSpring() {
		SpringImpl spring = new SpringImpl();
		return spring;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Support createSupport() {
		SupportImpl support = new SupportImpl();
		return support;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NodalMass createNodalMass() {
		NodalMassImpl nodalMass = new NodalMassImpl();
		return nodalMass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public RigidFloor createRigidFloor() {
		RigidFloorImpl rigidFloor = new RigidFloorImpl();
		return rigidFloor;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public RigidLink createRigidLink() {
		RigidLinkImpl rigidLink = new RigidLinkImpl();
		return rigidLink;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public TieTerm createTieTerm() {
		TieTermImpl tieTerm = new TieTermImpl();
		return tieTerm;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public MultiPointTie createMultiPointTie() {
		MultiPointTieImpl multiPointTie = new MultiPointTieImpl();
		return multiPointTie;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public LoadPattern createLoadPattern() {
		LoadPatternImpl loadPattern = new LoadPatternImpl();
		return loadPattern;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NodeLoad createNodeLoad() {
		NodeLoadImpl nodeLoad = new NodeLoadImpl();
		return nodeLoad;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public MemberLoad createMemberLoad() {
		MemberLoadImpl memberLoad = new MemberLoadImpl();
		return memberLoad;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public AnalysisSettings createAnalysisSettings() {
		AnalysisSettingsImpl analysisSettings = new AnalysisSettingsImpl();
		return analysisSettings;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public AuditSettings createAuditSettings() {
		AuditSettingsImpl auditSettings = new AuditSettingsImpl();
		return auditSettings;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public UnitSystem createUnitSystemFromString(EDataType eDataType, String initialValue) {
		UnitSystem result = UnitSystem.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertUnitSystemToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public MassFormulation createMassFormulationFromString(EDataType eDataType, String initialValue) {
		MassFormulation result = MassFormulation.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertMassFormulationToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public MemberMass createMemberMassFromString(EDataType eDataType, String initialValue) {
		MemberMass result = MemberMass.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertMemberMassToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Component createComponentFromString(EDataType eDataType, String initialValue) {
		Component result = Component.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertComponentToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public StructurePackage getStructurePackage() {
		return (StructurePackage)getEPackage();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @deprecated
	 * @generated
	 */
	@Deprecated
	public static StructurePackage getPackage() {
		return StructurePackage.eINSTANCE;
	}

} //StructureFactoryImpl
