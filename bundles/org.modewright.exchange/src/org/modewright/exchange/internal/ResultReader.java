package org.modewright.exchange.internal;

import java.io.IOException;
import java.nio.file.Path;

import org.modewright.exchange.ResultFile;
import org.modewright.exchange.StoredResult;

import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;

/** Reads result files. */
public final class ResultReader {

    private ResultReader() {
    }

    /** The content of a result file. */
    public static StoredResult read(Path file) throws IOException {
        JsonMapper mapper = JsonMapper.builder().disable(DeserializationFeature.FAIL_ON_UNKNOWN_PROPERTIES)
                .enable(DeserializationFeature.FAIL_ON_TRAILING_TOKENS).build();
        try {
            JsonNode root = mapper.readTree(file.toFile());
            if (!(root instanceof ObjectNode result) || !result.path("version").isInt() || !result.path("modes").isArray()) {
                throw new IOException(file + ": this is no result file; it needs a version and a list of modes");
            }
            if (result.path("version").asInt() != ResultFile.VERSION) {
                throw new IOException(file + ": the result file has version " + result.path("version").asText() + "; only version "
                        + ResultFile.VERSION + " can be read");
            }
            return mapper.treeToValue(result, StoredResult.class);
        } catch (JsonProcessingException e) {
            JsonLocation at = e.getLocation();
            String place = at == null ? "" : ", line " + at.getLineNr() + ", column " + at.getColumnNr();
            throw new IOException(file + place + ": this is no result file: " + e.getOriginalMessage(), e);
        }
    }
}
