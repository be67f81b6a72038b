package hissledger.circuit;

import static hissledger.Trials.forAll;
import static hissledger.Trials.logUniform;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import hissledger.device.BiasedBipolar;
import hissledger.device.BipolarModel;
import hissledger.device.DeviceKind;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Frequencies;
import hissledger.twoport.Impedance;
import java.util.List;
import java.util.Optional;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** The parts of a front end by themselves: what they refuse, and identities between two ways to draw the same thing. */
class FrontEndPartsTest {
    /** A dozen roundings. */
    private static final Percentage ROUNDED = Percentage.withPercentage(100.0 * 1e-12);

    private static final double ROOM_KELVIN = 293.15;
    private static final BiasedBipolar DEVICE = new BiasedBipolar(BipolarModel.ideal(200.0, 20.0), 1e-3, ROOM_KELVIN);

    private static double total(FrontEnd frontEnd, double hertz) {
        ChainPass pass = new ChainPass(Frequencies.of(hertz));
        frontEnd.walk(pass);
        double[] sum = new double[1];
        pass.total(sum);
        return sum[0];
    }

    private static FrontEnd behind(Source source, PathElement... path) {
        return new FrontEnd(source, List.of(path), SingleStage.bare(DEVICE));
    }

    private static ResistorSource resistor(double ohms) {
        return new ResistorSource(ohms, ROOM_KELVIN, Signal.none());
    }

    @Test
    void aPadIsItsTwoArms() {
        forAll(100, random -> {
            double series = logUniform(random, 1.0, 1e4);
            double shunt = logUniform(random, 10.0, 1e5);
            int legs = random.nextInt(1, 3);
            double hertz = logUniform(random, 1.0, 1e6);
            assertThat(total(behind(resistor(150.0), new Pad("pad", series, shunt, legs, ROOM_KELVIN)), hertz))
                    .isCloseTo(
                            total(
                                    behind(
                                            resistor(150.0),
                                            new SeriesElement("arm", Passive.Resistor.of(series), legs, ROOM_KELVIN),
                                            new ShuntElement("leg", Passive.Resistor.of(shunt), 1, ROOM_KELVIN)),
                                    hertz),
                            ROUNDED);
        });
    }

    @Test
    void anIdealTransformerOfRatioOneIsNotThere() {
        Transformer through = new Transformer(
                "through", 1.0, 0.0, 0.0, Double.POSITIVE_INFINITY, 0.0, Double.POSITIVE_INFINITY, 0.0, ROOM_KELVIN);
        assertThat(total(behind(resistor(600.0), through), 1000.0))
                .isCloseTo(total(behind(resistor(600.0)), 1000.0), ROUNDED);
    }

    @Test
    void aTableSourceOnItsPointsIsWhatWasMeasured() {
        CoilSource coil = new CoilSource(600.0, 0.5, 100e3, 1e-10, ROOM_KELVIN, Signal.none());
        double[] hertz = {20.0, 200.0, 2_000.0, 20_000.0};
        double[] re = new double[4];
        double[] im = new double[4];
        coil.impedance().fill(Frequencies.of(hertz), re, im);
        TableSource table = new TableSource(
                List.of(20.0, 200.0, 2_000.0, 20_000.0),
                List.of(re[0], re[1], re[2], re[3]),
                List.of(im[0], im[1], im[2], im[3]),
                ROOM_KELVIN,
                Signal.none());
        for (double f : hertz) {
            assertThat(total(behind(table), f)).isCloseTo(total(behind(coil), f), ROUNDED);
        }
        assertThat(table.band().fromHertz()).isEqualTo(20.0);
        assertThat(table.band().toHertz()).isEqualTo(20_000.0);
        Impedance impedance = table.impedance();
        assertThatIllegalArgumentException()
                .isThrownBy(() -> impedance.fill(Frequencies.of(10.0), new double[1], new double[1]))
                .withMessage("the impedance table covers 20.0 Hz to 20000.0 Hz, not 10.0 Hz");
    }

