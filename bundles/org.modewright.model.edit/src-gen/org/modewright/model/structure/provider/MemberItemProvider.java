/**
 */
package org.modewright.model.structure.provider;


import java.util.Collection;
import java.util.List;

import org.eclipse.emf.common.notify.AdapterFactory;
import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EStructuralFeature;

import org.eclipse.emf.edit.provider.ComposeableAdapterFactory;
import org.eclipse.emf.edit.provider.IItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.ItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.ViewerNotification;

import org.modewright.model.structure.Member;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.StructurePackage;

/**
 * This is the item provider adapter for a {@link org.modewright.model.structure.Member} object.
 * <!-- begin-user-doc -->
 * <!-- end-user-doc -->
 * @generated
 */
public class MemberItemProvider extends GroupedItemProvider {
	/**
	 * This constructs an instance from a factory and a notifier.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public MemberItemProvider(AdapterFactory adapterFactory) {
		super(adapterFactory);
	}

	/**
	 * This returns the property descriptors for the adapted class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public List<IItemPropertyDescriptor> getPropertyDescriptors(Object object) {
		if (itemPropertyDescriptors == null) {
			super.getPropertyDescriptors(object);

			addStartPropertyDescriptor(object);
			addEndPropertyDescriptor(object);
			addSectionPropertyDescriptor(object);
			addMaterialPropertyDescriptor(object);
			addRollPropertyDescriptor(object);
			addStartFreePropertyDescriptor(object);
			addEndFreePropertyDescriptor(object);
			addStartRigidPropertyDescriptor(object);
			addEndRigidPropertyDescriptor(object);
			addAxialOnlyPropertyDescriptor(object);
			addAxialForcePropertyDescriptor(object);
			addMassPropertyDescriptor(object);
			addAxialFactorPropertyDescriptor(object);
			addShearYFactorPropertyDescriptor(object);
			addShearZFactorPropertyDescriptor(object);
			addTorsionFactorPropertyDescriptor(object);
			addBendingYFactorPropertyDescriptor(object);
			addBendingZFactorPropertyDescriptor(object);
		}
		return itemPropertyDescriptors;
	}

	/**
	 * This adds a property descriptor for the Start feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addStartPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Member_start_feature"),
				 getString("_UI_Member_start_description"),
				 StructurePackage.Literals.MEMBER__START,
				 true,
				 false,
				 true,
				 null,
				 getString("_UI_GeometryPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the End feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addEndPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Member_end_feature"),
				 getString("_UI_Member_end_description"),
				 StructurePackage.Literals.MEMBER__END,
				 true,
				 false,
				 true,
				 null,
				 getString("_UI_GeometryPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Section feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addSectionPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Member_section_feature"),
				 getString("_UI_Member_section_description"),
				 StructurePackage.Literals.MEMBER__SECTION,
				 true,
				 false,
				 true,
				 null,
				 getString("_UI_PropertiesPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Material feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addMaterialPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Member_material_feature"),
				 getString("_UI_Member_material_description"),
				 StructurePackage.Literals.MEMBER__MATERIAL,
				 true,
				 false,
				 true,
				 null,
				 getString("_UI_PropertiesPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Roll feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addRollPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Member_roll_feature"),
				 getString("_UI_Member_roll_description"),
				 StructurePackage.Literals.MEMBER__ROLL,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 getString("_UI_GeometryPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Start Free feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addStartFreePropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Member_startFree_feature"),
				 getString("_UI_Member_startFree_description"),
				 StructurePackage.Literals.MEMBER__START_FREE,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 getString("_UI_EndsPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the End Free feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addEndFreePropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Member_endFree_feature"),
				 getString("_UI_Member_endFree_description"),
				 StructurePackage.Literals.MEMBER__END_FREE,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 getString("_UI_EndsPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Start Rigid feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addStartRigidPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Member_startRigid_feature"),
				 getString("_UI_Member_startRigid_description"),
				 StructurePackage.Literals.MEMBER__START_RIGID,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 getString("_UI_EndsPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the End Rigid feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addEndRigidPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Member_endRigid_feature"),
				 getString("_UI_Member_endRigid_description"),
				 StructurePackage.Literals.MEMBER__END_RIGID,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 getString("_UI_EndsPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Axial Only feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addAxialOnlyPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Member_axialOnly_feature"),
				 getString("_UI_Member_axialOnly_description"),
				 StructurePackage.Literals.MEMBER__AXIAL_ONLY,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.BOOLEAN_VALUE_IMAGE,
				 getString("_UI_PropertiesPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Axial Force feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addAxialForcePropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Member_axialForce_feature"),
				 getString("_UI_Member_axialForce_description"),
				 StructurePackage.Literals.MEMBER__AXIAL_FORCE,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 getString("_UI_PropertiesPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Mass feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addMassPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Member_mass_feature"),
				 getString("_UI_Member_mass_description"),
				 StructurePackage.Literals.MEMBER__MASS,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 getString("_UI_MassPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Axial Factor feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addAxialFactorPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Member_axialFactor_feature"),
				 getString("_UI_Member_axialFactor_description"),
				 StructurePackage.Literals.MEMBER__AXIAL_FACTOR,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 getString("_UI_EffectivestiffnessPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Shear YFactor feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addShearYFactorPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Member_shearYFactor_feature"),
				 getString("_UI_Member_shearYFactor_description"),
				 StructurePackage.Literals.MEMBER__SHEAR_YFACTOR,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 getString("_UI_EffectivestiffnessPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Shear ZFactor feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addShearZFactorPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Member_shearZFactor_feature"),
				 getString("_UI_Member_shearZFactor_description"),
				 StructurePackage.Literals.MEMBER__SHEAR_ZFACTOR,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 getString("_UI_EffectivestiffnessPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Torsion Factor feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addTorsionFactorPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Member_torsionFactor_feature"),
				 getString("_UI_Member_torsionFactor_description"),
				 StructurePackage.Literals.MEMBER__TORSION_FACTOR,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 getString("_UI_EffectivestiffnessPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Bending YFactor feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addBendingYFactorPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Member_bendingYFactor_feature"),
				 getString("_UI_Member_bendingYFactor_description"),
				 StructurePackage.Literals.MEMBER__BENDING_YFACTOR,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 getString("_UI_EffectivestiffnessPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Bending ZFactor feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addBendingZFactorPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Member_bendingZFactor_feature"),
				 getString("_UI_Member_bendingZFactor_description"),
				 StructurePackage.Literals.MEMBER__BENDING_ZFACTOR,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 getString("_UI_EffectivestiffnessPropertyCategory"),
				 null));
	}

	/**
	 * This specifies how to implement {@link #getChildren} and is used to deduce an appropriate feature for an
	 * {@link org.eclipse.emf.edit.command.AddCommand}, {@link org.eclipse.emf.edit.command.RemoveCommand} or
	 * {@link org.eclipse.emf.edit.command.MoveCommand} in {@link #createCommand}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Collection<? extends EStructuralFeature> getChildrenFeatures(Object object) {
		if (childrenFeatures == null) {
			super.getChildrenFeatures(object);
			childrenFeatures.add(StructurePackage.Literals.MEMBER__START_OFFSET);
			childrenFeatures.add(StructurePackage.Literals.MEMBER__END_OFFSET);
		}
		return childrenFeatures;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EStructuralFeature getChildFeature(Object object, Object child) {
		// Check the type of the specified child object and return the proper feature to use for
		// adding (see {@link AddCommand}) it as a child.

		return super.getChildFeature(object, child);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected boolean shouldComposeCreationImage() {
		return true;
	}

	/**
	 * This returns the label text for the adapted class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getText(Object object) {
		String label = ((Member)object).getName();
		return label == null || label.length() == 0 ?
			getString("_UI_Member_type") :
			getString("_UI_Member_type") + " " + label;
	}


	/**
	 * This handles model notifications by calling {@link #updateChildren} to update any cached
	 * children and by creating a viewer notification, which it passes to {@link #fireNotifyChanged}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void notifyChanged(Notification notification) {
		updateChildren(notification);

		switch (notification.getFeatureID(Member.class)) {
			case StructurePackage.MEMBER__START:
			case StructurePackage.MEMBER__END:
			case StructurePackage.MEMBER__SECTION:
			case StructurePackage.MEMBER__MATERIAL:
			case StructurePackage.MEMBER__ROLL:
			case StructurePackage.MEMBER__START_FREE:
			case StructurePackage.MEMBER__END_FREE:
			case StructurePackage.MEMBER__START_RIGID:
			case StructurePackage.MEMBER__END_RIGID:
			case StructurePackage.MEMBER__AXIAL_ONLY:
			case StructurePackage.MEMBER__AXIAL_FORCE:
			case StructurePackage.MEMBER__MASS:
			case StructurePackage.MEMBER__AXIAL_FACTOR:
			case StructurePackage.MEMBER__SHEAR_YFACTOR:
			case StructurePackage.MEMBER__SHEAR_ZFACTOR:
			case StructurePackage.MEMBER__TORSION_FACTOR:
			case StructurePackage.MEMBER__BENDING_YFACTOR:
			case StructurePackage.MEMBER__BENDING_ZFACTOR:
				fireNotifyChanged(new ViewerNotification(notification, notification.getNotifier(), false, true));
				return;
			case StructurePackage.MEMBER__START_OFFSET:
			case StructurePackage.MEMBER__END_OFFSET:
				fireNotifyChanged(new ViewerNotification(notification, notification.getNotifier(), true, false));
				return;
		}
		super.notifyChanged(notification);
	}

	/**
	 * This adds {@link org.eclipse.emf.edit.command.CommandParameter}s describing the children
	 * that can be created under this object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected void collectNewChildDescriptors(Collection<Object> newChildDescriptors, Object object) {
		super.collectNewChildDescriptors(newChildDescriptors, object);

		newChildDescriptors.add
			(createChildParameter
				(StructurePackage.Literals.MEMBER__START_OFFSET,
				 StructureFactory.eINSTANCE.createVector()));

		newChildDescriptors.add
			(createChildParameter
				(StructurePackage.Literals.MEMBER__END_OFFSET,
				 StructureFactory.eINSTANCE.createVector()));
	}

	/**
	 * This returns the label text for {@link org.eclipse.emf.edit.command.CreateChildCommand}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getCreateChildText(Object owner, Object feature, Object child, Collection<?> selection) {
		Object childFeature = feature;
		Object childObject = child;

		boolean qualify =
			childFeature == StructurePackage.Literals.MEMBER__START_OFFSET ||
			childFeature == StructurePackage.Literals.MEMBER__END_OFFSET;

		if (qualify) {
			return getString
				("_UI_CreateChild_text2",
				 new Object[] { getTypeText(childObject), getFeatureText(childFeature), getTypeText(owner) });
		}
		return super.getCreateChildText(owner, feature, child, selection);
	}

}
