package org.modewright.exchange.internal.tables;

import java.nio.charset.StandardCharsets;
import java.util.List;

import org.modewright.model.structure.StructuralModel;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;

/** Writes {@code datapackage.json}: a Tabular Data Package with the schema of every table. */
final class DescriptorWriter {

    private static final JsonNodeFactory JSON = JsonNodeFactory.instance;

    private DescriptorWriter() {
    }

    static byte[] write(StructuralModel model, List<TableSchema> tables) {
        ObjectNode root = JSON.objectNode();
        root.put("profile", "tabular-data-package");
        root.put("name", model.getName());
        putUnlessNull(root, "title", model.getTitle());
        putUnlessNull(root, "description", model.getNotes());
        root.set("structure", structure(model));
        ArrayNode resources = root.putArray("resources");
        tables.forEach(table -> resources.add(resource(table)));
        DefaultIndenter indenter = new DefaultIndenter("  ", "\n");
        DefaultPrettyPrinter printer = new DefaultPrettyPrinter().withObjectIndenter(indenter).withArrayIndenter(indenter);
        try {
            return (JsonMapper.builder().build().writer(printer).writeValueAsString(root) + "\n").getBytes(StandardCharsets.UTF_8);
        } catch (JsonProcessingException e) {
            throw new IllegalStateException(e);
        }
    }

    private static void putUnlessNull(ObjectNode object, String name, String value) {
        if (value != null) {
            object.put(name, value);
        }
    }

    private static ObjectNode structure(StructuralModel model) {
        ObjectNode structure = JSON.objectNode();
        structure.put("version", 1);
        structure.put("units", model.getUnits().getLiteral());
        if (model.getGravity() != 0) {
            structure.put("gravity", model.getGravity());
        }
        structure.put("massMatrix", model.getMassFormulation().getLiteral());
        structure.put("shearDeformation", model.isShearDeformation());
        return structure;
    }

    private static ObjectNode resource(TableSchema table) {
        ObjectNode resource = JSON.objectNode();
        resource.put("name", table.resource());
        resource.put("path", table.resource() + ".csv");
        resource.put("profile", "tabular-data-resource");
        resource.put("encoding", "utf-8");
        ObjectNode schema = resource.putObject("schema");
        ArrayNode fields = schema.putArray("fields");
        for (TableSchema.Column column : table.columns()) {
            ObjectNode field = fields.addObject();
            field.put("name", column.name());
            field.put("type", column.type().word());
            if (column.required()) {
                field.putObject("constraints").put("required", true);
            }
        }
        if (table.has("id")) {
            schema.put("primaryKey", "id");
        }
        return resource;
    }
}
