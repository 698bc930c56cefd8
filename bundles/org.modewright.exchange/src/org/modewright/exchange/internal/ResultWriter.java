package org.modewright.exchange.internal;

import java.io.Closeable;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;

import org.modewright.audit.Finding;
import org.modewright.audit.ObjectRef;
import org.modewright.audit.Verdict;
import org.modewright.exchange.ModelFacts;
import org.modewright.exchange.ResultFile;
import org.modewright.fem.MassLedger;
import org.modewright.modal.Certificate;
import org.modewright.modal.Direction;
import org.modewright.modal.Dominance;
import org.modewright.modal.MatrixRun;
import org.modewright.modal.ModalResult;
import org.modewright.modal.Mode;

import com.fasterxml.jackson.core.JsonEncoding;
import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;

/** Streams a result into JSON. */
public final class ResultWriter implements Closeable {

    /** The leading elements of an energy list hold together at least this share of the energy ... */
    public static final double LEADING_SHARE = 0.8;
    /** ... but are no more than these. */
    public static final int MOST_LEADING = 20;

    private static final List<Direction> TRANSLATIONS = List.of(Direction.X, Direction.Y, Direction.Z);
    private static final List<Direction> ROTATIONS = List.of(Direction.RX, Direction.RY, Direction.RZ);
    private static final List<String> STAGES = List.of("read", "assemble", "factor", "eigen", "audit");
    private static final List<String> UNITS = List.of("frequency", "Hz", "period", "s", "mass", "kg", "length", "m", "force", "N");

    private final JsonGenerator json;
    private final boolean allElements;

    /**
     * Opens a file.
     *
     * @param allElements whether the energy lists hold all elements
     */
    public ResultWriter(Path file, boolean allElements) throws IOException {
        json = new JsonFactory().createGenerator(file.toFile(), JsonEncoding.UTF8).useDefaultPrettyPrinter();
        this.allElements = allElements;
    }

    /** Writes the modes of a model with what was judged. */
    public void write(ModelFacts facts, ModalResult result, List<Verdict> verdicts, List<Finding> findings) throws IOException {
        begin(facts.program());
        model(facts, result);
        units();
        mass(result.mass());
        certificate(result.certificate());
        Dominance dominance = new Dominance(result);
        json.writeArrayFieldStart("modes");
        for (int i = 0; i < result.modes().size(); i++) {
            mode(result.modes().get(i), i, dominance);
        }
        json.writeEndArray();
        capture(result);
        json.writeArrayFieldStart("verdicts");
        for (Verdict verdict : verdicts) {
            verdict(verdict);
        }
        json.writeEndArray();
        json.writeArrayFieldStart("findings");
        for (Finding finding : findings) {
            finding(finding);
        }
        json.writeEndArray();
        seconds(result.seconds());
        json.writeEndObject();
    }

    /** Writes the modes of a pair of matrices. */
    public void write(MatrixRun.Result result, String program, Map<String, Double> seconds) throws IOException {
        begin(program);
        units();
        certificate(result.certificate());
        json.writeArrayFieldStart("modes");
        double[] frequencies = result.frequencies();
        for (int i = 0; i < frequencies.length; i++) {
            json.writeStartObject();
            json.writeNumberField("number", i + 1);
            numbers(frequencies[i], 1 / frequencies[i], result.pairs().residuals()[i], result.pairs().errorBounds()[i]);
            json.writeEndObject();
        }
        json.writeEndArray();
        seconds(seconds);
        json.writeEndObject();
    }

    private void begin(String program) throws IOException {
        json.writeStartObject();
        json.writeNumberField("version", ResultFile.VERSION);
        json.writeStringField("program", program);
    }

    private void model(ModelFacts facts, ModalResult result) throws IOException {
        json.writeObjectFieldStart("model");
        json.writeStringField("name", facts.name());
        json.writeStringField("file", facts.file());
        json.writeStringField("sha256", facts.sha256());
        json.writeNumberField("nodes", result.nodeCount());
        json.writeNumberField("members", result.memberCount());
        json.writeNumberField("panels", result.panelCount());
        json.writeNumberField("freeDofs", result.freeDofs());
        json.writeEndObject();
    }

    private void units() throws IOException {
        json.writeObjectFieldStart("units");
        for (int i = 0; i < UNITS.size(); i += 2) {
            json.writeStringField(UNITS.get(i), UNITS.get(i + 1));
        }
        json.writeEndObject();
    }

