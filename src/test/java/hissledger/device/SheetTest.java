package hissledger.device;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.assertj.core.api.ThrowableAssert.ThrowingCallable;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** What a device sheet states, and the documented rules by which typical numbers follow from it. */
class SheetTest {
    /** A root, a logarithm and its exponential. */
    private static final Percentage ROUNDED = Percentage.withPercentage(100.0 * 1e-13);

    private static final OptionalDouble NONE = OptionalDouble.empty();

    private static OptionalDouble some(double value) {
        return OptionalDouble.of(value);
    }

    private static Parameter parameter(OptionalDouble min, OptionalDouble typical, OptionalDouble max) {
        return new Parameter(min, typical, max, Basis.MAKER, "a sheet", "", Map.of());
    }

    private static Parameter typicalAt(double typical, Map<StatedAt, Double> at) {
        return new Parameter(NONE, some(typical), NONE, Basis.MAKER, "a sheet", "", at);
    }

    // ------------------------------------------------------------------------------------------------- parameters

    @Test
    void aTypicalValueStandsForItself() {
        Parameter parameter = parameter(some(1.0), some(2.0), some(10.0));
        assertThat(parameter.representative()).isEqualTo(2.0);
        assertThat(parameter.rule()).isEmpty();
        assertThat(parameter.least()).isEqualTo(1.0);
        assertThat(parameter.greatest()).isEqualTo(10.0);
    }

    @Test
    void betweenMinAndMaxStandsTheirGeometricMean() {
        Parameter parameter = parameter(some(2.0), NONE, some(8.0));
        assertThat(parameter.representative()).isEqualTo(4.0);
        assertThat(parameter.rule()).isEqualTo("geometric mean of its min and max");
    }

    @Test
    void aLeastValueOfZeroAsksForTheArithmeticMean() {
        Parameter parameter = parameter(some(0.0), NONE, some(8.0));
        assertThat(parameter.representative()).isEqualTo(4.0);
        assertThat(parameter.rule()).isEqualTo("mean of its min and max");
    }

    @Test
    void oneBoundStandsForAll() {
        Parameter atLeast = parameter(some(3.0), NONE, NONE);
        assertThat(atLeast.representative()).isEqualTo(3.0);
        assertThat(atLeast.rule()).isEqualTo("its min");
        assertThat(atLeast.greatest()).isEqualTo(3.0);
        Parameter atMost = parameter(NONE, NONE, some(5.0));
        assertThat(atMost.representative()).isEqualTo(5.0);
        assertThat(atMost.rule()).isEqualTo("its max");
        assertThat(atMost.least()).isEqualTo(5.0);
    }

