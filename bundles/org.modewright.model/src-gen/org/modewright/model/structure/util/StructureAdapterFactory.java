/**
 */
package org.modewright.model.structure.util;

import org.eclipse.emf.common.notify.Adapter;
import org.eclipse.emf.common.notify.Notifier;

import org.eclipse.emf.common.notify.impl.AdapterFactoryImpl;

import org.eclipse.emf.ecore.EObject;

import org.modewright.model.structure.*;

/**
 * <!-- begin-user-doc -->
 * The <b>Adapter Factory</b> for the model.
 * It provides an adapter <code>createXXX</code> method for each class of the model.
 * <!-- end-user-doc -->
 * @see org.modewright.model.structure.StructurePackage
 * @generated
 */
public class StructureAdapterFactory extends AdapterFactoryImpl {
	/**
	 * The cached model package.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected static StructurePackage modelPackage;

	/**
	 * Creates an instance of the adapter factory.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public StructureAdapterFactory() {
		if (modelPackage == null) {
			modelPackage = StructurePackage.eINSTANCE;
		}
	}

	/**
	 * Returns whether this factory is applicable for the type of the object.
	 * <!-- begin-user-doc -->
	 * This implementation returns <code>true</code> if the object is either the model's package or is an instance object of the model.
	 * <!-- end-user-doc -->
	 * @return whether this factory is applicable for the type of the object.
	 * @generated
	 */
	@Override
	public boolean isFactoryForType(Object object) {
		if (object == modelPackage) {
			return true;
		}
		if (object instanceof EObject) {
			return ((EObject)object).eClass().getEPackage() == modelPackage;
		}
		return false;
	}

