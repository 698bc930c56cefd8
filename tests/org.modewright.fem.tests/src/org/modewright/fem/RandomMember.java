package org.modewright.fem;

import java.util.Random;

import org.modewright.model.structure.Component;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberMass;
import org.modewright.model.structure.Node;

/** A member with a random mixture of all options, the same for the same seed. */
public final class RandomMember {

    private final Random random;
    private final TestStructure structure;

    public RandomMember(long seed, TestStructure structure) {
        this.random = new Random(seed);
        this.structure = structure;
    }

    public Random random() {
        return random;
    }

    private boolean chance() {
        return random.nextInt(3) == 0;
    }

    private double between(double low, double high) {
        return low + (high - low) * random.nextDouble();
    }

    public Member between(Node start, Node end) {
        Material material = structure.material(between(1e10, 2e11), between(0.0, 0.4), between(1000, 8000));
        FrameSection section = structure.section(between(0.01, 0.1), between(1e-5, 1e-3), between(1e-5, 1e-3), between(1e-6, 1e-3),
                chance() ? between(0.005, 0.05) : 0.0, chance() ? between(0.005, 0.05) : 0.0);
        Member member = structure.member(start, end, section, material);
        member.setRoll(chance() ? between(-180.0, 180.0) : 0.0);
        member.setMass(chance() ? MemberMass.LUMPED : MemberMass.CONSISTENT);
        if (chance()) {
            member.setStartRigid(between(0.05, 0.4));
        }
        if (chance()) {
            member.setEndRigid(between(0.05, 0.4));
        }
        if (chance()) {
            member.setStartOffset(TestStructure.vector(between(-0.3, 0.3), between(-0.3, 0.3), between(-0.3, 0.3)));
        }
        if (chance()) {
            member.setEndOffset(TestStructure.vector(between(-0.3, 0.3), between(-0.3, 0.3), between(-0.3, 0.3)));
        }
        member.setAxialOnly(random.nextInt(6) == 0);
        addFactors(member);
        return member;
    }

    private void addFactors(Member member) {
        if (chance()) {
            member.setAxialFactor(between(0.2, 1.5));
            member.setBendingYFactor(between(0.2, 1.5));
            member.setBendingZFactor(between(0.2, 1.5));
            member.setTorsionFactor(between(0.0, 1.5));
            member.setShearYFactor(between(0.2, 1.5));
            member.setShearZFactor(between(0.2, 1.5));
        }
    }

    /** Releases that leave no mechanism inside the member. */
    public void addSoundReleases(Member member) {
        if (chance()) {
            member.getStartFree().add(Component.RY);
        }
        if (chance()) {
            member.getEndFree().add(Component.RY);
        }
        if (chance()) {
            member.getStartFree().add(Component.RZ);
        }
        if (chance()) {
            member.getEndFree().add(Component.RZ);
        }
        if (chance()) {
            (random.nextBoolean() ? member.getStartFree() : member.getEndFree()).add(Component.RX);
        }
        if (random.nextInt(5) == 0) {
            (random.nextBoolean() ? member.getStartFree() : member.getEndFree()).add(Component.UX);
        }
        if (random.nextInt(5) == 0 && !member.getStartFree().contains(Component.RZ)
                && !member.getEndFree().contains(Component.RZ)) {
            member.getEndFree().add(Component.UY);
        }
    }

    /** Any releases at all. */
    public void addAnyReleases(Member member) {
        for (Component component : Component.values()) {
            if (random.nextBoolean()) {
                member.getStartFree().add(component);
            }
            if (random.nextBoolean()) {
                member.getEndFree().add(component);
            }
        }
    }
}
