/**
 */
package org.modewright.model.structure;

import java.util.Arrays;
import java.util.Collections;
import java.util.List;

import org.eclipse.emf.common.util.Enumerator;

/**
 * <!-- begin-user-doc -->
 * A representation of the literals of the enumeration '<em><b>Unit System</b></em>',
 * and utility methods for working with them.
 * <!-- end-user-doc -->
 * <!-- begin-model-doc -->
 * Consistent systems of units: force, length, and mass as force times second squared per length. Time is in seconds.
 * <!-- end-model-doc -->
 * @see org.modewright.model.structure.StructurePackage#getUnitSystem()
 * @generated
 */
public enum UnitSystem implements Enumerator {
	/**
	 * The '<em><b>NEWTON METRE</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #NEWTON_METRE_VALUE
	 * @generated
	 * @ordered
	 */
	NEWTON_METRE(0, "NEWTON_METRE", "N-m-kg"),

	/**
	 * The '<em><b>KILONEWTON METRE</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #KILONEWTON_METRE_VALUE
	 * @generated
	 * @ordered
	 */
	KILONEWTON_METRE(1, "KILONEWTON_METRE", "kN-m-t"),

	/**
	 * The '<em><b>NEWTON MILLIMETRE</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #NEWTON_MILLIMETRE_VALUE
	 * @generated
	 * @ordered
	 */
	NEWTON_MILLIMETRE(2, "NEWTON_MILLIMETRE", "N-mm-t"),

	/**
	 * The '<em><b>KIP FOOT</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #KIP_FOOT_VALUE
	 * @generated
	 * @ordered
	 */
	KIP_FOOT(3, "KIP_FOOT", "kip-ft"),

	/**
	 * The '<em><b>KIP INCH</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #KIP_INCH_VALUE
	 * @generated
	 * @ordered
	 */
	KIP_INCH(4, "KIP_INCH", "kip-in"),

	/**
	 * The '<em><b>POUND INCH</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #POUND_INCH_VALUE
	 * @generated
	 * @ordered
	 */
	POUND_INCH(5, "POUND_INCH", "lbf-in");

	/**
	 * The '<em><b>NEWTON METRE</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #NEWTON_METRE
	 * @generated
	 * @ordered
	 */
	public static final int NEWTON_METRE_VALUE = 0;

	/**
	 * The '<em><b>KILONEWTON METRE</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #KILONEWTON_METRE
	 * @generated
	 * @ordered
	 */
	public static final int KILONEWTON_METRE_VALUE = 1;

	/**
	 * The '<em><b>NEWTON MILLIMETRE</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #NEWTON_MILLIMETRE
	 * @generated
	 * @ordered
	 */
	public static final int NEWTON_MILLIMETRE_VALUE = 2;

	/**
	 * The '<em><b>KIP FOOT</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #KIP_FOOT
	 * @generated
	 * @ordered
	 */
	public static final int KIP_FOOT_VALUE = 3;

	/**
	 * The '<em><b>KIP INCH</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #KIP_INCH
	 * @generated
	 * @ordered
	 */
	public static final int KIP_INCH_VALUE = 4;

	/**
	 * The '<em><b>POUND INCH</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #POUND_INCH
	 * @generated
	 * @ordered
	 */
	public static final int POUND_INCH_VALUE = 5;

	/**
	 * An array of all the '<em><b>Unit System</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static final UnitSystem[] VALUES_ARRAY =
		new UnitSystem[] {
			NEWTON_METRE,
			KILONEWTON_METRE,
			NEWTON_MILLIMETRE,
			KIP_FOOT,
			KIP_INCH,
			POUND_INCH,
		};

	/**
	 * A public read-only list of all the '<em><b>Unit System</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static final List<UnitSystem> VALUES = Collections.unmodifiableList(Arrays.asList(VALUES_ARRAY));

	/**
	 * Returns the '<em><b>Unit System</b></em>' literal with the specified literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param literal the literal.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static UnitSystem get(String literal) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			UnitSystem result = VALUES_ARRAY[i];
			if (result.toString().equals(literal)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Unit System</b></em>' literal with the specified name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param name the name.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static UnitSystem getByName(String name) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			UnitSystem result = VALUES_ARRAY[i];
			if (result.getName().equals(name)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Unit System</b></em>' literal with the specified integer value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the integer value.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static UnitSystem get(int value) {
		switch (value) {
			case NEWTON_METRE_VALUE: return NEWTON_METRE;
			case KILONEWTON_METRE_VALUE: return KILONEWTON_METRE;
			case NEWTON_MILLIMETRE_VALUE: return NEWTON_MILLIMETRE;
			case KIP_FOOT_VALUE: return KIP_FOOT;
			case KIP_INCH_VALUE: return KIP_INCH;
			case POUND_INCH_VALUE: return POUND_INCH;
		}
		return null;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final int value;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final String name;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final String literal;

	/**
	 * Only this class can construct instances.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private UnitSystem(int value, String name, String literal) {
		this.value = value;
		this.name = name;
		this.literal = literal;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public int getValue() {
	  return value;
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
	public String getLiteral() {
	  return literal;
	}

	/**
	 * Returns the literal value of the enumerator, which is its string representation.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String toString() {
		return literal;
	}
	
} //UnitSystem
