package org.treadwarm.wire;

import com.fasterxml.jackson.annotation.JsonSetter;
import com.fasterxml.jackson.annotation.Nulls;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.datatype.jdk8.Jdk8Module;
import java.util.Optional;
import org.treadwarm.sizing.Sizing;

/** Reads a sizing back that {@link Json} wrote, perhaps long ago. */
public final class FrozenSizing {
    private static final ObjectMapper MAPPER = JsonMapper.builder()
            .addModule(new Jdk8Module())
            .enable(DeserializationFeature.READ_ENUMS_USING_TO_STRING)
            .enable(DeserializationFeature.FAIL_ON_NULL_FOR_PRIMITIVES)
            .enable(DeserializationFeature.FAIL_ON_UNKNOWN_PROPERTIES)
            .withConfigOverride(
                    java.util.List.class, list -> list.setSetterInfo(JsonSetter.Value.forValueNulls(Nulls.AS_EMPTY)))
            .build();

    private FrozenSizing() {}

    /**
     * The sizing in this text; empty if it has not the form that today's program gives sizings, as one of an earlier method may
     * not.
     */
    public static Optional<Sizing> read(String text) {
        try {
            return Optional.of(MAPPER.readValue(text, Sizing.class));
        } catch (JsonProcessingException ofAnotherForm) {
            return Optional.empty();
        }
    }
}
