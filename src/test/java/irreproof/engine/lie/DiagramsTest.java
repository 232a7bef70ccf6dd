package irreproof.engine.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import irreproof.engine.Partition;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class DiagramsTest {
    @Test
    void labelsCountColumns() {
        assertEquals(Partition.of(4, 3, 3, 1), Diagrams.partition(DominantWeight.of(1, 0, 2, 1)));
        assertEquals(Optional.of(DominantWeight.of(1, 0, 2, 1)), Diagrams.weight(5, Partition.of(4, 3, 3, 1)));
    }

    @Test
    void columnsOfNBoxesDropAndLongerOnesVanish() {
        assertEquals(Optional.of(DominantWeight.of(1, 0)), Diagrams.weight(3, Partition.of(3, 2, 2)));
        assertEquals(Optional.of(DominantWeight.of(0, 0)), Diagrams.weight(3, Partition.of(1, 1, 1)));
        assertEquals(Optional.empty(), Diagrams.weight(3, Partition.of(1, 1, 1, 1)));
    }

    @Test
    void rowsMustNotGrow() {
        assertThrows(IllegalArgumentException.class, () -> Partition.of(1, 2));
        assertThrows(IllegalArgumentException.class, () -> Partition.of(1, -1));
        assertEquals(Partition.of(2, 1), Partition.of(2, 1, 0));
    }
}
