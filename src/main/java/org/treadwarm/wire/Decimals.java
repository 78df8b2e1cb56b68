package org.treadwarm.wire;

import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.databind.SerializerProvider;
import com.fasterxml.jackson.databind.module.SimpleModule;
import com.fasterxml.jackson.databind.ser.std.StdScalarSerializer;
import java.io.IOException;
import java.util.OptionalDouble;

/** Writes the numbers of answers by {@link ShortestDecimal}, with no text in between. */
final class Decimals {
    private static final ThreadLocal<char[]> CHARACTERS =
            ThreadLocal.withInitial(() -> new char[ShortestDecimal.LONGEST]);

    private Decimals() {}

    static SimpleModule module() {
        return new SimpleModule()
                .addSerializer(Double.class, new Always())
                .addSerializer(Double.TYPE, new Always())
                .addSerializer(OptionalDouble.class, new Perhaps());
    }

    private static void write(double value, JsonGenerator to) throws IOException {
        if (Double.isFinite(value)) {
            char[] characters = CHARACTERS.get();
            to.writeNumber(characters, 0, ShortestDecimal.write(value, characters, 0));
        } else {
            to.writeNumber(value);
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
