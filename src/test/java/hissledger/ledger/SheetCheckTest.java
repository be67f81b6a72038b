package hissledger.ledger;

import static org.assertj.core.api.Assertions.assertThat;

import hissledger.device.Device;
import hissledger.device.NoisePoint;
import hissledger.files.Catalogue;
import hissledger.files.InputException;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.aggregator.ArgumentsAccessor;
import org.junit.jupiter.params.provider.CsvFileSource;

/** Published noise of shipped devices: met, within its limit, or contradicting with the reason. */
class SheetCheckTest {
    /** Currents and values in the table and in the device files are the same numbers written twice. */
    private static final double SAME = 1e-6;

    private static final int SHIPPED = 56;

    @ParameterizedTest
    @CsvFileSource(resources = "published-noise-points.csv", useHeadersInDisplayName = true)
    void everyPublishedPointHasItsVerdict(ArgumentsAccessor row) throws InputException {
        String id = row.getString(1);
        String verdict = row.getString(8);
        if (id == null) {
            assertThat(row.getString(9)).as("a row without a device says why").isNotBlank();
            return;
        }
        Device device = Catalogue.load(List.of()).find(id).orElseThrow();
        SheetCheck found = SheetCheck.of(device).stream()
                .filter(check -> isRow(check.point(), row))
                .findFirst()
                .orElseThrow(() -> new AssertionError("no such noise point in " + id));
        assertThat(found.verdict().name()).isEqualTo(verdict);
        if (found.verdict() == SheetCheck.Verdict.CONTRADICTS) {
            assertThat(row.getString(9)).as("a contradiction says why").isNotBlank();
            assertThat(found.reason()).isNotEmpty();
        }
    }

    private static boolean isRow(NoisePoint point, ArgumentsAccessor row) {
        return point.quantity().name().equals(row.getString(2))
                && (row.getString(3) == null || same(point.currentAmps(), row.getDouble(3)))
                && (row.getString(4) == null || same(point.sourceOhms(), row.getDouble(4)))
                && Math.abs(point.hertz() / row.getDouble(5) - 1.0) < SAME
                && (row.getString(6) == null || same(point.typical(), row.getDouble(6)));
    }

    private static boolean same(OptionalDouble stated, double wanted) {
        return stated.isPresent() && Math.abs(stated.getAsDouble() / wanted - 1.0) < SAME;
    }

    /** The catalogue as it was asked for: at least 18 bipolar transistors and 14 JFETs, both polarities, and amplifiers. */
    @Test
    void theCatalogueIsLargeEnough() throws InputException {
        List<Device> all = Catalogue.load(List.of()).all();
        List<Device> real =
                all.stream().filter(device -> !device.id().startsWith("demo-")).toList();
        assertThat(real.size()).isGreaterThanOrEqualTo(SHIPPED);
        assertThat(real.stream().filter(device -> device.kind().label().equals("bipolar")))
                .hasSizeGreaterThanOrEqualTo(18);
        assertThat(real.stream().filter(device -> device.kind().label().equals("jfet")))
                .hasSizeGreaterThanOrEqualTo(14);
        for (String polarity : List.of("npn", "pnp", "n-channel", "p-channel")) {
            assertThat(real).anyMatch(device -> device.polarity().label().equals(polarity));
        }
        assertThat(all.stream().filter(device -> device.kind().label().equals("amplifier")))
                .hasSizeGreaterThanOrEqualTo(2);
    }

    @Test
    void curvesRiseAndFallAsTheLawsSay() throws InputException {
        Device bipolar = Catalogue.load(List.of()).find("ztx951").orElseThrow();
        List<DeviceCurves.Point> points = DeviceCurves.of(bipolar, 1000.0).points();
        for (int k = 1; k < points.size(); k++) {
            assertThat(points.get(k).noise().ampsPerRootHertz())
                    .isGreaterThan(points.get(k - 1).noise().ampsPerRootHertz());
        }
        assertThat(DeviceCurves.at(bipolar, 1e3, 1000.0)).isEmpty();
        Device jfet = Catalogue.load(List.of()).find("bf862").orElseThrow();
        List<DeviceCurves.Point> slopes = DeviceCurves.of(jfet, 1000.0).points();
        for (int k = 1; k < slopes.size(); k++) {
            assertThat(slopes.get(k).gain()).isGreaterThan(slopes.get(k - 1).gain());
            assertThat(slopes.get(k).noise().voltsPerRootHertz())
                    .isLessThan(slopes.get(k - 1).noise().voltsPerRootHertz());
        }
    }
}
