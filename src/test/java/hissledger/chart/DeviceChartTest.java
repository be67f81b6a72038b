package hissledger.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import hissledger.device.Device;
import hissledger.files.Catalogue;
import hissledger.files.InputException;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.util.List;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;

class DeviceChartTest {
    private static Device device(String id) throws InputException {
        return Catalogue.load(List.of()).find(id).orElseThrow();
    }

    @Test
    void noiseAgainstCurrentShowsTwoFrequenciesOnlyWhereTheyDiffer() throws InputException {
        Plate flat = DeviceChart.noisePlate(device("ztx951"));
        assertThat(flat.traces()).extracting(Trace::name).containsExactly("en, no flicker stated", "published");
        Plate flicker = DeviceChart.noisePlate(device("lsk389"));
        assertThat(flicker.traces()).extracting(Trace::name).containsExactly("en at 1 kHz", "en at 10 Hz", "published");
        assertThat(flicker.across().title()).isEqualTo("collector or drain current, A");
        assertThat(flicker.up().title()).isEqualTo("noise voltage density, nV/√Hz");
    }

    @Test
    void theCheckShowsEveryComparablePoint() throws InputException {
        Plate plate = DeviceChart.checkPlate(Catalogue.load(List.of()).all());
        assertThat(plate.traces()).extracting(Trace::name).contains("model", "agrees", "contradicts");
        for (Trace trace : plate.traces()) {
            assertThat(trace.y())
                    .allMatch(level ->
                            level >= plate.up().from() && level <= plate.up().to());
            assertThat(trace.x())
                    .allMatch(amps -> amps >= plate.across().from()
                            && amps <= plate.across().to());
        }
    }

    @Test
    void aDeviceWithoutPublishedNoiseHasNoCheckToDraw() throws InputException {
        List<Device> invented = List.of(device("demo-npn"));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> DeviceChart.check(invented))
                .withMessage("no device has a published noise point that can be compared");
    }

    @Test
    void picturesDecode() throws InputException, IOException {
        byte[] png = DeviceChart.noise(device("2n4403")).png(1600, 1000);
        assertThat(ImageIO.read(new ByteArrayInputStream(png)).getWidth()).isEqualTo(1600);
    }
}
