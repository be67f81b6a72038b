package hissledger.bench;

import hissledger.circuit.CommonLead;
import hissledger.circuit.FrontEnd;
import hissledger.circuit.NextStage;
import hissledger.circuit.Passive;
import hissledger.circuit.ResistorSource;
import hissledger.circuit.SeriesElement;
import hissledger.circuit.ShuntElement;
import hissledger.circuit.Signal;
import hissledger.circuit.SingleStage;
import hissledger.circuit.Surroundings;
import hissledger.device.BaseFlicker;
import hissledger.device.BiasedBipolar;
import hissledger.device.BipolarModel;
import hissledger.device.GainCurve;
import java.util.List;
import java.util.Optional;

/** The front end that speed is stated for: a common-emitter stage with eleven generators that make noise. */
final class FirstTrial {
    private static final double KELVIN = 300.0;

    private FirstTrial() {}

    /** The front end with a given rbb', Ω, so that each build differs from the last. */
    static FrontEnd frontEnd(double baseOhms) {
        BipolarModel model = new BipolarModel(
                GainCurve.flat(300.0),
                baseOhms,
                0.3,
                80.0,
                200e6,
                8e-12,
                20e-12,
                Optional.of(new BaseFlicker(200.0, 1e-3, 1.0)));
        Surroundings around = new Surroundings(
                new CommonLead(0.0, 220.0, 1e-3, 0.05),
                Optional.of(Passive.Resistor.of(2700.0)),
                Optional.of(new NextStage(5e-9, 10.0, 0.5e-12, 100.0)),
                false);
        return new FrontEnd(
                new ResistorSource(200.0, KELVIN, Signal.none()),
                List.of(
                        new SeriesElement("coupling", Passive.Capacitor.of(47e-6), 1, KELVIN),
                        new ShuntElement("bias", Passive.Resistor.of(10e3), 1, KELVIN)),
                new SingleStage(new BiasedBipolar(model, 2e-3, KELVIN), 1, around));
    }
}
