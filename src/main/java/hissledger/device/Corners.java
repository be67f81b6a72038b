package hissledger.device;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The models at the corners of what a sheet allows: each value that sets the noise at its least, typical and greatest. A
 * published figure that lies outside what all of them give contradicts the sheet or the model.
 */
public final class Corners {
    private Corners() {}

    /** Bipolar transistors with every combination of least, typical and greatest current gain and rbb'. */
    public static List<BipolarModel> bipolar(Device device) {
        BipolarModel typical = device.bipolar().model();
        GainSheet gain = device.currentGain().orElseThrow();
        List<BipolarModel> corners = new ArrayList<>();
        for (GainCurve curve : List.of(typical.currentGain(), gain.least(), gain.greatest())) {
            for (double ohms : bounds(device, DeviceParameter.BASE_RESISTANCE, typical.baseResistanceOhms())) {
                corners.add(typical.withCurrentGain(curve).withBaseResistance(ohms));
            }
        }
        return corners;
    }

    /** JFETs with every combination of least, typical and greatest transconductance, channel noise factor and leakage. */
    public static List<JfetModel> jfet(Device device) {
        JfetModel typical = device.jfet().model();
        SquareLaw law = typical.law();
        double[] slopes = law.measuredSiemens().isPresent()
                ? bounds(
                        device,
                        DeviceParameter.TRANSCONDUCTANCE,
                        law.measuredSiemens().getAsDouble())
                : new double[] {Double.NaN};
        List<JfetModel> corners = new ArrayList<>();
        for (double slope : slopes) {
            SquareLaw moved = Double.isNaN(slope)
                    ? law
                    : new SquareLaw(
                            law.saturationAmps(), law.pinchOffVolts(), OptionalDouble.of(slope), law.measuredAtAmps());
            for (double gamma : bounds(device, DeviceParameter.CHANNEL_NOISE_FACTOR, typical.channelNoiseFactor())) {
                for (double amps : bounds(
                        device, DeviceParameter.GATE_LEAKAGE, typical.leakage().amps())) {
                    corners.add(new JfetModel(
                            moved,
                            gamma,
                            typical.outputConductanceFactor(),
                            new GateLeakage(
                                    amps,
                                    typical.leakage().temperatureKelvin(),
                                    typical.leakage().doublingKelvin()),
                            typical.gateSourceFarads(),
                            typical.gateDrainFarads(),
                            typical.flicker(),
                            typical.induced()));
                }
            }
        }
        return corners;
    }

    private static double[] bounds(Device device, DeviceParameter key, double typical) {
        Optional<Parameter> parameter = device.parameter(key);
        return parameter.isPresent()
                ? new double[] {
                    typical, parameter.get().least(), parameter.get().greatest()
                }
                : new double[] {typical};
    }
}
