package hissledger.bench;

import hissledger.circuit.FrontEnd;
import hissledger.ledger.Accounting;
import hissledger.ledger.Ledger;
import hissledger.physics.Band;
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

/** A whole account: nodes found, every integral, three spots, a spectrum of 240 points. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(2)
public class LedgerBenchmark {
    private static final List<Double> SPOTS = List.of(100.0, 1000.0, 10_000.0);
    private final FrontEnd frontEnd = FirstTrial.frontEnd(40.0);

    /** The account. */
    @Benchmark
    public Ledger ledger() {
        return Accounting.of(frontEnd, Band.AUDIO, SPOTS);
    }
}
