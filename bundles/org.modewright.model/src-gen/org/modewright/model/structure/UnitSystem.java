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
	 * The '<em><b>NMKG</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #NMKG_VALUE
	 * @generated
	 * @ordered
	 */
	NMKG(0, "N_M_KG", "N-m-kg"),

	/**
	 * The '<em><b>KN MT</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #KN_MT_VALUE
	 * @generated
	 * @ordered
	 */
	KN_MT(1, "KN_M_T", "kN-m-t"),

	/**
	 * The '<em><b>NMM T</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #NMM_T_VALUE
	 * @generated
	 * @ordered
	 */
	NMM_T(2, "N_MM_T", "N-mm-t"),

	/**
	 * The '<em><b>KIP FT</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #KIP_FT_VALUE
	 * @generated
	 * @ordered
	 */
	KIP_FT(3, "KIP_FT", "kip-ft"),

	/**
	 * The '<em><b>KIP IN</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #KIP_IN_VALUE
	 * @generated
	 * @ordered
	 */
	KIP_IN(4, "KIP_IN", "kip-in"),

	/**
	 * The '<em><b>LBF IN</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #LBF_IN_VALUE
	 * @generated
	 * @ordered
	 */
	LBF_IN(5, "LBF_IN", "lbf-in");

	/**
	 * The '<em><b>NMKG</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #NMKG
	 * @generated
	 * @ordered
	 */
	public static final int NMKG_VALUE = 0;

	/**
	 * The '<em><b>KN MT</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #KN_MT
	 * @generated
	 * @ordered
	 */
	public static final int KN_MT_VALUE = 1;

	/**
	 * The '<em><b>NMM T</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #NMM_T
	 * @generated
	 * @ordered
	 */
	public static final int NMM_T_VALUE = 2;

	/**
	 * The '<em><b>KIP FT</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #KIP_FT
	 * @generated
	 * @ordered
	 */
	public static final int KIP_FT_VALUE = 3;

	/**
	 * The '<em><b>KIP IN</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #KIP_IN
	 * @generated
	 * @ordered
	 */
	public static final int KIP_IN_VALUE = 4;

	/**
	 * The '<em><b>LBF IN</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #LBF_IN
	 * @generated
	 * @ordered
	 */
	public static final int LBF_IN_VALUE = 5;

	/**
	 * An array of all the '<em><b>Unit System</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static final UnitSystem[] VALUES_ARRAY =
		new UnitSystem[] {
			NMKG,
			KN_MT,
			NMM_T,
			KIP_FT,
			KIP_IN,
			LBF_IN,
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
			case NMKG_VALUE: return NMKG;
			case KN_MT_VALUE: return KN_MT;
			case NMM_T_VALUE: return NMM_T;
			case KIP_FT_VALUE: return KIP_FT;
			case KIP_IN_VALUE: return KIP_IN;
			case LBF_IN_VALUE: return LBF_IN;
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
