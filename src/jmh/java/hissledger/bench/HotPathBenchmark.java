package hissledger.bench;

import hissledger.circuit.FrontEnd;
import hissledger.physics.Band;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Frequencies;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** One front end at one frequency, out of sixty: a walk with its itemised powers and their total. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(2)
public class HotPathBenchmark {
    private static final int FREQUENCIES = 60;

    private final ChainPass pass = new ChainPass(Frequencies.of(Band.AUDIO.logarithmicHertz(FREQUENCIES)));
    private final double[] total = new double[FREQUENCIES];
    private final FrontEnd built = FirstTrial.frontEnd(40.0);
    private double baseOhms = 40.0;

    /** The walk alone. */
    @Benchmark
    @OperationsPerInvocation(FREQUENCIES)
    public double[] walk() {
        built.walk(pass);
        pass.total(total);
        return total;
    }

    /** A new build each time, as a production spread makes them, then its walk. */
    @Benchmark
    @OperationsPerInvocation(FREQUENCIES)
    public double[] buildAndWalk() {
        baseOhms = baseOhms > 60.0 ? 40.0 : baseOhms + 0.01;
        FirstTrial.frontEnd(baseOhms).walk(pass);
        pass.total(total);
        return total;
    }
}