    private void mass(MassLedger mass) throws IOException {
        json.writeObjectFieldStart("mass");
        byDirection("movable", TRANSLATIONS, mass.movable());
        byDirection("onSupports", TRANSLATIONS, mass.onSupports());
        json.writeArrayFieldStart("centre");
        for (double coordinate : mass.centre()) {
            json.writeNumber(coordinate);
        }
        json.writeEndArray();
        byDirection("rotary", ROTATIONS, mass.rotary());
        json.writeEndObject();
    }

    private void byDirection(String name, List<Direction> directions, double[] values) throws IOException {
        json.writeObjectFieldStart(name);
        for (int i = 0; i < directions.size(); i++) {
            number(directions.get(i).word(), values[i]);
        }
        json.writeEndObject();
    }

    private void certificate(Certificate certificate) throws IOException {
        json.writeObjectFieldStart("certificate");
        json.writeBooleanField("complete", certificate.complete());
        number("belowHz", certificate.belowHz());
        json.writeNumberField("counted", certificate.counted());
        json.writeNumberField("found", certificate.found());
        number("worstResidual", certificate.worstResidual());
        number("worstOrthogonality", certificate.worstOrthogonality());
        json.writeEndObject();
    }

    private void mode(Mode mode, int index, Dominance dominance) throws IOException {
        json.writeStartObject();
        json.writeNumberField("number", mode.number());
        numbers(mode.frequency(), mode.period(), mode.residual(), mode.errorBound());
        byDirection("participation", List.of(Direction.values()), mode.participation());
        byDirection("effectiveMassShare", List.of(Direction.values()), mode.effectiveMassShare());
        number("spread", mode.spread());
        json.writeStringField("character", mode.character().text());
        energy("strainEnergy", dominance, index, Dominance.Energy.STRAIN);
        energy("kineticEnergy", dominance, index, Dominance.Energy.KINETIC);
        json.writeEndObject();
    }

    private void numbers(double frequency, double period, double residual, double errorBound) throws IOException {
        number("frequency", frequency);
        number("period", period);
        number("residual", residual);
        number("errorBound", errorBound);
    }

    private void energy(String name, Dominance dominance, int mode, Dominance.Energy energy) throws IOException {
        List<Dominance.Share> shares = allElements ? dominance.ranked(mode, energy, Dominance.RollUp.ELEMENT)
                : dominance.leading(mode, energy, LEADING_SHARE, MOST_LEADING);
        json.writeArrayFieldStart(name);
        for (Dominance.Share share : shares) {
            json.writeStartObject();
            json.writeStringField("kind", share.kind().word());
            json.writeStringField("element", share.label());
            number("share", share.share());
            json.writeEndObject();
        }
        json.writeEndArray();
    }

    private void capture(ModalResult result) throws IOException {
        json.writeObjectFieldStart("capture");
        for (Direction direction : TRANSLATIONS) {
            number(direction.word(), result.capture(direction));
        }
        json.writeEndObject();
    }

    private void verdict(Verdict verdict) throws IOException {
        json.writeStartObject();
        json.writeStringField("rulePack", verdict.rulePack());
        json.writeStringField("clause", verdict.clause());
        json.writeStringField("direction", verdict.direction().word());
        number("captured", verdict.captured());
        number("required", verdict.required());
        json.writeBooleanField("pass", verdict.pass());
        json.writeNumberField("reachedAtMode", verdict.reachedAtMode());
        json.writeStringField("text", verdict.text());
        json.writeEndObject();
    }

    private void finding(Finding finding) throws IOException {
        json.writeStartObject();
        json.writeStringField("id", finding.id());
        json.writeStringField("severity", finding.severity().word());
        json.writeArrayFieldStart("objects");
        for (ObjectRef object : finding.objects()) {
            json.writeString(object.name());
        }
        json.writeEndArray();
        json.writeStringField("text", finding.text());
        json.writeStringField("remedy", finding.remedy());
        json.writeEndObject();
    }

    private void seconds(Map<String, Double> seconds) throws IOException {
        json.writeObjectFieldStart("seconds");
        for (String stage : STAGES) {
            number(stage, seconds.getOrDefault(stage, 0.0));
        }
        json.writeEndObject();
    }

    /** JSON has no word for what is not finite: null stands for it. */
    private void number(String name, double value) throws IOException {
        if (Double.isFinite(value)) {
            json.writeNumberField(name, value);
        } else {
            json.writeNullField(name);
        }
    }

    @Override
    public void close() throws IOException {
        json.close();
    }
}
