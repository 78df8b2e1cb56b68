package org.treadwarm.wire;

import com.fasterxml.jackson.annotation.JsonInclude;
import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.StreamWriteFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.SerializationFeature;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.module.SimpleModule;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.fasterxml.jackson.databind.ser.std.ToStringSerializer;
import com.fasterxml.jackson.datatype.jdk8.Jdk8Module;
import java.io.IOException;
import java.io.OutputStream;
import java.time.Instant;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.survey.Survey;

/** Writes answers: records as they are, what does not exist left out. */
public final class Json {
    private static final ObjectMapper MAPPER = JsonMapper.builder(JsonFactory.builder()
                    .enable(StreamWriteFeature.USE_FAST_DOUBLE_WRITER)
                    .build())
            .addModule(new Jdk8Module())
            .addModule(Decimals.module())
            .addModule(Rows.module())
            .addModule(new SimpleModule().addSerializer(Instant.class, ToStringSerializer.instance))
            .defaultPropertyInclusion(
                    JsonInclude.Value.construct(JsonInclude.Include.NON_ABSENT, JsonInclude.Include.NON_ABSENT))
            .enable(SerializationFeature.WRITE_ENUMS_USING_TO_STRING)
            .addMixIn(Sizing.FloorSizing.class, WithoutEmptyLists.class)
            .build();

    private Json() {}

    @JsonInclude(JsonInclude.Include.NON_EMPTY)
    private interface WithoutEmptyLists {}

    /** The mapper that writes answers. */
    public static ObjectMapper mapper() {
        return MAPPER;
    }

    /** An answer as UTF-8 text. */
    public static byte[] bytes(Object answer) {
        try {
            return MAPPER.writeValueAsBytes(answer);
        } catch (JsonProcessingException e) {
            throw new IllegalStateException("an answer cannot be written", e);
        }
    }

    /** Writes an answer as UTF-8 text. */
    public static void write(Object answer, OutputStream to) throws IOException {
        MAPPER.writeValue(to, answer);
    }

    /** A sizing as UTF-8 text, with its working. */
    public static byte[] withWorking(Survey survey, Sizing sizing) {
        ObjectNode answer = MAPPER.valueToTree(sizing);
        answer.set("working", tree(WorkingAnswer.of(survey, sizing)));
        return bytes(answer);
    }

    /** An answer as a tree. */
    public static JsonNode tree(Object answer) {
        return MAPPER.valueToTree(answer);
    }
}
