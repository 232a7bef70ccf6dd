package irreproof.naming;

import irreproof.budget.Budget;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Series;
import irreproof.engine.lie.SimpleAlgebra;
import java.math.BigInteger;
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
 * All irreps that a name with seven digits can mean, which is the work of naming; nothing is remembered. Times
 * are of single calls, so that the median is right on a busy machine as well.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.SampleTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class NamingBenchmark {
    @Benchmark
    public List<DominantWeight> e8Name4096000() {
        return irreps(new SimpleAlgebra(Series.E, 8), 4_096_000);
    }

    @Benchmark
    public List<DominantWeight> e6Name1559376() {
        return irreps(new SimpleAlgebra(Series.E, 6), 1_559_376);
    }

    @Benchmark
    public List<DominantWeight> su3Name1000000() {
        return irreps(new SimpleAlgebra(Series.A, 2), 1_000_000);
    }

    @Benchmark
    public List<DominantWeight> so10Name1048576() {
        return irreps(new SimpleAlgebra(Series.D, 5), 1_048_576);
    }

    private static List<DominantWeight> irreps(SimpleAlgebra algebra, long dimension) {
        return IrrepSearch.ofDimension(algebra, BigInteger.valueOf(dimension), Budget.unlimited())
                .irreps();
    }
}
