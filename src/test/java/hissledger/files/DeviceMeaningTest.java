package hissledger.files;

import static org.assertj.core.api.Assertions.assertThat;

import hissledger.device.Basis;
import hissledger.device.Device;
import hissledger.device.DeviceKind;
import hissledger.device.DeviceParameter;
import hissledger.device.GainPoint;
import hissledger.device.NoisePoint;
import hissledger.device.Parameter;
import hissledger.device.Polarity;
import hissledger.device.StatedAt;
import java.nio.file.Path;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class DeviceMeaningTest {
    private static Device device(String id) throws InputException {
        return DeviceReader.read(Texts.devices().resolve(id + ".json"));
    }

    private static Parameter of(Device device, DeviceParameter parameter) {
        return device.parameter(parameter).orElseThrow();
    }

    private static double typical(Device device, DeviceParameter parameter) {
        return of(device, parameter).typical().orElseThrow();
    }

    @Test
    void readsABipolarTransistor() throws Exception {
        Device device = device("trial-npn");
        assertThat(device.id()).isEqualTo("trial-npn");
        assertThat(device.kind()).isEqualTo(DeviceKind.BIPOLAR);
        assertThat(device.polarity()).isEqualTo(Polarity.NPN);
        assertThat(device.description()).isEqualTo("Invented NPN");
        assertThat(device.evidence()).isEqualTo("B");
        assertThat(device.note()).isEqualTo("invented");
        assertThat(device.currentGain().orElseThrow().points())
                .containsExactly(
                        new GainPoint(1e-4, OptionalDouble.of(30), OptionalDouble.empty(), OptionalDouble.empty()),
                        new GainPoint(1e-3, OptionalDouble.of(60), OptionalDouble.of(180), OptionalDouble.of(500)));
        assertThat(device.currentGain().orElseThrow().conditions()).isEqualTo("VCE = 5 V");
        assertThat(of(device, DeviceParameter.BASE_RESISTANCE))
                .isEqualTo(new Parameter(
                        OptionalDouble.of(20),
                        OptionalDouble.of(40),
                        OptionalDouble.of(60),
                        Basis.DERIVED,
                        "invented",
                        "",
                        Map.of()));
        assertThat(typical(device, DeviceParameter.EMITTER_RESISTANCE)).isEqualTo(0.22);
        assertThat(typical(device, DeviceParameter.EARLY_VOLTAGE)).isEqualTo(100.0);
        assertThat(of(device, DeviceParameter.TRANSITION_FREQUENCY).min()).isEqualTo(OptionalDouble.of(200e6));
        assertThat(of(device, DeviceParameter.COLLECTOR_BASE_CAPACITANCE).max()).isEqualTo(OptionalDouble.of(8.5e-12));
        assertThat(of(device, DeviceParameter.EMITTER_BASE_CAPACITANCE).max()).isEqualTo(OptionalDouble.of(30e-12));
        assertThat(typical(device, DeviceParameter.BASE_FLICKER_CORNER)).isEqualTo(1000.0);
        assertThat(of(device, DeviceParameter.BASE_FLICKER_CORNER).at())
                .isEqualTo(Map.of(StatedAt.CURRENT, 2e-3, StatedAt.EXPONENT, 1.2));
        assertThat(device.ratedAmps()).isEqualTo(OptionalDouble.of(0.6));
        assertThat(device.noisePoints())
                .containsExactly(
                        new NoisePoint(
                                NoisePoint.Quantity.NOISE_FIGURE,
                                OptionalDouble.of(1e-4),
                                1000.0,
                                OptionalDouble.of(10_000),
                                OptionalDouble.empty(),
                                OptionalDouble.of(3.0),
                                Basis.INVENTED,
                                "",
                                ""),
                        new NoisePoint(
                                NoisePoint.Quantity.VOLTAGE_NOISE,
                                OptionalDouble.empty(),
                                1000.0,
                                OptionalDouble.empty(),
                                OptionalDouble.of(1e-9),
                                OptionalDouble.empty(),
                                Basis.INVENTED,
                                "",
                                ""));
        assertThat(device.bipolar().model()).isNotNull();
    }

    @Test
    void readsAJfet() throws Exception {
        Device device = device("trial-njf");
        assertThat(device.polarity()).isEqualTo(Polarity.N_CHANNEL);
        assertThat(device.evidence()).isEmpty();
        assertThat(device.currentGain()).isEmpty();
        assertThat(typical(device, DeviceParameter.DRAIN_SATURATION_CURRENT)).isEqualTo(10e-3);
        assertThat(typical(device, DeviceParameter.PINCH_OFF_VOLTAGE)).isEqualTo(0.8);
        assertThat(typical(device, DeviceParameter.TRANSCONDUCTANCE)).isEqualTo(14e-3);
        assertThat(of(device, DeviceParameter.TRANSCONDUCTANCE).at()).isEqualTo(Map.of(StatedAt.CURRENT, 5e-3));
        assertThat(typical(device, DeviceParameter.CHANNEL_NOISE_FACTOR)).isEqualTo(0.8);
        assertThat(typical(device, DeviceParameter.OUTPUT_CONDUCTANCE_FACTOR)).isEqualTo(0.01);
        assertThat(of(device, DeviceParameter.GATE_LEAKAGE).at())
                .isEqualTo(Map.of(StatedAt.TEMPERATURE, 298.15, StatedAt.DOUBLING_STEP, 10.0));
        assertThat(of(device, DeviceParameter.FLICKER_DENSITY).at())
                .isEqualTo(Map.of(StatedAt.FREQUENCY, 100.0, StatedAt.EXPONENT, 1.0));
        assertThat(typical(device, DeviceParameter.INDUCED_GATE_NOISE)).isEqualTo(1.33);
        assertThat(of(device, DeviceParameter.INDUCED_GATE_NOISE).at()).isEqualTo(Map.of(StatedAt.CORRELATION, 0.395));
        assertThat(device.jfet().model()).isNotNull();
    }

    @Test
    void readsAnAmplifierWhichHasNoPolarity() throws Exception {
        Device device = device("trial-amplifier");
        assertThat(device.polarity()).isEqualTo(Polarity.NONE);
        assertThat(typical(device, DeviceParameter.VOLTAGE_NOISE)).isEqualTo(1e-9);
        assertThat(typical(device, DeviceParameter.CURRENT_NOISE)).isEqualTo(1.5e-12);
        assertThat(typical(device, DeviceParameter.INPUT_RESISTANCE)).isEqualTo(1e5);
        assertThat(device.amplifier().model()).isNotNull();
    }

    static java.util.stream.Stream<Path> shippedFiles() throws InputException {
        return Catalogue.list(Path.of("device-params")).stream();
    }

    /** Each is read and, what is more, can be computed with. */
    @ParameterizedTest
    @MethodSource("shippedFiles")
    void readsEveryShippedFile(Path file) throws Exception {
        Device device = DeviceReader.read(file);
        assertThat(file.getFileName()).hasToString(device.id() + ".json");
        Object model = switch (device.kind()) {
            case BIPOLAR -> device.bipolar().model();
            case JFET -> device.jfet().model();
            case AMPLIFIER -> device.amplifier().model();
        };
        assertThat(Optional.of(model)).isPresent();
    }
}
