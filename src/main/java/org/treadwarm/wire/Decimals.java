package org.treadwarm.wire;

import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.io.SerializedString;
import com.fasterxml.jackson.core.json.UTF8JsonGenerator;
import com.fasterxml.jackson.databind.SerializerProvider;
import com.fasterxml.jackson.databind.module.SimpleModule;
import com.fasterxml.jackson.databind.ser.std.StdScalarSerializer;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.OptionalDouble;

/** Writes the numbers of answers by {@link ShortestDecimal}, with no text in between. */
final class Decimals {
    private Decimals() {}

    static SimpleModule module() {
        return new SimpleModule()
                .addSerializer(Double.class, new Always())
                .addSerializer(Double.TYPE, new Always())
                .addSerializer(OptionalDouble.class, new Perhaps());
    }

    static void write(double value, JsonGenerator to) throws IOException {
        if (!Double.isFinite(value)) {
            to.writeNumber(value);
        } else if (to instanceof UTF8JsonGenerator) {
            to.writeRawValue(new Digits(value));
        } else {
            to.writeNumber(new String(new Digits(value).bytes(), StandardCharsets.US_ASCII));
        }
    }

    /** Puts its digits into a generator's buffer, with no text in between. */
    private static final class Digits extends SerializedString {
        private static final long serialVersionUID = 1;

        private final double value;

        Digits(double value) {
            super("");
            this.value = value;
        }

        @Override
        public int appendUnquotedUTF8(byte[] buffer, int offset) {
            if (buffer.length - offset < ShortestDecimal.LONGEST) {
                // what the generator asks for next
                _unquotedUTF8Ref = bytes();
                return -1;
            }
            return ShortestDecimal.write(value, buffer, offset) - offset;
        }

        byte[] bytes() {
            byte[] digits = new byte[ShortestDecimal.LONGEST];
            return Arrays.copyOf(digits, ShortestDecimal.write(value, digits, 0));
        }
    }

    private static final class Always extends StdScalarSerializer<Double> {
        private static final long serialVersionUID = 1;

        Always() {
            super(Double.class);
        }

        @Override
        public void serialize(Double value, JsonGenerator to, SerializerProvider provider) throws IOException {
            write(value, to);
        }
    }

    private static final class Perhaps extends StdScalarSerializer<OptionalDouble> {
        private static final long serialVersionUID = 1;

        Perhaps() {
            super(OptionalDouble.class);
        }

        @Override
        public boolean isEmpty(SerializerProvider provider, OptionalDouble value) {
            return value.isEmpty();
        }

        @Override
        public void serialize(OptionalDouble value, JsonGenerator to, SerializerProvider provider) throws IOException {
            if (value.isPresent()) {
                write(value.getAsDouble(), to);
            } else {
                to.writeNull();
            }
        }
    }
}
