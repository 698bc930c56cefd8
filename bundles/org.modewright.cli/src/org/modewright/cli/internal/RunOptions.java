package org.modewright.cli.internal;

import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;

import org.modewright.audit.AuditRequest;
import org.modewright.audit.RulePacks;
import org.modewright.modal.Direction;
import org.modewright.model.structure.StructuralModel;

import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.Option;
import picocli.CommandLine.TypeConversionException;

/** Options that say what is solved and how it is judged. */
final class RunOptions {

    @Option(names = "--modes", paramLabel = "N", converter = PositiveInteger.class,
            description = "Exactly so many modes. Without it: enough for the rule pack, at most 500.")
    private Integer modes;

    @Option(names = "--below", paramLabel = "HZ", converter = PositiveNumber.class, description = "Only modes below this frequency in Hz.")
    private Double below;

    @Option(names = "--rules", paramLabel = "ID",
            description = "The rule pack. Without it: the one of the model's settings, else common-90 (90 %% in each judged direction).")
    private String rules;

    @Option(names = "--list-rules", description = "Lists the rule packs and does nothing else.")
    private boolean listRules;

    @Option(names = "--directions", paramLabel = "x,y,z", split = ",", hideParamSyntax = true, converter = Translation.class,
            description = "The directions judged. Without it: those of the model's settings, else x,y.")
    private List<Direction> directions;

    @Option(names = "--threads", paramLabel = "N", converter = PositiveInteger.class, description = "Threads at most; the solver of this version uses one.")
    private Integer threads;

    @Option(names = "--quiet", description = "No progress on standard error.")
    private boolean quiet;

    boolean isListRules() {
        return listRules;
    }

    boolean isQuiet() {
        return quiet;
    }

    /** Number of modes asked for; 0 where none was. */
    int modes() {
        return modes == null ? 0 : modes;
    }

    double below() {
        return below == null ? 0 : below;
    }

    int threads() {
        return threads == null ? Runtime.getRuntime().availableProcessors() : threads;
    }

    /** Whether an option was given that needs directions of motion. */
    boolean isJudging() {
        return rules != null || directions != null;
    }

    /**
     * The model's own settings with the options on top.
     *
     * @throws IllegalArgumentException if there is no such rule pack
     */
    AuditRequest request(StructuralModel model) {
        AuditRequest request = AuditRequest.of(model).withThreads(threads());
        if (modes != null) {
            request = request.withModes(modes);
        }
        if (below != null) {
            request = request.withBelowHz(below);
        }
        if (rules != null) {
            request = request.withRulePack(rules);
        }
        if (directions != null) {
            Set<Direction> judged = EnumSet.copyOf(directions);
            request = request.withDirections(judged);
        }
        RulePacks.builtIn().get(request.rulePack());
        return request;
    }

    /** Converts whole numbers from 1. */
    static final class PositiveInteger implements ITypeConverter<Integer> {
        @Override
        public Integer convert(String value) {
            try {
                int number = Integer.parseInt(value);
                if (number > 0) {
                    return number;
                }
            } catch (NumberFormatException e) {
                throw new TypeConversionException("\"" + value + "\" is not a whole number");
            }
            throw new TypeConversionException("\"" + value + "\" must be 1 or more");
        }
    }

    /** Converts finite numbers above 0. */
    static final class PositiveNumber implements ITypeConverter<Double> {
        @Override
        public Double convert(String value) {
            double number;
            try {
                number = Double.parseDouble(value);
            } catch (NumberFormatException e) {
                throw new TypeConversionException("\"" + value + "\" is not a number");
            }
            if (!(number > 0) || Double.isInfinite(number)) {
                throw new TypeConversionException("\"" + value + "\" must be greater than 0");
            }
            return number;
        }
    }

    /** Converts x, y and z. */
    static final class Translation implements ITypeConverter<Direction> {
        @Override
        public Direction convert(String value) {
            for (Direction direction : List.of(Direction.X, Direction.Y, Direction.Z)) {
                if (direction.word().equals(value.strip().toLowerCase(Locale.ROOT))) {
                    return direction;
                }
            }
            throw new TypeConversionException("\"" + value + "\" is no direction; give some of x,y,z");
        }
    }
}
