package org.modewright.audit;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.modewright.audit.RulePackException.Problem;

/** The rule packs at hand: the built-in ones, and an office's own from a folder. Immutable. */
public final class RulePacks {

    private static final List<String> BUILT_IN = List.of("common-90");

    private final Map<String, RulePack> packs;

    private RulePacks(Map<String, RulePack> packs) {
        this.packs = packs;
    }

    /** The packs that come with the program. */
    public static RulePacks builtIn() {
        Map<String, RulePack> packs = new LinkedHashMap<>();
        for (String id : BUILT_IN) {
            packs.put(id, load(id + ".json"));
        }
        return new RulePacks(packs);
    }

    private static RulePack load(String name) {
        try (InputStream stream = RulePacks.class.getResourceAsStream("rules/" + name)) {
            return RulePackFile.read(stream, name);
        } catch (IOException e) {
            throw new UncheckedIOException("The built-in rule pack " + name + " cannot be read.", e);
        }
    }

    /**
     * These packs and those of a folder's {@code .json} files, in the order of their names.
     *
     * @throws RulePackException naming every file that cannot be used: unreadable, against the schema, or with an id already taken
     */
    public RulePacks with(Path folder) {
        Map<String, RulePack> all = new LinkedHashMap<>(packs);
        List<Problem> problems = new ArrayList<>();
        for (Path file : files(folder)) {
            try {
                RulePack pack = RulePackFile.read(file);
                if (all.putIfAbsent(pack.id(), pack) != null) {
                    problems.add(new Problem(file.getFileName().toString(), "/id", "\"" + pack.id()
                            + "\" is taken by another rule pack; give it an id of its own."));
                }
            } catch (RulePackException e) {
                problems.addAll(e.problems());
            }
        }
        if (!problems.isEmpty()) {
            throw new RulePackException(problems);
        }
        return new RulePacks(all);
    }

    private static List<Path> files(Path folder) {
        try (Stream<Path> entries = Files.list(folder)) {
            return entries.filter(path -> path.getFileName().toString().endsWith(".json")).sorted().toList();
        } catch (IOException e) {
            throw new RulePackException(List.of(new Problem(folder.toString(), "", "is no folder that can be read; name the folder"
                    + " that holds the rule packs.")));
        }
    }

    /**
     * A pack by its id.
     *
     * @throws IllegalArgumentException if there is none; the message lists those there are
     */
    public RulePack get(String id) {
        RulePack pack = packs.get(id);
        if (pack == null) {
            throw new IllegalArgumentException("There is no rule pack \"" + id + "\"; there are: " + String.join(", ", packs.keySet())
                    + ".");
        }
        return pack;
    }

    /** All packs, the built-in ones first. */
    public List<RulePack> all() {
        return List.copyOf(packs.values());
    }
}
