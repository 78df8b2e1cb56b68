package org.treadwarm.wire;

import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.io.SerializedString;
import com.fasterxml.jackson.databind.SerializerProvider;
import com.fasterxml.jackson.databind.module.SimpleModule;
import com.fasterxml.jackson.databind.ser.std.StdSerializer;
import java.io.IOException;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.concurrent.ConcurrentHashMap;
import org.treadwarm.sizing.Sizing.Caution;
import org.treadwarm.sizing.Sizing.LayerSizing;
import org.treadwarm.sizing.Sizing.PathLoss;
import org.treadwarm.sizing.Sizing.SideSizing;

/**
 * Writes the records of which a sizing has the most, key by key, as the mapper would: most of an answer's numbers are in them,
 * and this is twice as fast as looking every component up.
 */
final class Rows {
    private Rows() {}

    static SimpleModule module() {
        return new SimpleModule()
                .addSerializer(new Paths())
                .addSerializer(new Layers())
                .addSerializer(new Sides())
                .addSerializer(new Cautions());
    }

    private abstract static class Row<T> extends StdSerializer<T> {
        private static final long serialVersionUID = 1;

        Row(Class<T> type) {
            super(type);
        }

        @Override
        public final void serialize(T row, JsonGenerator to, SerializerProvider provider) throws IOException {
            to.writeStartObject(row);
            keys(row, to, provider);
            to.writeEndObject();
        }

        abstract void keys(T row, JsonGenerator to, SerializerProvider provider) throws IOException;

        static void text(SerializedString key, String value, JsonGenerator to) throws IOException {
            to.writeFieldName(key);
            to.writeString(value);
        }

        static void number(SerializedString key, double value, JsonGenerator to) throws IOException {
            to.writeFieldName(key);
            Decimals.write(value, to);
        }

        static void number(SerializedString key, OptionalDouble value, JsonGenerator to) throws IOException {
            if (value.isPresent()) {
                number(key, value.getAsDouble(), to);
            }
        }
    }

    private static final class Paths extends Row<PathLoss> {
        private static final long serialVersionUID = 1;
        private static final SerializedString NAME = new SerializedString("name");
        private static final SerializedString TO = new SerializedString("to");
        private static final SerializedString KIND = new SerializedString("kind");
        private static final SerializedString AREA = new SerializedString("area");
        private static final SerializedString U_VALUE = new SerializedString("uValue");
        private static final SerializedString CONDUCTANCE = new SerializedString("conductance");
        private static final SerializedString TEMPERATURE_DIFFERENCE = new SerializedString("temperatureDifference");
        private static final SerializedString HEAT_FLOW = new SerializedString("heatFlow");
        private static final SerializedString SHARE = new SerializedString("share");
        private static final SerializedString GROUND = new SerializedString("ground");

        Paths() {
            super(PathLoss.class);
        }

        @Override
        void keys(PathLoss path, JsonGenerator to, SerializerProvider provider) throws IOException {
            text(NAME, path.name(), to);
            if (path.to().isPresent()) {
                text(TO, path.to().get(), to);
            }
            text(KIND, path.kind(), to);
            number(AREA, path.area(), to);
            number(U_VALUE, path.uValue(), to);
            number(CONDUCTANCE, path.conductance(), to);
            number(TEMPERATURE_DIFFERENCE, path.temperatureDifference(), to);
            number(HEAT_FLOW, path.heatFlow(), to);
            number(SHARE, path.share(), to);
            if (path.ground().isPresent()) {
                to.writeFieldName(GROUND);
                provider.defaultSerializeValue(path.ground().get(), to);
            }
        }
    }

    private static final class Layers extends Row<LayerSizing> {
        private static final long serialVersionUID = 1;
        private static final SerializedString NAME = new SerializedString("name");
        private static final SerializedString RESISTANCE = new SerializedString("resistance");
        private static final SerializedString FRAMING_RESISTANCE = new SerializedString("framingResistance");

        Layers() {
            super(LayerSizing.class);
        }

        @Override
        void keys(LayerSizing layer, JsonGenerator to, SerializerProvider provider) throws IOException {
            text(NAME, layer.name(), to);
            number(RESISTANCE, layer.resistance(), to);
            number(FRAMING_RESISTANCE, layer.framingResistance(), to);
        }
    }

    private static final class Sides extends Row<SideSizing> {
        private static final long serialVersionUID = 1;
        private static final SerializedString SIDE = new SerializedString("side");
        private static final SerializedString INSIDE_FILM = new SerializedString("insideFilm");
        private static final SerializedString OUTSIDE_FILM = new SerializedString("outsideFilm");
        private static final SerializedString UPPER_LIMIT = new SerializedString("upperLimit");
        private static final SerializedString LOWER_LIMIT = new SerializedString("lowerLimit");
        private static final SerializedString LARGEST = new SerializedString("largestRelativeError");
        private static final SerializedString RESISTANCE = new SerializedString("resistance");
        private static final SerializedString U_VALUE = new SerializedString("uValue");

        Sides() {
            super(SideSizing.class);
        }

        @Override
        void keys(SideSizing side, JsonGenerator to, SerializerProvider provider) throws IOException {
            text(SIDE, side.side(), to);
            number(INSIDE_FILM, side.insideFilm(), to);
            number(OUTSIDE_FILM, side.outsideFilm(), to);
            number(UPPER_LIMIT, side.upperLimit(), to);
            number(LOWER_LIMIT, side.lowerLimit(), to);
            number(LARGEST, side.largestRelativeError(), to);
            number(RESISTANCE, side.resistance(), to);
            number(U_VALUE, side.uValue(), to);
        }
    }

    /** There are a handful of cautions, all of them constants and long, and every answer has most of them. */
    private static final class Cautions extends Row<Caution> {
        private static final long serialVersionUID = 1;
        private static final SerializedString CODE = new SerializedString("code");
        private static final SerializedString TEXT = new SerializedString("text");
        private static final SerializedString SOURCE = new SerializedString("source");
        private static final int MOST = 100;

        private final transient Map<String, SerializedString> encoded = new ConcurrentHashMap<>();

        Cautions() {
            super(Caution.class);
        }

        @Override
        void keys(Caution caution, JsonGenerator to, SerializerProvider provider) throws IOException {
            constant(CODE, caution.code(), to);
            constant(TEXT, caution.text(), to);
            constant(SOURCE, caution.source(), to);
        }

        private void constant(SerializedString key, String value, JsonGenerator to) throws IOException {
            SerializedString known = encoded.get(value);
            if (known == null) {
                known = new SerializedString(value);
                if (encoded.size() < MOST) {
                    encoded.put(value, known);
                }
            }
            to.writeFieldName(key);
            to.writeString(known);
        }
    }
}
