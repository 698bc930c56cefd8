package org.modewright.modal;

/**
 * Limits that turn numbers into the words of a mode's {@link Character}. They are Modewright's own convention and enter no verdict.
 *
 * @param localNodes a mode that moves effectively fewer nodes than this share of all may be local
 * @param localMass and is so if its effective mass share in each translation is at most this
 * @param leading share of the kinetic energy from which one motion names the mode
 * @param accompanying share of the kinetic energy from which torsion is named beside sway, or sway beside torsion
 * @param straight share of the sway along one axis from which it is called sway X or sway Y, otherwise its plan angle is given
 */
public record CharacterRules(double localNodes, double localMass, double leading, double accompanying, double straight) {

    /** A tenth of the nodes, 0.5 % of the mass; half the energy leads, 15 % accompanies, 95 % along an axis is straight. */
    public static final CharacterRules DEFAULT = new CharacterRules(0.1, 0.005, 0.5, 0.15, 0.95);

    /** The default rules with another share of nodes. */
    public static CharacterRules withLocalNodes(double localNodes) {
        return new CharacterRules(localNodes, DEFAULT.localMass, DEFAULT.leading, DEFAULT.accompanying, DEFAULT.straight);
    }
}
