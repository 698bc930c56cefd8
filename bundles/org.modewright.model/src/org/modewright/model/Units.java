package org.modewright.model;

import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.UnitSystem;

/**
 * A consistent system of units: factors to SI and symbols. Mass is force times second squared per length, so that
 * K phi = omega squared M phi gives radians per second in every system.
 *
 * <p>Definitions: foot 0.3048 m, inch 0.0254 m, pound 0.45359237 kg (all exact by the international yard and pound agreement of 1959);
 * standard gravity 9.80665 m/s2 (3rd CGPM, 1901; exact); so the pound-force is 4.4482216152605 N, exact.
 */
public final class Units {

    /** Standard gravity in m/s2. */
    public static final double STANDARD_GRAVITY = 9.80665;

    private static final double FOOT = 0.3048;
    private static final double INCH = 0.0254;
    private static final double POUND_FORCE = 4.4482216152605;
    private static final double KIP = 4448.2216152605;

    private final double length;
    private final double force;
    private final double mass;
    private final String lengthSymbol;
    private final String forceSymbol;
    private final String massSymbol;

    private Units(double length, double force, double mass, String lengthSymbol, String forceSymbol, String massSymbol) {
        this.length = length;
        this.force = force;
        this.mass = mass;
        this.lengthSymbol = lengthSymbol;
        this.forceSymbol = forceSymbol;
        this.massSymbol = massSymbol;
    }

    /**
     * @param system a unit system
     * @return its factors and symbols
     */
    public static Units of(UnitSystem system) {
        return switch (system) {
            case NEWTON_METRE -> new Units(1, 1, 1, "m", "N", "kg");
            case KILONEWTON_METRE -> new Units(1, 1000, 1000, "m", "kN", "t");
            case NEWTON_MILLIMETRE -> new Units(0.001, 1, 1000, "mm", "N", "t");
            case KIP_FOOT -> derived(FOOT, KIP, "ft", "kip");
            case KIP_INCH -> derived(INCH, KIP, "in", "kip");
            case POUND_INCH -> derived(INCH, POUND_FORCE, "in", "lbf");
        };
    }

    private static Units derived(double length, double force, String lengthSymbol, String forceSymbol) {
        return new Units(length, force, force / length, lengthSymbol, forceSymbol, forceSymbol + "·s²/" + lengthSymbol);
    }

    /**
     * @param model a model
     * @return factors and symbols of its unit system
     */
    public static Units of(StructuralModel model) {
        return of(model.getUnits());
    }

    /** @return metres per unit of length */
    public double length() {
        return length;
    }

    /** @return newtons per unit of force */
    public double force() {
        return force;
    }

    /** @return kilograms per unit of mass */
    public double mass() {
        return mass;
    }

    /**
     * @param quantity a kind of quantity
     * @return the factor that turns a number of this system into SI: value in SI = factor · value; degrees become radians
     */
    public double toSi(Quantity quantity) {
        if (quantity == Quantity.ANGLE) {
            return Math.PI / 180;
        }
        return power(length, quantity.lengthPower()) * power(force, quantity.forcePower()) * power(mass, quantity.massPower());
    }

    private static double power(double base, int exponent) {
        double product = 1;
        for (int i = 0; i < Math.abs(exponent); i++) {
            product *= base;
        }
        return exponent < 0 ? 1 / product : product;
    }

    /**
     * @param quantity a kind of quantity
     * @return its unit for people, such as kN/m²; empty for a plain number
     */
    public String symbol(Quantity quantity) {
        return switch (quantity) {
            case NONE -> "";
            case LENGTH -> lengthSymbol;
            case AREA -> lengthSymbol + "²";
            case SECOND_MOMENT -> lengthSymbol + "⁴";
            case FORCE -> forceSymbol;
            case FORCE_PER_LENGTH, STIFFNESS -> forceSymbol + "/" + lengthSymbol;
            case MOMENT -> forceSymbol + "·" + lengthSymbol;
            case STRESS -> forceSymbol + "/" + lengthSymbol + "²";
            case MASS -> massSymbol;
            case ROTARY_INERTIA -> inertiaSymbol();
            case DENSITY -> densitySymbol();
            case ROTATIONAL_STIFFNESS -> forceSymbol + "·" + lengthSymbol + "/rad";
            case COUPLING_STIFFNESS -> forceSymbol + "/rad";
            case ACCELERATION -> lengthSymbol + "/s²";
            case ANGLE -> "°";
            case FREQUENCY -> "Hz";
            case TIME -> "s";
        };
    }

    private boolean massIsDerived() {
        return massSymbol.startsWith(forceSymbol + "·");
    }

    private String inertiaSymbol() {
        return massIsDerived() ? forceSymbol + "·" + lengthSymbol + "·s²" : massSymbol + "·" + lengthSymbol + "²";
    }

    private String densitySymbol() {
        return massIsDerived() ? forceSymbol + "·s²/" + lengthSymbol + "⁴" : massSymbol + "/" + lengthSymbol + "³";
    }

    /**
     * @param model a model
     * @return its acceleration of gravity in its own length unit per second squared; standard gravity where it states 0
     */
    public static double gravity(StructuralModel model) {
        return model.getGravity() == 0 ? STANDARD_GRAVITY / of(model).length() : model.getGravity();
    }

    /**
     * @param model a model
     * @return its acceleration of gravity in m/s2; standard gravity where it states 0
     */
    public static double gravitySi(StructuralModel model) {
        return model.getGravity() == 0 ? STANDARD_GRAVITY : model.getGravity() * of(model).length();
    }
}
