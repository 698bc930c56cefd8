/**
 */
package org.modewright.model.structure;

import org.eclipse.emf.common.util.EList;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Structural Model</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A structure as its user describes it, in the unit system it states. Z is up.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getFormatVersion <em>Format Version</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getName <em>Name</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getTitle <em>Title</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getNotes <em>Notes</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getUnits <em>Units</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getGravity <em>Gravity</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getMassFormulation <em>Mass Formulation</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#isShearDeformation <em>Shear Deformation</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getSelfMassFactor <em>Self Mass Factor</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getMaterials <em>Materials</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getFrameSections <em>Frame Sections</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getGroups <em>Groups</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getLevels <em>Levels</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getNodes <em>Nodes</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getMembers <em>Members</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getSprings <em>Springs</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getSupports <em>Supports</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getMasses <em>Masses</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getRigidFloors <em>Rigid Floors</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getRigidLinks <em>Rigid Links</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getTies <em>Ties</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getLoadPatterns <em>Load Patterns</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getAnalysis <em>Analysis</em>}</li>
 *   <li>{@link org.modewright.model.structure.StructuralModel#getAudit <em>Audit</em>}</li>
 * </ul>
 *
 * @see org.modewright.model.structure.StructurePackage#getStructuralModel()
 * @generated
 */
public interface StructuralModel extends EObject {
	/**
	 * Returns the value of the '<em><b>Format Version</b></em>' attribute.
	 * The default value is <code>"1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Version of the file format.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Format Version</em>' attribute.
	 * @see #setFormatVersion(int)
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_FormatVersion()
	 * @generated
	 */
	int getFormatVersion();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.StructuralModel#getFormatVersion <em>Format Version</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Format Version</em>' attribute.
	 * @see #getFormatVersion()
	 * @generated
	 */
	void setFormatVersion(int value);

	/**
	 * Returns the value of the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Short name of the model.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Name</em>' attribute.
	 * @see #setName(String)
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_Name()
	 * @generated
	 */
	String getName();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.StructuralModel#getName <em>Name</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Name</em>' attribute.
	 * @see #getName()
	 * @generated
	 */
	void setName(String value);

	/**
	 * Returns the value of the '<em><b>Title</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Title for people.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Title</em>' attribute.
	 * @see #setTitle(String)
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_Title()
	 * @generated
	 */
	String getTitle();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.StructuralModel#getTitle <em>Title</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Title</em>' attribute.
	 * @see #getTitle()
	 * @generated
	 */
	void setTitle(String value);

	/**
	 * Returns the value of the '<em><b>Notes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Remarks: scenario, assumptions, sources.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Notes</em>' attribute.
	 * @see #setNotes(String)
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_Notes()
	 * @generated
	 */
	String getNotes();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.StructuralModel#getNotes <em>Notes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Notes</em>' attribute.
	 * @see #getNotes()
	 * @generated
	 */
	void setNotes(String value);

	/**
	 * Returns the value of the '<em><b>Units</b></em>' attribute.
	 * The default value is <code>"kN-m-t"</code>.
	 * The literals are from the enumeration {@link org.modewright.model.structure.UnitSystem}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Unit system of every quantity in this model.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Units</em>' attribute.
	 * @see org.modewright.model.structure.UnitSystem
	 * @see #setUnits(UnitSystem)
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_Units()
	 * @generated
	 */
	UnitSystem getUnits();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.StructuralModel#getUnits <em>Units</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Units</em>' attribute.
	 * @see org.modewright.model.structure.UnitSystem
	 * @see #getUnits()
	 * @generated
	 */
	void setUnits(UnitSystem value);

	/**
	 * Returns the value of the '<em><b>Gravity</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Acceleration of gravity, length per second squared; 0: standard gravity, 9.80665 m/s2.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Gravity</em>' attribute.
	 * @see #setGravity(double)
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_Gravity()
	 * @generated
	 */
	double getGravity();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.StructuralModel#getGravity <em>Gravity</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Gravity</em>' attribute.
	 * @see #getGravity()
	 * @generated
	 */
	void setGravity(double value);

	/**
	 * Returns the value of the '<em><b>Mass Formulation</b></em>' attribute.
	 * The default value is <code>"consistent"</code>.
	 * The literals are from the enumeration {@link org.modewright.model.structure.MassFormulation}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * How members spread their mass, unless a member says otherwise.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Mass Formulation</em>' attribute.
	 * @see org.modewright.model.structure.MassFormulation
	 * @see #setMassFormulation(MassFormulation)
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_MassFormulation()
	 * @generated
	 */
	MassFormulation getMassFormulation();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.StructuralModel#getMassFormulation <em>Mass Formulation</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Mass Formulation</em>' attribute.
	 * @see org.modewright.model.structure.MassFormulation
	 * @see #getMassFormulation()
	 * @generated
	 */
	void setMassFormulation(MassFormulation value);

	/**
	 * Returns the value of the '<em><b>Shear Deformation</b></em>' attribute.
	 * The default value is <code>"true"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Whether members deform in shear; if not, all shear areas are ignored.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Shear Deformation</em>' attribute.
	 * @see #setShearDeformation(boolean)
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_ShearDeformation()
	 * @generated
	 */
	boolean isShearDeformation();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.StructuralModel#isShearDeformation <em>Shear Deformation</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Shear Deformation</em>' attribute.
	 * @see #isShearDeformation()
	 * @generated
	 */
	void setShearDeformation(boolean value);

	/**
	 * Returns the value of the '<em><b>Self Mass Factor</b></em>' attribute.
	 * The default value is <code>"1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Share of the elements' own mass in the seismic mass.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Self Mass Factor</em>' attribute.
	 * @see #setSelfMassFactor(double)
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_SelfMassFactor()
	 * @generated
	 */
	double getSelfMassFactor();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.StructuralModel#getSelfMassFactor <em>Self Mass Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Self Mass Factor</em>' attribute.
	 * @see #getSelfMassFactor()
	 * @generated
	 */
	void setSelfMassFactor(double value);

	/**
	 * Returns the value of the '<em><b>Materials</b></em>' containment reference list.
	 * The list contents are of type {@link org.modewright.model.structure.Material}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Materials.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Materials</em>' containment reference list.
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_Materials()
	 * @generated
	 */
	EList<Material> getMaterials();

	/**
	 * Returns the value of the '<em><b>Frame Sections</b></em>' containment reference list.
	 * The list contents are of type {@link org.modewright.model.structure.FrameSection}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Sections of frame members.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Frame Sections</em>' containment reference list.
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_FrameSections()
	 * @generated
	 */
	EList<FrameSection> getFrameSections();

	/**
	 * Returns the value of the '<em><b>Groups</b></em>' containment reference list.
	 * The list contents are of type {@link org.modewright.model.structure.Group}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Groups of elements.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Groups</em>' containment reference list.
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_Groups()
	 * @generated
	 */
	EList<Group> getGroups();

	/**
	 * Returns the value of the '<em><b>Levels</b></em>' containment reference list.
	 * The list contents are of type {@link org.modewright.model.structure.Level}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Levels (storeys).
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Levels</em>' containment reference list.
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_Levels()
	 * @generated
	 */
	EList<Level> getLevels();

	/**
	 * Returns the value of the '<em><b>Nodes</b></em>' containment reference list.
	 * The list contents are of type {@link org.modewright.model.structure.Node}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Nodes.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Nodes</em>' containment reference list.
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_Nodes()
	 * @generated
	 */
	EList<Node> getNodes();

	/**
	 * Returns the value of the '<em><b>Members</b></em>' containment reference list.
	 * The list contents are of type {@link org.modewright.model.structure.Member}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Frame members and bars.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Members</em>' containment reference list.
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_Members()
	 * @generated
	 */
	EList<Member> getMembers();

	/**
	 * Returns the value of the '<em><b>Springs</b></em>' containment reference list.
	 * The list contents are of type {@link org.modewright.model.structure.Spring}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Springs to ground and between nodes.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Springs</em>' containment reference list.
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_Springs()
	 * @generated
	 */
	EList<Spring> getSprings();

	/**
	 * Returns the value of the '<em><b>Supports</b></em>' containment reference list.
	 * The list contents are of type {@link org.modewright.model.structure.Support}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Supports.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Supports</em>' containment reference list.
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_Supports()
	 * @generated
	 */
	EList<Support> getSupports();

	/**
	 * Returns the value of the '<em><b>Masses</b></em>' containment reference list.
	 * The list contents are of type {@link org.modewright.model.structure.NodalMass}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Nodal masses.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Masses</em>' containment reference list.
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_Masses()
	 * @generated
	 */
	EList<NodalMass> getMasses();

	/**
	 * Returns the value of the '<em><b>Rigid Floors</b></em>' containment reference list.
	 * The list contents are of type {@link org.modewright.model.structure.RigidFloor}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Floors rigid in their plane.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Rigid Floors</em>' containment reference list.
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_RigidFloors()
	 * @generated
	 */
	EList<RigidFloor> getRigidFloors();

	/**
	 * Returns the value of the '<em><b>Rigid Links</b></em>' containment reference list.
	 * The list contents are of type {@link org.modewright.model.structure.RigidLink}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Rigid links.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Rigid Links</em>' containment reference list.
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_RigidLinks()
	 * @generated
	 */
	EList<RigidLink> getRigidLinks();

	/**
	 * Returns the value of the '<em><b>Ties</b></em>' containment reference list.
	 * The list contents are of type {@link org.modewright.model.structure.MultiPointTie}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Multi-point ties.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Ties</em>' containment reference list.
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_Ties()
	 * @generated
	 */
	EList<MultiPointTie> getTies();

	/**
	 * Returns the value of the '<em><b>Load Patterns</b></em>' containment reference list.
	 * The list contents are of type {@link org.modewright.model.structure.LoadPattern}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Gravity load patterns.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Load Patterns</em>' containment reference list.
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_LoadPatterns()
	 * @generated
	 */
	EList<LoadPattern> getLoadPatterns();

	/**
	 * Returns the value of the '<em><b>Analysis</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * What is solved.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Analysis</em>' containment reference.
	 * @see #setAnalysis(AnalysisSettings)
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_Analysis()
	 * @generated
	 */
	AnalysisSettings getAnalysis();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.StructuralModel#getAnalysis <em>Analysis</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Analysis</em>' containment reference.
	 * @see #getAnalysis()
	 * @generated
	 */
	void setAnalysis(AnalysisSettings value);

	/**
	 * Returns the value of the '<em><b>Audit</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * How it is judged.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Audit</em>' containment reference.
	 * @see #setAudit(AuditSettings)
	 * @see org.modewright.model.structure.StructurePackage#getStructuralModel_Audit()
	 * @generated
	 */
	AuditSettings getAudit();

	/**
	 * Sets the value of the '{@link org.modewright.model.structure.StructuralModel#getAudit <em>Audit</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Audit</em>' containment reference.
	 * @see #getAudit()
	 * @generated
	 */
	void setAudit(AuditSettings value);

} // StructuralModel