    @Test
    void aParameterNeedsARisingValue() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> parameter(NONE, NONE, NONE))
                .withMessage("a parameter needs at least one of min, typical and max");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> parameter(some(3.0), some(2.0), NONE))
                .withMessage("min, typical and max must not fall, but 2.0 follows 3.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> parameter(some(3.0), NONE, some(2.0)))
                .withMessage("min, typical and max must not fall, but 2.0 follows 3.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> parameter(some(Double.NaN), NONE, NONE))
                .withMessage("value must be finite, was NaN");
        assertThat(parameter(some(2.0), some(2.0), some(2.0)).representative()).isEqualTo(2.0);
    }

    @Test
    void someBasesNeedAReference() {
        assertThat(List.of(Basis.values()).stream().filter(Basis::needsReference))
                .containsExactly(Basis.MAKER, Basis.MEASURED, Basis.DERIVED);
        assertThat(Parameter.typical(5.0, Basis.MEMORY).reference()).isEmpty();
        assertThat(Parameter.typical(5.0, Basis.MEMORY).representative()).isEqualTo(5.0);
    }

    // ------------------------------------------------------------------------------------------------ current gain

    private static GainPoint point(double amps, OptionalDouble min, OptionalDouble typical, OptionalDouble max) {
        return new GainPoint(amps, min, typical, max);
    }

    private static GainSheet sheet(GainPoint... points) {
        return new GainSheet(List.of(points), Basis.MAKER, "a sheet", "");
    }

    @Test
    void typicalGainsAreTakenAsTheyAre() {
        GainSheet sheet =
                sheet(point(1e-5, some(100.0), some(200.0), NONE), point(1e-3, some(150.0), some(300.0), some(600.0)));
        assertThat(sheet.rule()).isEmpty();
        assertThat(sheet.typical().at(1e-5)).isCloseTo(200.0, ROUNDED);
        assertThat(sheet.typical().at(1e-3)).isCloseTo(300.0, ROUNDED);
        assertThat(sheet.least().at(1e-5)).isCloseTo(100.0, ROUNDED);
        assertThat(sheet.least().at(1e-3)).isCloseTo(150.0, ROUNDED);
        // no max at 10 µA: the typical value there times max over typical at 1 mA
        assertThat(sheet.greatest().at(1e-5)).isCloseTo(400.0, ROUNDED);
        assertThat(sheet.greatest().at(1e-3)).isCloseTo(600.0, ROUNDED);
    }

    @Test
    void aPointWithBothBoundsHasTheirGeometricMean() {
        GainSheet sheet = sheet(point(1e-3, some(100.0), NONE, some(400.0)));
        assertThat(sheet.typical().at(1e-3)).isCloseTo(200.0, ROUNDED);
        assertThat(sheet.rule())
                .isEqualTo("geometric mean of min and max, and min scaled likewise at currents without max");
    }

    @Test
    void aPointWithOneBoundIsScaledAsAtTheNearestThatCompares() {
        GainSheet sheet = sheet(
                point(1e-5, some(40.0), NONE, NONE),
                point(1e-4, some(80.0), some(160.0), NONE),
                point(1e-2, some(100.0), some(400.0), NONE));
        // 10 µA is nearest to 100 µA, where typical is twice min
        assertThat(sheet.typical().at(1e-5)).isCloseTo(80.0, ROUNDED);
        assertThat(sheet.least().at(1e-5)).isCloseTo(40.0, ROUNDED);
        assertThat(sheet.rule())
                .isEqualTo(
                        "between its min and max, or scaled from its min as at the nearest current with a typical value");
    }

    @Test
    void aPointWithAMaxAloneIsScaledFromItsMax() {
        GainSheet sheet = sheet(point(1e-4, NONE, some(250.0), some(500.0)), point(1e-3, NONE, NONE, some(600.0)));
        assertThat(sheet.typical().at(1e-3)).isCloseTo(300.0, ROUNDED);
        assertThat(sheet.greatest().at(1e-3)).isCloseTo(600.0, ROUNDED);
    }

    @Test
    void withoutAnythingToCompareTheBoundStandsForItself() {
        GainSheet sheet = sheet(point(1e-4, some(50.0), NONE, NONE), point(1e-3, some(90.0), NONE, NONE));
        assertThat(sheet.typical().at(1e-4)).isCloseTo(50.0, ROUNDED);
        assertThat(sheet.typical().at(1e-3)).isCloseTo(90.0, ROUNDED);
        assertThat(sheet.greatest().at(1e-3)).isCloseTo(90.0, ROUNDED);
        assertThat(sheet.rule()).isEqualTo("its min");
    }

    @Test
    void gainPointsMustRiseAndStateSomething() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> sheet())
                .withMessage("currentGain needs at least one point");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> sheet(point(1e-3, some(1.0), NONE, NONE), point(1e-3, some(1.0), NONE, NONE)))
                .withMessage("the currents of currentGain must rise");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> point(1e-3, NONE, NONE, NONE))
                .withMessage("a gain point needs at least one of min, typical and max");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> point(1e-3, some(200.0), some(100.0), NONE))
                .withMessage("min, typical and max of currentGain must not fall, but 100.0 follows 200.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> point(0.0, some(200.0), NONE, NONE))
                .withMessage("currentAmps must be finite and > 0 A, was 0.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> point(1e-3, some(-200.0), NONE, NONE))
                .withMessage("currentGain must be finite and > 0, was -200.0");
    }

    // ------------------------------------------------------------------------------------------------------ devices

    private static Device device(
            DeviceKind kind, Polarity polarity, Optional<GainSheet> gain, Map<DeviceParameter, Parameter> parameters) {
        return new Device("an-example", kind, polarity, "invented", "", "", gain, parameters, List.of());
    }

    private static final Optional<GainSheet> A_GAIN = Optional.of(sheet(point(1e-3, NONE, some(300.0), NONE)));

    @Test
    void aBareBipolarSheetResolvesWithItsDefaultsListed() {
        Device.Resolved<BipolarModel> resolved = device(
                        DeviceKind.BIPOLAR,
                        Polarity.NPN,
                        A_GAIN,
                        Map.of(DeviceParameter.BASE_RESISTANCE, parameter(some(10.0), NONE, some(40.0))))
                .bipolar();
        BipolarModel model = resolved.model();
        assertThat(model.currentGain().at(1e-6)).isCloseTo(300.0, ROUNDED);
        assertThat(model.baseResistanceOhms()).isEqualTo(20.0);
        assertThat(model.emitterResistanceOhms()).isZero();
        assertThat(model.earlyVolts()).isEqualTo(Double.POSITIVE_INFINITY);
        assertThat(model.transitionHertz()).isEqualTo(Double.POSITIVE_INFINITY);
        assertThat(model.collectorBaseFarads()).isZero();
        assertThat(model.emitterBaseFarads()).isZero();
        assertThat(model.flicker()).isEmpty();
        assertThat(resolved.defaultsUsed())
                .containsExactly(
                        "flicker corner of the base current: not stated, no flicker noise counted",
                        "base spreading resistance rbb': typical value taken as geometric mean of its min and max",
                        "bulk emitter resistance: not stated, taken as 0 Ω",
                        "Early voltage: not stated, taken as infinite",
                        "transition frequency fT: not stated, taken as infinite",
                        "collector-base capacitance: not stated, taken as 0 pF",
                        "emitter-base capacitance: not stated, taken as 0 pF");
    }

    @Test
    void aFullBipolarSheetNeedsNoDefault() {
        Map<DeviceParameter, Parameter> parameters = new HashMap<>();
        parameters.put(DeviceParameter.BASE_RESISTANCE, typicalAt(20.0, Map.of()));
        parameters.put(DeviceParameter.EMITTER_RESISTANCE, typicalAt(0.5, Map.of()));
        parameters.put(DeviceParameter.EARLY_VOLTAGE, typicalAt(80.0, Map.of()));
        parameters.put(DeviceParameter.TRANSITION_FREQUENCY, typicalAt(1e8, Map.of()));
        parameters.put(DeviceParameter.COLLECTOR_BASE_CAPACITANCE, typicalAt(3e-12, Map.of()));
        parameters.put(DeviceParameter.EMITTER_BASE_CAPACITANCE, typicalAt(9e-12, Map.of()));
        parameters.put(
                DeviceParameter.BASE_FLICKER_CORNER,
                typicalAt(500.0, Map.of(StatedAt.CURRENT, 1e-4, StatedAt.EXPONENT, 1.2)));
        Device.Resolved<BipolarModel> resolved =
                device(DeviceKind.BIPOLAR, Polarity.PNP, A_GAIN, parameters).bipolar();
        assertThat(resolved.defaultsUsed()).isEmpty();
        assertThat(resolved.model().flicker()).contains(new BaseFlicker(500.0, 1e-4, 1.2));
        assertThat(resolved.model().emitterResistanceOhms()).isEqualTo(0.5);
        assertThat(resolved.model().earlyVolts()).isEqualTo(80.0);
        assertThat(resolved.model().transitionHertz()).isEqualTo(1e8);
        assertThat(resolved.model().collectorBaseFarads()).isEqualTo(3e-12);
        assertThat(resolved.model().emitterBaseFarads()).isEqualTo(9e-12);
    }

    @Test
    void aFlickerCornerWithoutItsCurrentSaysWhatWasTaken() {
        Device.Resolved<BipolarModel> resolved = device(
                        DeviceKind.BIPOLAR,
                        Polarity.NPN,
                        A_GAIN,
                        Map.of(
                                DeviceParameter.BASE_RESISTANCE, typicalAt(20.0, Map.of()),
                                DeviceParameter.BASE_FLICKER_CORNER, typicalAt(500.0, Map.of())))
                .bipolar();
        assertThat(resolved.model().flicker()).contains(new BaseFlicker(500.0, 1e-3, 1.0));
        assertThat(resolved.defaultsUsed())
                .contains("flicker corner of the base current: its current not stated, taken as 1 mA");
    }

    @Test
    void aBareJfetSheetResolvesWithItsDefaultsListed() {
        Device.Resolved<JfetModel> resolved = device(
                        DeviceKind.JFET,
                        Polarity.N_CHANNEL,
                        Optional.empty(),
                        Map.of(
                                DeviceParameter.DRAIN_SATURATION_CURRENT, parameter(some(2e-3), NONE, some(8e-3)),
                                DeviceParameter.TRANSCONDUCTANCE, typicalAt(8e-3, Map.of()),
                                DeviceParameter.GATE_LEAKAGE, typicalAt(2e-12, Map.of())))
                .jfet();
        JfetModel model = resolved.model();
        assertThat(model.law().saturationAmps()).isEqualTo(4e-3);
        // gm = 2 IDSS/|VGS(off)| at IDSS
        assertThat(model.law().pinchOffVolts()).isCloseTo(1.0, ROUNDED);
        assertThat(model.channelNoiseFactor()).isEqualTo(2.0 / 3.0);
        assertThat(model.leakage()).isEqualTo(new GateLeakage(2e-12, 298.15, 10.0));
        assertThat(resolved.defaultsUsed())
                .containsExactly(
                        "drain saturation current IDSS: typical value taken as geometric mean of its min and max",
                        "transconductance gm: its current not stated, taken as IDSS",
                        "pinch-off voltage VGS(off): not stated, taken from IDSS and gm by the square law",
                        "gate leakage IG: its temperature not stated, taken as 25 °C",
                        "gate leakage IG: its doublingStep not stated, taken as 10 K",
                        "flicker voltage density: not stated, no flicker noise counted",
                        "induced gate noise: not stated, none counted",
                        "channel noise factor gamma: not stated, taken as 2/3",
                        "output conductance factor lambda: not stated, taken as 0 1/V",
                        "gate-source capacitance: not stated, taken as 0 pF",
                        "gate-drain capacitance: not stated, taken as 0 pF");
    }

    @Test
    void aFullJfetSheetNeedsNoDefault() {
        Map<DeviceParameter, Parameter> parameters = new HashMap<>();
        parameters.put(DeviceParameter.DRAIN_SATURATION_CURRENT, typicalAt(5e-3, Map.of()));
        parameters.put(DeviceParameter.PINCH_OFF_VOLTAGE, typicalAt(0.8, Map.of()));
        parameters.put(DeviceParameter.TRANSCONDUCTANCE, typicalAt(9e-3, Map.of(StatedAt.CURRENT, 3e-3)));
        parameters.put(DeviceParameter.CHANNEL_NOISE_FACTOR, typicalAt(0.9, Map.of()));
        parameters.put(DeviceParameter.OUTPUT_CONDUCTANCE_FACTOR, typicalAt(0.02, Map.of()));
        parameters.put(
                DeviceParameter.GATE_LEAKAGE,
                typicalAt(1e-12, Map.of(StatedAt.TEMPERATURE, 293.15, StatedAt.DOUBLING_STEP, 11.0)));
        parameters.put(DeviceParameter.GATE_SOURCE_CAPACITANCE, typicalAt(2e-11, Map.of()));
        parameters.put(DeviceParameter.GATE_DRAIN_CAPACITANCE, typicalAt(4e-12, Map.of()));
        parameters.put(
                DeviceParameter.FLICKER_DENSITY,
                typicalAt(3e-9, Map.of(StatedAt.FREQUENCY, 10.0, StatedAt.EXPONENT, 1.1)));
        parameters.put(DeviceParameter.INDUCED_GATE_NOISE, typicalAt(1.33, Map.of(StatedAt.CORRELATION, 0.4)));
        Device.Resolved<JfetModel> resolved = device(DeviceKind.JFET, Polarity.P_CHANNEL, Optional.empty(), parameters)
                .jfet();
        assertThat(resolved.defaultsUsed()).isEmpty();
        assertThat(resolved.model())
                .isEqualTo(new JfetModel(
                        new SquareLaw(5e-3, 0.8, some(9e-3), 3e-3),
                        0.9,
                        0.02,
                        new GateLeakage(1e-12, 293.15, 11.0),
                        2e-11,
                        4e-12,
                        Optional.of(new ChannelFlicker(3e-9, 10.0, 1.1)),
                        Optional.of(new InducedGateNoise(1.33, 0.4))));
    }

    @Test
    void anAmplifierResolvesWithItsDefaultsListed() {
        Device.Resolved<AmplifierModel> resolved = device(
                        DeviceKind.AMPLIFIER,
                        Polarity.NONE,
                        Optional.empty(),
                        Map.of(
                                DeviceParameter.VOLTAGE_NOISE, typicalAt(1e-9, Map.of()),
                                DeviceParameter.CURRENT_NOISE, typicalAt(2e-12, Map.of())))
                .amplifier();
        assertThat(resolved.model())
                .isEqualTo(new AmplifierModel(1e-9, 0.0, 2e-12, 0.0, Double.POSITIVE_INFINITY, 0.0));
        assertThat(resolved.defaultsUsed())
                .containsExactly(
                        "flicker corner of the voltage noise: not stated, taken as 0 Hz",
                        "flicker corner of the current noise: not stated, taken as 0 Hz",
                        "input resistance: not stated, taken as infinite",
                        "input capacitance: not stated, taken as 0 pF");
    }

    @Test
    void anIncompleteDeviceSaysWhatIsMissing() {
        Device noGain = device(
                DeviceKind.BIPOLAR,
                Polarity.NPN,
                Optional.empty(),
                Map.of(DeviceParameter.BASE_RESISTANCE, typicalAt(20.0, Map.of())));
        assertThatIllegalArgumentException()
                .isThrownBy(noGain::bipolar)
                .isInstanceOf(IncompleteDeviceException.class)
                .withMessage(
                        "device an-example states no currentGain, which the calculation needs; add it to its file");
        assertMissing(device(DeviceKind.BIPOLAR, Polarity.NPN, A_GAIN, Map.of())::bipolar, "baseResistance");
        Map<DeviceParameter, Parameter> jfet = new HashMap<>();
        assertMissing(
                device(DeviceKind.JFET, Polarity.N_CHANNEL, Optional.empty(), jfet)::jfet, "drainSaturationCurrent");
        jfet.put(DeviceParameter.DRAIN_SATURATION_CURRENT, typicalAt(5e-3, Map.of()));
        assertMissing(device(DeviceKind.JFET, Polarity.N_CHANNEL, Optional.empty(), jfet)::jfet, "pinchOffVoltage");
        jfet.put(DeviceParameter.PINCH_OFF_VOLTAGE, typicalAt(0.8, Map.of()));
        assertMissing(device(DeviceKind.JFET, Polarity.N_CHANNEL, Optional.empty(), jfet)::jfet, "gateLeakage");
        assertMissing(
                device(DeviceKind.AMPLIFIER, Polarity.NONE, Optional.empty(), Map.of())::amplifier, "voltageNoise");
    }

    private static void assertMissing(ThrowingCallable resolve, String key) {
        assertThatIllegalArgumentException()
                .isThrownBy(resolve)
                .isInstanceOf(IncompleteDeviceException.class)
                .withMessage(
                        "device an-example states no " + key + ", which the calculation needs; add it to its file");
    }

    @Test
    void aDeviceIsNoOtherKind() {
        Device bipolar = device(DeviceKind.BIPOLAR, Polarity.NPN, A_GAIN, Map.of());
        assertThatIllegalArgumentException()
                .isThrownBy(bipolar::jfet)
                .withMessage("an-example is a device of kind bipolar, not jfet");
        assertThatIllegalArgumentException()
                .isThrownBy(bipolar::amplifier)
                .withMessage("an-example is a device of kind bipolar, not amplifier");
    }

    @Test
    void ratingsAreKnownApartFromParameters() {
        Device device = device(
                DeviceKind.BIPOLAR,
                Polarity.NPN,
                A_GAIN,
                Map.of(
                        DeviceParameter.CURRENT,
                        new Parameter(NONE, NONE, some(0.1), Basis.INVENTED, "", "", Map.of()),
                        DeviceParameter.BASE_RESISTANCE,
                        Parameter.typical(20.0, Basis.MEMORY)));
        assertThat(device.ratedAmps()).hasValue(0.1);
        assertThat(device.resting(Basis.MEMORY)).isNotEmpty();
        // only the rating is invented, and no noise rests on a rating
        assertThat(device.resting(Basis.INVENTED)).isEmpty();
        assertThat(device.resting(Basis.MAKER)).isNotEmpty();
        assertThat(device.inOrder().keySet()).containsExactly(DeviceParameter.BASE_RESISTANCE, DeviceParameter.CURRENT);
        assertThat(device(DeviceKind.BIPOLAR, Polarity.NPN, A_GAIN, Map.of()).ratedAmps())
                .isEmpty();
        assertThat(List.of(DeviceParameter.values()).stream().filter(DeviceParameter::isRating))
                .containsExactly(
                        DeviceParameter.COLLECTOR_EMITTER_VOLTAGE,
                        DeviceParameter.GATE_VOLTAGE,
                        DeviceParameter.DRAIN_SOURCE_VOLTAGE,
                        DeviceParameter.CURRENT,
                        DeviceParameter.POWER);
    }

    @Test
    void everyParameterHasAKeyOfItsOwnAndAKindItFits() {
        assertThat(List.of(DeviceParameter.values()).stream().map(DeviceParameter::key))
                .doesNotHaveDuplicates();
        for (DeviceParameter parameter : DeviceParameter.values()) {
            assertThat(List.of(DeviceKind.values())).as(parameter.key()).anyMatch(parameter::fits);
        }
        assertThat(DeviceParameter.GATE_LEAKAGE.fits(DeviceKind.JFET)).isTrue();
        assertThat(DeviceParameter.GATE_LEAKAGE.fits(DeviceKind.BIPOLAR)).isFalse();
    }

    @Test
    void everyPolarityHasItsKind() {
        assertThat(Polarity.NPN.kind()).isEqualTo(DeviceKind.BIPOLAR);
        assertThat(Polarity.PNP.kind()).isEqualTo(DeviceKind.BIPOLAR);
        assertThat(Polarity.N_CHANNEL.kind()).isEqualTo(DeviceKind.JFET);
        assertThat(Polarity.P_CHANNEL.kind()).isEqualTo(DeviceKind.JFET);
        assertThat(Polarity.NONE.kind()).isEqualTo(DeviceKind.AMPLIFIER);
    }
}
