package org.treadwarm.web.api;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.treadwarm.intake.Document;
import org.treadwarm.jobs.Demo;

class BatchHelpersTest {
    private static final List<Integer> ITEMS = IntStream.range(0, 500).boxed().toList();

    @Test
    void keepsTheOrderWhateverTheNumberOfCores() {
        for (int cores : new int[] {1, 2, 7}) {
            assertThat(new Helpers(cores).all(ITEMS, item -> item * 2))
                    .isEqualTo(ITEMS.stream().map(item -> item * 2).toList());
        }
        assertThat(new Helpers(2).all(List.<Integer>of(), item -> item)).isEmpty();
    }

    @Test
    void whoFindsTheHelpersBusyWorksAlone() throws Exception {
        Helpers helpers = new Helpers(2);
        CountDownLatch bothAtWork = new CountDownLatch(2);
        CountDownLatch free = new CountDownLatch(1);
        Thread first = new Thread(() -> helpers.all(List.of(1, 2), item -> {
            bothAtWork.countDown();
            await(free);
            return item;
        }));
        first.start();
        await(bothAtWork);

        Set<Thread> workers = ConcurrentHashMap.newKeySet();
        helpers.all(ITEMS, item -> workers.add(Thread.currentThread()));

        assertThat(workers).containsExactly(Thread.currentThread());
        free.countDown();
        first.join();
    }

    @Test
    void aFailureOfAHelperIsNotLost() {
        assertThatThrownBy(() -> new Helpers(2).all(ITEMS, item -> {
                    throw new IllegalArgumentException("item " + item);
                }))
                .isInstanceOfAny(IllegalArgumentException.class, IllegalStateException.class);
    }

    @Test
    void afterTheTimeIsUpNothingIsSized() {
        String answer =
                new String(BatchApi.answer(Document.mapper().createObjectNode(), () -> true), StandardCharsets.UTF_8);

        assertThat(answer).contains("\"status\":503").contains("too-long");
    }

    @Test
    void aSizingThatIsUnderWayWhenTheTimeIsUpIsGivenUp() {
        ObjectNode survey = (ObjectNode) Demo.survey();
        ((ObjectNode) survey.at("/rooms/2/heatedFloor/heater")).put("spacing", "133.741 mm");
        AtomicInteger asked = new AtomicInteger();

        String answer = new String(BatchApi.answer(survey, () -> asked.getAndIncrement() > 0), StandardCharsets.UTF_8);

        assertThat(answer).contains("\"status\":503").contains("too-long");
    }

    private static void await(CountDownLatch latch) {
        try {
            latch.await();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(e);
        }
    }
}
