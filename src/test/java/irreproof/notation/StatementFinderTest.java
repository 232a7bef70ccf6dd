package irreproof.notation;

import java.io.IOException;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;

class StatementFinderTest {
    @TestFactory
    Stream<DynamicTest> readsEveryWayToWriteAName() throws IOException {
        return Fixtures.table("names.txt");
    }

    @TestFactory
    Stream<DynamicTest> readsEveryOperator() throws IOException {
        return Fixtures.table("operators.txt");
    }

    @TestFactory
    Stream<DynamicTest> readsThroughTheLayout() throws IOException {
        return Fixtures.table("layout.txt");
    }

    @TestFactory
    Stream<DynamicTest> keepsSilentOnLookAlikes() throws IOException {
        return Fixtures.table("look-alikes.txt");
    }
}
