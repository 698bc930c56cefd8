package org.modewright.workspace.internal;

import java.io.DataInputStream;
import java.io.EOFException;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.modewright.audit.AuditResult;
import org.modewright.audit.AuditStatus;
import org.modewright.audit.Finding;
import org.modewright.audit.ObjectRef;
import org.modewright.audit.Severity;
import org.modewright.audit.Verdict;
import org.modewright.fem.Carrier;
import org.modewright.fem.Kind;
import org.modewright.fem.MassLedger;
import org.modewright.fem.MassSource;
import org.modewright.fem.NodePoint;
import org.modewright.modal.Certificate;
import org.modewright.modal.Character;
import org.modewright.modal.Direction;
import org.modewright.modal.Instability;
import org.modewright.modal.ModalResult;
import org.modewright.modal.Mode;

/** Reads what {@link ResultWriter} writes. */
final class ResultReader {

    /** No text, number row or list of a result is longer; a greater length is damage, and no reason to ask for that much memory. */
    private static final int LONGEST = 1 << 27;
    private static final int CHUNK = 1 << 16;

    private final DataInputStream in;

    ResultReader(DataInputStream in) {
        this.in = in;
    }

    AuditResult read() throws IOException {
        ModalResult modal = readModal();
        List<Verdict> verdicts = readList(this::readVerdict);
        List<Finding> findings = readList(this::readFinding);
        AuditStatus status = AuditStatus.valueOf(readText());
        return new AuditResult(modal, verdicts, findings, status, readText());
    }

    private ModalResult readModal() throws IOException {
        ModalResult.Builder builder = ModalResult.builder().model(readText(), in.readInt(), in.readInt(), in.readInt());
        builder.nodes(readList(this::readNode)).carriers(readList(this::readCarrier));
        builder.mass(readMass(), in.readDouble());
        builder.certificate(readCertificate(), in.readBoolean());
        int modes = readLength();
        for (int i = 0; i < modes; i++) {
            builder.mode(readMode(), readNumbers(), readNumbers(), readNumbers());
        }
        builder.instabilities(readList(this::readInstability));
        readTexts().forEach(builder::remark);
        int stages = readLength();
        for (int i = 0; i < stages; i++) {
            builder.seconds(readText(), in.readDouble());
        }
        return builder.build();
    }

    private Mode readMode() throws IOException {
        int number = in.readInt();
        double[] figures = readNumbers();
        double[] participation = readNumbers();
        double[] shares = readNumbers();
        double[] split = readNumbers();
        Character character = new Character(Character.Kind.valueOf(readText()), readText());
        return new Mode(number, figures[0], figures[1], figures[2], figures[3], figures[4], participation, shares, figures[5], split,
                character);
    }

    private NodePoint readNode() throws IOException {
        String id = readText();
        String name = readText();
        double[] position = readNumbers();
        return new NodePoint(id, name, position[0], position[1], position[2]);
    }

    private Carrier readCarrier() throws IOException {
        Kind kind = Kind.valueOf(readText());
        String id = readText();
        String name = readText();
        int[] nodes = new int[readLength()];
        for (int i = 0; i < nodes.length; i++) {
            nodes[i] = in.readInt();
        }
        return new Carrier(kind, id, name, nodes, readText(), readText(), readText(), readText());
    }

    private MassLedger readMass() throws IOException {
        return new MassLedger(readNumbers(), readNumbers(), readNumbers(), readNumbers(), readList(this::readMassSource),
                in.readDouble());
    }

    private MassSource readMassSource() throws IOException {
        return new MassSource(readText(), readNumbers(), readNumbers());
    }

    private Certificate readCertificate() throws IOException {
        boolean complete = in.readBoolean();
        int counted = in.readInt();
        int found = in.readInt();
        double[] figures = readNumbers();
        return new Certificate(complete, figures[0], counted, found, figures[1], figures[2]);
    }

    private Instability readInstability() throws IOException {
        return new Instability(Instability.Kind.valueOf(readText()), readTexts(), readTexts(), readTexts(), readTexts(), readText(),
                readText());
    }

    private Verdict readVerdict() throws IOException {
        String pack = readText();
        String clause = readText();
        Direction direction = Direction.valueOf(readText());
        double[] figures = readNumbers();
        return new Verdict(pack, clause, direction, figures[0], figures[1], in.readBoolean(), in.readInt(), in.readInt(), readText());
    }

    private Finding readFinding() throws IOException {
        return new Finding(readText(), Severity.valueOf(readText()), readList(this::readObject), readText(), readText());
    }

    private ObjectRef readObject() throws IOException {
        return new ObjectRef(readText(), readText(), readText());
    }

    private List<String> readTexts() throws IOException {
        return readList(this::readText);
    }

    private String readText() throws IOException {
        int length = in.readInt();
        return length < 0 ? null : new String(readBytes(length), StandardCharsets.UTF_8);
    }

    private double[] readNumbers() throws IOException {
        int length = readLength();
        double[] numbers = new double[length];
        ByteBuffer.wrap(readBytes(8 * length)).asDoubleBuffer().get(numbers);
        return numbers;
    }

    private byte[] readBytes(int length) throws IOException {
        if (length > LONGEST * 8L) {
            throw new DamagedRunException("it is damaged.", null);
        }
        byte[] bytes = in.readNBytes(length);
        if (bytes.length < length) {
            throw new EOFException();
        }
        return bytes;
    }

    private int readLength() throws IOException {
        int length = in.readInt();
        if (length < 0 || length > LONGEST) {
            throw new DamagedRunException("it is damaged.", null);
        }
        return length;
    }

    private <T> List<T> readList(ItemReader<T> reader) throws IOException {
        int length = readLength();
        List<T> items = new ArrayList<>(Math.min(length, CHUNK));
        for (int i = 0; i < length; i++) {
            items.add(reader.read());
        }
        return items;
    }

    @FunctionalInterface
    private interface ItemReader<T> {
        T read() throws IOException;
    }
}
