package irreproof.engine.lie;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import irreproof.engine.Partition;
import irreproof.engine.SchurFunctor;
import irreproof.engine.lie.embedding.RegularEmbeddings;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/**
 * The work of the engine that papers ask for most, and some that they ask for seldom; nothing is remembered. Times
 * are of single calls, so that the median is right on a busy machine as well.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.SampleTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class EngineBenchmark {
    private static final SimpleAlgebra SU3 = new SimpleAlgebra(Series.A, 2);
    private static final SimpleAlgebra SO10 = new SimpleAlgebra(Series.D, 5);
    private static final SimpleAlgebra E6 = new SimpleAlgebra(Series.E, 6);
    private static final SimpleAlgebra E7 = new SimpleAlgebra(Series.E, 7);
    private static final SimpleAlgebra E8 = new SimpleAlgebra(Series.E, 8);

    private final Embedding e8ToSu3AndE6 = RegularEmbeddings.maximal(E8).stream()
            .filter(embedding -> embedding.subalgebra().factors().containsAll(List.of(SU3, E6)))
            .findFirst()
            .orElseThrow();

    @Benchmark
    public Decomposition<DominantWeight> su3Product27By27() {
        return LittlewoodRichardson.product(DominantWeight.of(2, 2), DominantWeight.of(2, 2), Budget.unlimited());
    }

    @Benchmark
    public Decomposition<DominantWeight> so10Product126By210() {
        return klimyk(SO10, DominantWeight.of(0, 0, 0, 0, 2), DominantWeight.of(0, 0, 0, 1, 1));
    }

    @Benchmark
    public Decomposition<DominantWeight> e6Product351By351Prime() {
        return klimyk(E6, DominantWeight.of(0, 0, 1, 0, 0, 0), DominantWeight.of(2, 0, 0, 0, 0, 0));
    }

    @Benchmark
    public Decomposition<DominantWeight> e8Product3875By3875() {
        DominantWeight irrep = DominantWeight.of(1, 0, 0, 0, 0, 0, 0, 0);
        return klimyk(E8, irrep, irrep);
    }

    @Benchmark
    public Decomposition<DominantWeight> su12ProductOfTwoDiagramsOf12Boxes() {
        return LittlewoodRichardson.product(
                Diagrams.weight(12, Partition.of(5, 4, 2, 1)).orElseThrow(),
                Diagrams.weight(12, Partition.of(4, 3, 3, 1, 1)).orElseThrow(),
                Budget.unlimited());
    }

    /** The powers forget here, unlike in the ring: the character is made anew each time. */
    @Benchmark
    public Decomposition<DominantWeight> e7ThirdExteriorPowerOf133() {
        return power(E7, DominantWeight.of(1, 0, 0, 0, 0, 0, 0), Partition.column(3));
    }

    /** The character of the irrep alone is remembered here. */
    @Benchmark
    public Decomposition<ReductiveIrrep> e8Branching3875ToSu3AndE6() {
        return Branching.branch(e8ToSu3AndE6, DominantWeight.of(1, 0, 0, 0, 0, 0, 0, 0), Budget.unlimited());
    }

    private static Decomposition<DominantWeight> klimyk(
            SimpleAlgebra algebra, DominantWeight left, DominantWeight right) {
        return KlimykProduct.product(algebra, left, right, Budget.unlimited());
    }

    private static Decomposition<DominantWeight> power(SimpleAlgebra algebra, DominantWeight irrep, Partition diagram) {
        var character = DominantCharacter.of(algebra, irrep, Budget.unlimited());
        return SchurFunctor.of(
                (power, factor, budget) ->
                        KlimykProduct.scaled(RootSystem.of(algebra), character, power, factor, budget),
                DominantWeight.of(new int[algebra.rank()]),
                diagram,
                Budget.unlimited());
    }
}