	/**
	 * The switch that delegates to the <code>createXXX</code> methods.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected StructureSwitch<Adapter> modelSwitch =
		new StructureSwitch<Adapter>() {
			@Override
			public Adapter caseIdentified(Identified object) {
				return createIdentifiedAdapter();
			}
			@Override
			public Adapter caseStructuralModel(StructuralModel object) {
				return createStructuralModelAdapter();
			}
			@Override
			public Adapter caseNode(Node object) {
				return createNodeAdapter();
			}
			@Override
			public Adapter caseMaterial(Material object) {
				return createMaterialAdapter();
			}
			@Override
			public Adapter caseFrameSection(FrameSection object) {
				return createFrameSectionAdapter();
			}
			@Override
			public Adapter caseGroup(Group object) {
				return createGroupAdapter();
			}
			@Override
			public Adapter caseLevel(Level object) {
				return createLevelAdapter();
			}
			@Override
			public Adapter caseGrouped(Grouped object) {
				return createGroupedAdapter();
			}
			@Override
			public Adapter caseVector(Vector object) {
				return createVectorAdapter();
			}
			@Override
			public Adapter caseMember(Member object) {
				return createMemberAdapter();
			}
			@Override
			public Adapter caseSpringCoupling(SpringCoupling object) {
				return createSpringCouplingAdapter();
			}
			@Override
			public Adapter caseSpring(Spring object) {
				return createSpringAdapter();
			}
			@Override
			public Adapter caseSupport(Support object) {
				return createSupportAdapter();
			}
			@Override
			public Adapter caseNodalMass(NodalMass object) {
				return createNodalMassAdapter();
			}
			@Override
			public Adapter caseRigidFloor(RigidFloor object) {
				return createRigidFloorAdapter();
			}
			@Override
			public Adapter caseRigidLink(RigidLink object) {
				return createRigidLinkAdapter();
			}
			@Override
			public Adapter caseTieTerm(TieTerm object) {
				return createTieTermAdapter();
			}
			@Override
			public Adapter caseMultiPointTie(MultiPointTie object) {
				return createMultiPointTieAdapter();
			}
			@Override
			public Adapter caseLoadPattern(LoadPattern object) {
				return createLoadPatternAdapter();
			}
			@Override
			public Adapter caseGravityLoad(GravityLoad object) {
				return createGravityLoadAdapter();
			}
			@Override
			public Adapter caseNodeLoad(NodeLoad object) {
				return createNodeLoadAdapter();
			}
			@Override
			public Adapter caseMemberLoad(MemberLoad object) {
				return createMemberLoadAdapter();
			}
			@Override
			public Adapter caseAnalysisSettings(AnalysisSettings object) {
				return createAnalysisSettingsAdapter();
			}
			@Override
			public Adapter caseAuditSettings(AuditSettings object) {
				return createAuditSettingsAdapter();
			}
			@Override
			public Adapter defaultCase(EObject object) {
				return createEObjectAdapter();
			}
		};

	/**
	 * Creates an adapter for the <code>target</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param target the object to adapt.
	 * @return the adapter for the <code>target</code>.
	 * @generated
	 */
	@Override
	public Adapter createAdapter(Notifier target) {
		return modelSwitch.doSwitch((EObject)target);
	}


	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.Identified <em>Identified</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.Identified
	 * @generated
	 */
	public Adapter createIdentifiedAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.StructuralModel <em>Structural Model</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.StructuralModel
	 * @generated
	 */
	public Adapter createStructuralModelAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.Node <em>Node</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.Node
	 * @generated
	 */
	public Adapter createNodeAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.Material <em>Material</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.Material
	 * @generated
	 */
	public Adapter createMaterialAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.FrameSection <em>Frame Section</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.FrameSection
	 * @generated
	 */
	public Adapter createFrameSectionAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.Group <em>Group</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.Group
	 * @generated
	 */
	public Adapter createGroupAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.Level <em>Level</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.Level
	 * @generated
	 */
	public Adapter createLevelAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.Grouped <em>Grouped</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.Grouped
	 * @generated
	 */
	public Adapter createGroupedAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.Vector <em>Vector</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.Vector
	 * @generated
	 */
	public Adapter createVectorAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.Member <em>Member</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.Member
	 * @generated
	 */
	public Adapter createMemberAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.SpringCoupling <em>Spring Coupling</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.SpringCoupling
	 * @generated
	 */
	public Adapter createSpringCouplingAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.Spring <em>Spring</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.Spring
	 * @generated
	 */
	public Adapter createSpringAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.Support <em>Support</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.Support
	 * @generated
	 */
	public Adapter createSupportAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.NodalMass <em>Nodal Mass</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.NodalMass
	 * @generated
	 */
	public Adapter createNodalMassAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.RigidFloor <em>Rigid Floor</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.RigidFloor
	 * @generated
	 */
	public Adapter createRigidFloorAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.RigidLink <em>Rigid Link</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.RigidLink
	 * @generated
	 */
	public Adapter createRigidLinkAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.TieTerm <em>Tie Term</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.TieTerm
	 * @generated
	 */
	public Adapter createTieTermAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.MultiPointTie <em>Multi Point Tie</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.MultiPointTie
	 * @generated
	 */
	public Adapter createMultiPointTieAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.LoadPattern <em>Load Pattern</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.LoadPattern
	 * @generated
	 */
	public Adapter createLoadPatternAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.GravityLoad <em>Gravity Load</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.GravityLoad
	 * @generated
	 */
	public Adapter createGravityLoadAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.NodeLoad <em>Node Load</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.NodeLoad
	 * @generated
	 */
	public Adapter createNodeLoadAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.MemberLoad <em>Member Load</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.MemberLoad
	 * @generated
	 */
	public Adapter createMemberLoadAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.AnalysisSettings <em>Analysis Settings</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.AnalysisSettings
	 * @generated
	 */
	public Adapter createAnalysisSettingsAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link org.modewright.model.structure.AuditSettings <em>Audit Settings</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see org.modewright.model.structure.AuditSettings
	 * @generated
	 */
	public Adapter createAuditSettingsAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for the default case.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @generated
	 */
	public Adapter createEObjectAdapter() {
		return null;
	}

} //StructureAdapterFactory
