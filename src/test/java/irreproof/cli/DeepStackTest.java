package irreproof.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import org.junit.jupiter.api.Test;

class DeepStackTest {
    @Test
    void returnsResultsInTheOrderOfTheTasks() throws Exception {
        List<Callable<Integer>> tasks = new ArrayList<>();
        for (int i = 0; i < 100; i++) {
            int number = i;
            tasks.add(() -> sum(number * 50) - sum(number * 50 - 1));
        }
        List<Integer> results = DeepStack.runAll(tasks);
        for (int i = 1; i < 100; i++) {
            assertEquals(i * 50, results.get(i));
        }
        assertEquals(List.of(), DeepStack.runAll(List.of()));
    }

    @Test
    void passesOnWhatATaskThrows() {
        assertThrows(
                IOException.class,
                () -> DeepStack.runAll(List.of(() -> {
                    throw new IOException("first");
                })));
        assertThrows(StackOverflowError.class, () -> DeepStack.runAll(List.of(() -> sum(Integer.MAX_VALUE))));
    }

    private static int sum(int upTo) {
        return upTo <= 0 ? 0 : upTo + sum(upTo - 1);
    }
}
