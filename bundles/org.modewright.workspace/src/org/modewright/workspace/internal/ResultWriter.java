package org.modewright.workspace.internal;

import java.io.DataOutputStream;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import org.modewright.audit.AuditResult;
import org.modewright.audit.Finding;
import org.modewright.audit.ObjectRef;
import org.modewright.audit.Verdict;
import org.modewright.fem.Carrier;
import org.modewright.fem.MassLedger;
import org.modewright.fem.MassSource;
import org.modewright.fem.NodePoint;
import org.modewright.modal.Certificate;
import org.modewright.modal.Instability;
import org.modewright.modal.ModalResult;
import org.modewright.modal.Mode;

/** Writes a result in the order in which {@link ResultReader} reads it. */
final class ResultWriter {

    private final DataOutputStream out;

    ResultWriter(DataOutputStream out) {
        this.out = out;
    }

    void write(AuditResult result) throws IOException {
        writeModal(result.modal());
        writeList(result.verdicts(), this::writeVerdict);
        writeList(result.findings(), this::writeFinding);
        writeText(result.status().name());
        writeText(result.summary());
    }

    private void writeModal(ModalResult modal) throws IOException {
        writeText(modal.modelName());
        out.writeInt(modal.memberCount());
        out.writeInt(modal.panelCount());
        out.writeInt(modal.freeDofs());
        writeList(modal.nodes(), this::writeNode);
        writeList(modal.carriers(), this::writeCarrier);
        writeMass(modal.mass());
        out.writeDouble(modal.planCoupling());
        writeCertificate(modal.certificate());
        out.writeBoolean(modal.isExhausted());
        writeModes(modal);
        writeList(modal.instabilities(), this::writeInstability);
        writeTexts(modal.remarks());
        out.writeInt(modal.seconds().size());
        for (Map.Entry<String, Double> stage : modal.seconds().entrySet()) {
            writeText(stage.getKey());
            out.writeDouble(stage.getValue());
        }
    }

    private void writeModes(ModalResult modal) throws IOException {
        out.writeInt(modal.modes().size());
        for (int i = 0; i < modal.modes().size(); i++) {
            writeMode(modal.modes().get(i));
            writeNumbers(modal.sharedShape(i));
            writeNumbers(modal.strainShares(i));
            writeNumbers(modal.kineticShares(i));
        }
    }

    private void writeMode(Mode mode) throws IOException {
        out.writeInt(mode.number());
        writeNumbers(mode.eigenvalue(), mode.frequency(), mode.period(), mode.residual(), mode.errorBound(), mode.spread());
        writeNumbers(mode.participation());
        writeNumbers(mode.effectiveMassShare());
        writeNumbers(mode.split());
        writeText(mode.character().kind().name());
        writeText(mode.character().text());
    }

    private void writeNode(NodePoint node) throws IOException {
        writeText(node.id());
        writeText(node.name());
        writeNumbers(node.x(), node.y(), node.z());
    }

    private void writeCarrier(Carrier carrier) throws IOException {
        writeText(carrier.kind().name());
        writeText(carrier.id());
        writeText(carrier.name());
        out.writeInt(carrier.nodes().length);
        for (int node : carrier.nodes()) {
            out.writeInt(node);
        }
        writeText(carrier.group());
        writeText(carrier.section());
        writeText(carrier.material());
        writeText(carrier.level());
    }

    private void writeMass(MassLedger mass) throws IOException {
        writeNumbers(mass.movable());
        writeNumbers(mass.onSupports());
        writeNumbers(mass.centre());
        writeNumbers(mass.rotary());
        writeList(mass.sources(), this::writeMassSource);
        out.writeDouble(mass.balance());
    }

    private void writeMassSource(MassSource source) throws IOException {
        writeText(source.name());
        writeNumbers(source.movable());
        writeNumbers(source.onSupports());
    }

    private void writeCertificate(Certificate certificate) throws IOException {
        out.writeBoolean(certificate.complete());
        out.writeInt(certificate.counted());
        out.writeInt(certificate.found());
        writeNumbers(certificate.belowHz(), certificate.worstResidual(), certificate.worstOrthogonality());
    }

    private void writeInstability(Instability instability) throws IOException {
        writeText(instability.kind().name());
        writeTexts(instability.nodeIds());
        writeTexts(instability.nodeNames());
        writeTexts(instability.directions());
        writeTexts(instability.elementIds());
        writeText(instability.text());
        writeText(instability.remedy());
    }

    private void writeVerdict(Verdict verdict) throws IOException {
        writeText(verdict.rulePack());
        writeText(verdict.clause());
        writeText(verdict.direction().name());
        writeNumbers(verdict.captured(), verdict.required());
        out.writeBoolean(verdict.pass());
        out.writeInt(verdict.reachedAtMode());
        out.writeInt(verdict.moreModes());
        writeText(verdict.text());
    }

    private void writeFinding(Finding finding) throws IOException {
        writeText(finding.id());
        writeText(finding.severity().name());
        writeList(finding.objects(), this::writeObject);
        writeText(finding.text());
        writeText(finding.remedy());
    }

    private void writeObject(ObjectRef object) throws IOException {
        writeText(object.kind());
        writeText(object.id());
        writeText(object.name());
    }

    private void writeTexts(List<String> texts) throws IOException {
        writeList(texts, this::writeText);
    }

    private void writeText(String text) throws IOException {
        if (text == null) {
            out.writeInt(-1);
            return;
        }
        byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
        out.writeInt(bytes.length);
        out.write(bytes);
    }

    private void writeNumbers(double... numbers) throws IOException {
        ByteBuffer bytes = ByteBuffer.allocate(8 * numbers.length);
        bytes.asDoubleBuffer().put(numbers);
        out.writeInt(numbers.length);
        out.write(bytes.array());
    }

    private <T> void writeList(List<T> items, ItemWriter<T> writer) throws IOException {
        out.writeInt(items.size());
        for (T item : items) {
            writer.write(item);
        }
    }

    @FunctionalInterface
    private interface ItemWriter<T> {
        void write(T item) throws IOException;
    }
}