    @Test
    void aTableSourceNeedsPointsThatMakeOne() {
        assertThatIllegalArgumentException()
                .isThrownBy(
                        () -> new TableSource(List.of(20.0), List.of(1.0), List.of(0.0), ROOM_KELVIN, Signal.none()))
                .withMessage("hertz.size must be >= 2, was 1");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new TableSource(
                        List.of(20.0, 30.0), List.of(1.0), List.of(0.0, 0.0), ROOM_KELVIN, Signal.none()))
                .withMessage("a table needs as many impedances as frequencies");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new TableSource(
                        List.of(20.0, 30.0), List.of(1.0, -1.0), List.of(0.0, 0.0), ROOM_KELVIN, Signal.none()))
                .withMessage("resistanceOhms must be finite and >= 0 Ω, was -1.0");
    }

    @Test
    void aSourceTakesAnotherResistance() {
        CoilSource coil = new CoilSource(600.0, 0.5, 100e3, 1e-10, ROOM_KELVIN, Signal.none());
        assertThat(coil.withResistance(200.0))
                .isEqualTo(new CoilSource(200.0, 0.5, 100e3, 1e-10, ROOM_KELVIN, Signal.none()));
        assertThat(resistor(600.0).withResistance(200.0)).isEqualTo(resistor(200.0));
        assertThat(new CapacitorSource(1e-10, 0.0, 1e9, ROOM_KELVIN, Signal.none()).withResistance(200.0))
                .isEqualTo(resistor(200.0));
        FrontEnd frontEnd = behind(coil);
        assertThat(frontEnd.withSource(resistor(50.0))).isEqualTo(behind(resistor(50.0)));
    }

    @Test
    void aFollowerHasNoCommonLead() {
        Surroundings around = new Surroundings(CommonLead.of(100.0), Optional.empty(), Optional.empty(), false);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new FollowerStage(DEVICE, 1, around))
                .withMessage("a follower has no common lead; its emitter or source resistor is the load");
    }

    @Test
    void stagesCountTheirCurrents() {
        assertThat(new SingleStage(DEVICE, 3, Surroundings.none()).totalAmps()).isCloseTo(3e-3, ROUNDED);
        assertThat(new FollowerStage(DEVICE, 2, Surroundings.none()).totalAmps())
                .isCloseTo(2e-3, ROUNDED);
        assertThat(new BalancedPair(DEVICE, 2, Surroundings.none(), 0.0, Double.POSITIVE_INFINITY).totalAmps())
                .isCloseTo(4e-3, ROUNDED);
        assertThat(new SingleEndedPair(DEVICE, 1, Surroundings.none(), 0.0).totalAmps())
                .isCloseTo(2e-3, ROUNDED);
        assertThat(SingleStage.bare(DEVICE).deviceAmps()).hasValue(1e-3);
    }

    @Test
    void arrangementsFitTheirDevices() {
        assertThat(Arrangement.COMMON_EMITTER.fits(DeviceKind.BIPOLAR)).isTrue();
        assertThat(Arrangement.COMMON_EMITTER.fits(DeviceKind.JFET)).isFalse();
        assertThat(Arrangement.COMMON_SOURCE.fits(DeviceKind.JFET)).isTrue();
        assertThat(Arrangement.COMMON_SOURCE.fits(DeviceKind.BIPOLAR)).isFalse();
        assertThat(Arrangement.FOLLOWER.fits(DeviceKind.AMPLIFIER)).isFalse();
        assertThat(Arrangement.AMPLIFIER.fits(DeviceKind.AMPLIFIER)).isTrue();
        StagePlan plan = new StagePlan(Arrangement.FOLLOWER, 2, Surroundings.none());
        assertThat(plan.with(DEVICE)).isEqualTo(new FollowerStage(DEVICE, 2, Surroundings.none()));
        assertThat(new StagePlan(Arrangement.COMMON_EMITTER, 1, Surroundings.none()).with(DEVICE))
                .isEqualTo(SingleStage.bare(DEVICE));
    }

    @Test
    void refusesPartsThatAreNone() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new SeriesElement("R", Passive.Resistor.of(1.0), 0, ROOM_KELVIN))
                .withMessage("legs must be >= 1, was 0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Passive.Resistor.of(0.0))
                .withMessage("ohms must be finite and > 0 Ω, was 0.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Passive.Capacitor.of(Double.NaN))
                .withMessage("farads must be finite and > 0 F, was NaN");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Passive.Inductor(-1.0))
                .withMessage("henries must be finite and > 0 H, was -1.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new CoilSource(1.0, 1.0, 0.0, 0.0, ROOM_KELVIN, Signal.none()))
                .withMessage("parallelOhms must be > 0 Ω, was 0.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new BalancedPair(DEVICE, 1, Surroundings.none(), 0.0, Double.NaN))
                .withMessage("feedbackOhms must be > 0 Ω, was NaN");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new ShuntElement(
                        "C", Passive.Capacitor.of(1e-9), 1, ROOM_KELVIN, Optional.of(new Supply(1e-6, 0.0))))
                .withMessage("only a resistor leads to a noisy supply");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Supply(1e-6, 1.5))
                .withMessage("mismatch must lie between 0 and 1, was 1.5");
    }
}
