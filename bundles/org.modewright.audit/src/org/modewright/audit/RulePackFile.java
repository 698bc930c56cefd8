package org.modewright.audit;

import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.Iterator;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.modewright.audit.RulePack.Clause;
import org.modewright.audit.RulePack.Measure;
import org.modewright.audit.RulePackException.Problem;

/**
 * Reads a rule pack from its JSON file and checks it against the schema:
 *
 * <pre>
 * {"formatVersion": 1, "id": "…", "title": "…", "version": "…", "source": "…", "provenance": "…",
 *  "clauses": [{"id": "…", "measure": "captured-mass", "required": 0.9, "statement": "…"}]}
 * </pre>
 *
 * Every property is needed and no other is allowed. Ids consist of lower-case letters, digits and hyphens. Each pack has exactly one clause
 * of the measure {@code captured-mass}.
 */
public final class RulePackFile {

    private static final int FORMAT_VERSION = 1;
    private static final String ID_PATTERN = "[a-z0-9]+(-[a-z0-9]+)*";
    private static final Set<String> PACK = Set.of("formatVersion", "id", "title", "version", "source", "provenance", "clauses");
    private static final Set<String> CLAUSE = Set.of("id", "measure", "required", "statement");

    private final String file;
    private final List<Problem> problems = new ArrayList<>();

    private RulePackFile(String file) {
        this.file = file;
    }

    /**
     * Reads a file.
     *
     * @throws RulePackException if it cannot be read or does not follow the schema
     */
    public static RulePack read(Path path) {
        String name = path.getFileName().toString();
        try (InputStream stream = Files.newInputStream(path)) {
            return read(stream, name);
        } catch (IOException e) {
            throw new RulePackException(List.of(new Problem(name, "", "cannot be read (" + e.getMessage() + ").")));
        }
    }

    /**
     * Reads a stream.
     *
     * @param name what to call it in messages
     * @throws RulePackException if it does not follow the schema
     */
    public static RulePack read(InputStream stream, String name) throws IOException {
        return new RulePackFile(name).parse(stream);
    }

    private RulePack parse(InputStream stream) throws IOException {
        ObjectMapper mapper = new ObjectMapper();
        mapper.enable(JsonParser.Feature.STRICT_DUPLICATE_DETECTION);
        mapper.enable(DeserializationFeature.FAIL_ON_TRAILING_TOKENS);
        JsonNode root;
        try {
            root = mapper.readTree(stream);
        } catch (JsonProcessingException e) {
            JsonLocation place = e.getLocation();
            String where = place == null ? "" : "line " + place.getLineNr() + ", column " + place.getColumnNr();
            throw new RulePackException(List.of(new Problem(file, where, "is not valid JSON: " + e.getOriginalMessage() + ".")));
        }
        RulePack pack = pack(root);
        if (!problems.isEmpty()) {
            throw new RulePackException(problems);
        }
        return pack;
    }

    private RulePack pack(JsonNode root) {
        if (!root.isObject()) {
            return fail("", "a rule pack is one JSON object.");
        }
        checkProperties(root, "", PACK);
        JsonNode version = root.path("formatVersion");
        if (version.isNumber() && version.intValue() > FORMAT_VERSION) {
            return fail("/formatVersion", "is " + version.asText() + ", but this program reads version " + FORMAT_VERSION
                    + "; use a newer program.");
        }
        if (!version.isMissingNode() && (!version.isInt() || version.intValue() != FORMAT_VERSION)) {
            fail("/formatVersion", "is " + version + "; it must be the number " + FORMAT_VERSION + ".");
        }
        String id = id(root, "/id");
        String title = text(root, "title", "");
        String release = text(root, "version", "");
        String source = text(root, "source", "");
        String provenance = text(root, "provenance", "");
        List<Clause> clauses = clauses(root.path("clauses"));
        return problems.isEmpty() ? new RulePack(id, title, release, clauses, source, provenance) : null;
    }

    private List<Clause> clauses(JsonNode array) {
        List<Clause> clauses = new ArrayList<>();
        if (array.isMissingNode()) {
            return clauses;
        }
        if (!array.isArray() || array.isEmpty()) {
            fail("/clauses", "must be a list of at least one clause.");
            return clauses;
        }
        Set<String> ids = new HashSet<>();
        for (int i = 0; i < array.size(); i++) {
            Clause clause = clause(array.get(i), "/clauses/" + i);
            if (clause != null) {
                if (!ids.add(clause.id())) {
                    fail("/clauses/" + i + "/id", "\"" + clause.id() + "\" is used by an earlier clause; give each its own.");
                }
                clauses.add(clause);
            }
        }
        long captured = clauses.stream().filter(clause -> clause.measure() == Measure.CAPTURED_MASS).count();
        if (captured != 1 && problems.isEmpty()) {
            fail("/clauses", "hold " + captured + " clauses of the measure captured-mass; a rule pack has exactly one.");
        }
        return clauses;
    }

    private Clause clause(JsonNode node, String pointer) {
        if (!node.isObject()) {
            fail(pointer, "must be an object with " + sorted(CLAUSE) + ".");
            return null;
        }
        int before = problems.size();
        checkProperties(node, pointer, CLAUSE);
        String id = id(node, pointer + "/id");
        Measure measure = measure(node.path("measure"), pointer + "/measure");
        double required = share(node.path("required"), pointer + "/required");
        String statement = text(node, "statement", pointer);
        return problems.size() == before ? new Clause(id, measure, required, statement) : null;
    }

    private Measure measure(JsonNode node, String pointer) {
        for (Measure measure : Measure.values()) {
            if (measure.word().equals(node.asText())) {
                return measure;
            }
        }
        if (!node.isMissingNode()) {
            String known = Arrays.stream(Measure.values()).map(Measure::word).collect(Collectors.joining(", "));
            fail(pointer, "is " + node + "; the measures are: " + known + ".");
        }
        return null;
    }

    private double share(JsonNode node, String pointer) {
        if (node.isMissingNode()) {
            return 0;
        }
        double value = node.isNumber() ? node.doubleValue() : Double.NaN;
        if (!(value > 0 && value <= 1)) {
            fail(pointer, "is " + node + "; give a share above 0 and up to 1, such as 0.9 for 90 %.");
        }
        return value;
    }

    private String id(JsonNode parent, String pointer) {
        JsonNode node = parent.path("id");
        if (!node.isMissingNode() && !(node.isTextual() && node.textValue().matches(ID_PATTERN))) {
            fail(pointer, "is " + node + "; an id consists of lower-case letters, digits and single hyphens.");
        }
        return node.asText();
    }

    private String text(JsonNode parent, String property, String pointer) {
        JsonNode node = parent.path(property);
        if (!node.isMissingNode() && !(node.isTextual() && !node.textValue().isBlank())) {
            fail(pointer + "/" + property, "is " + node + "; it must be a text.");
        }
        return node.asText();
    }

    private void checkProperties(JsonNode object, String pointer, Set<String> expected) {
        for (String property : sorted(expected)) {
            if (!object.has(property)) {
                fail(pointer + "/" + property, "is missing.");
            }
        }
        for (Iterator<String> names = object.fieldNames(); names.hasNext();) {
            String name = names.next();
            if (!expected.contains(name)) {
                fail(pointer + "/" + name, "is not known; the properties here are " + sorted(expected) + ".");
            }
        }
    }

    private static List<String> sorted(Set<String> words) {
        return words.stream().sorted().toList();
    }

    private RulePack fail(String pointer, String text) {
        problems.add(new Problem(file, pointer, text));
        return null;
    }
}
