package hissledger.circuit;

import hissledger.device.AmplifierModel;
import hissledger.device.BiasedBipolar;
import hissledger.device.BiasedJfet;
import hissledger.device.BipolarModel;
import hissledger.device.JfetModel;
import hissledger.device.Transistor;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.complex.Complex;

/**
 * Draws a front end part by part for the {@link NodalSolver}: every resistor with its own noise, every device of a
 * parallel group by itself, both conductors of a balanced path. Nothing is combined that is not combined on the bench.
 *
 * <p>The laws are written out here a second time, from the component values alone.
 */
final class DrawnFrontEnd {
    /** SI Brochure, 9th edition, exact. */
    private static final double K = 1.380649e-23;
    /** SI Brochure, 9th edition, exact. */
    private static final double Q = 1.602176634e-19;

    private final NodalSolver circuit = new NodalSolver();
    private final int emf;
    private int output;
    private int outputMinus = NodalSolver.GROUND;

    private DrawnFrontEnd(FrontEnd frontEnd) {
        Wires wires = new Wires(circuit.node(), circuit.node());
        emf = source(frontEnd.source(), wires);
        for (PathElement element : frontEnd.path()) {
            wires = pathElement(element, wires);
        }
        stage(frontEnd.stage(), wires);
    }

    /** The two conductors of the path as drawn so far. */
    private record Wires(int upper, int lower) {}

    static DrawnFrontEnd of(FrontEnd frontEnd) {
        return new DrawnFrontEnd(frontEnd);
    }

    NodalSolver.Answer solve(double hertz) {
        return circuit.solve(hertz, emf, output, outputMinus);
    }

    // ---------------------------------------------------------------------------------------------------- source

    /** The EMF in the lower end of the source's network; returns its branch. */
    private int source(Source source, Wires terminals) {
        String name = FrontEnd.SOURCE_NOISE.name();
        double kelvin = source.temperatureKelvin();
        int emfNode = circuit.node();
        int branch = circuit.branch(emfNode, terminals.lower());
        if (source instanceof ResistorSource resistor) {
            resistor(name, terminals.upper(), emfNode, resistor.resistanceOhms(), kelvin);
        } else if (source instanceof CoilSource coil) {
            double r = coil.resistanceOhms();
            double l = coil.inductanceHenries();
            int winding = circuit.branch(terminals.upper(), emfNode, omega -> new Complex(r, omega * l));
            circuit.noiseVoltage(name, winding, white(4.0 * K * kelvin * r));
            if (Double.isFinite(coil.parallelOhms())) {
                resistor(name, terminals.upper(), emfNode, coil.parallelOhms(), kelvin);
            }
            circuit.capacitance(terminals.upper(), emfNode, coil.parallelFarads());
        } else if (source instanceof CapacitorSource capacitor) {
            capacitor(
                    name,
                    terminals.upper(),
                    emfNode,
                    new Passive.Capacitor(capacitor.capacitanceFarads(), capacitor.lossTangent(), 0.0),
                    kelvin);
            if (Double.isFinite(capacitor.parallelOhms())) {
                resistor(name, terminals.upper(), emfNode, capacitor.parallelOhms(), kelvin);
            }
        } else {
            throw new IllegalArgumentException("no drawing for " + source);
        }
        return branch;
    }

    // ------------------------------------------------------------------------------------------------------ path

    private Wires pathElement(PathElement element, Wires wires) {
        if (element instanceof SeriesElement series) {
            int upper = circuit.node();
            part(series.name(), wires.upper(), upper, series.part(), series.temperatureKelvin());
            if (series.legs() == 1) {
                return new Wires(upper, wires.lower());
            }
            int lower = circuit.node();
            part(series.name(), wires.lower(), lower, series.part(), series.temperatureKelvin());
            return new Wires(upper, lower);
        }
        if (element instanceof ShuntElement shunt) {
            if (shunt.legs() == 1) {
                int branch = part(shunt.name(), wires.upper(), wires.lower(), shunt.part(), shunt.temperatureKelvin());
                shunt.supply()
                        .ifPresent(supply -> circuit.noiseVoltage(
                                shunt.name() + ", supply",
                                branch,
                                white(supply.voltsPerRootHertz() * supply.voltsPerRootHertz())));
            } else {
                int middle = circuit.node();
                part(shunt.name(), wires.upper(), middle, shunt.part(), shunt.temperatureKelvin());
                part(shunt.name(), middle, wires.lower(), shunt.part(), shunt.temperatureKelvin());
            }
            return wires;
        }
        if (element instanceof Transformer transformer) {
            return transformer(transformer, wires);
        }
        if (element instanceof Pad pad) {
            double kelvin = pad.temperatureKelvin();
            int upper = circuit.node();
            int lower = pad.legs() == 1 ? wires.lower() : circuit.node();
            resistor(pad.name() + ", series arm", wires.upper(), upper, pad.seriesOhms(), kelvin);
            if (pad.legs() > 1) {
                resistor(pad.name() + ", series arm", wires.lower(), lower, pad.seriesOhms(), kelvin);
            }
            resistor(pad.name() + ", shunt arm", upper, lower, pad.shuntOhms(), kelvin);
            return new Wires(upper, lower);
        }
        throw new IllegalArgumentException("no drawing for " + element);
    }

    /** The secondary floats on its own two wires; the primary's lower wire is then the ground of its side. */
    private Wires transformer(Transformer transformer, Wires wires) {
        String name = transformer.name();
        double kelvin = transformer.temperatureKelvin();
        circuit.branch(wires.lower(), NodalSolver.GROUND);
        int primary = circuit.node();
        resistor(name + ", primary resistance", wires.upper(), primary, transformer.primaryOhms(), kelvin);
        if (Double.isFinite(transformer.primaryHenries())) {
            double l = transformer.primaryHenries();
            circuit.branch(primary, wires.lower(), omega -> new Complex(0.0, omega * l));
        }
        if (Double.isFinite(transformer.coreLossOhms())) {
            resistor(name + ", core loss", primary, wires.lower(), transformer.coreLossOhms(), kelvin);
        }
        int secondary = circuit.node();
        int lower = circuit.node();
        circuit.transformer(primary, wires.lower(), secondary, lower, transformer.ratio());
        int upper = circuit.node();
        double leakage = transformer.leakageHenries();
        double ohms = transformer.secondaryOhms();
        int winding = circuit.branch(secondary, upper, omega -> new Complex(ohms, omega * leakage));
        circuit.noiseVoltage(name + ", secondary resistance", winding, white(4.0 * K * kelvin * ohms));
        circuit.capacitance(upper, lower, transformer.windingFarads());
        return new Wires(upper, lower);
    }

    private int part(String name, int a, int b, Passive part, double kelvin) {
        if (part instanceof Passive.Resistor resistor) {
            int branch = resistor(name, a, b, resistor.ohms(), kelvin);
            excess(name + ", excess", branch, resistor);
            return branch;
        } else if (part instanceof Passive.Capacitor capacitor) {
            return capacitor(name, a, b, capacitor, kelvin);
        } else if (part instanceof Passive.Inductor inductor) {
            double l = inductor.henries();
            return circuit.branch(a, b, omega -> new Complex(0.0, omega * l));
        } else {
            throw new IllegalArgumentException("no drawing for " + part);
        }
    }

    private int resistor(String name, int a, int b, double ohms, double kelvin) {
        int branch = circuit.branch(a, b, omega -> new Complex(ohms));
        circuit.noiseVoltage(name, branch, white(4.0 * K * kelvin * ohms));
        return branch;
    }

    private void excess(String name, int branch, Passive.Resistor resistor) {
        double perDecade = resistor.noiseIndex() * resistor.directVolts();
        circuit.noiseVoltage(name, branch, omega -> perDecade * perDecade / (Math.log(10.0) * omega / (2.0 * Math.PI)));
    }

    /** Its losses are a resistance tan δ/(ωC) that varies with frequency, and the ESR. */
    private int capacitor(String name, int a, int b, Passive.Capacitor capacitor, double kelvin) {
        DoubleUnaryOperator loss =
                omega -> capacitor.lossTangent() / (omega * capacitor.farads()) + capacitor.seriesOhms();
        int branch = circuit.branch(
                a, b, omega -> new Complex(loss.applyAsDouble(omega), -1.0 / (omega * capacitor.farads())));
        circuit.noiseVoltage(name, branch, omega -> 4.0 * K * kelvin * loss.applyAsDouble(omega));
        return branch;
    }

    // ----------------------------------------------------------------------------------------------------- stage

    private void stage(Stage stage, Wires wires) {
        if (stage instanceof BalancedPair pair) {
            balancedPair(pair, wires);
            return;
        }
        // the stage's input stands against its ground, which is the far end of the lower wire
        circuit.branch(wires.lower(), NodalSolver.GROUND);
        int input = wires.upper();
        if (stage instanceof SingleStage single) {
            int lead = commonLead(single.around().commonLead(), single.device().temperatureKelvin());
            int collector = collector(single.around(), single.device().temperatureKelvin());
            devices(
                    single.device(),
                    single.inParallel(),
                    input,
                    collector,
                    lead,
                    single.around().cascode());
            nextStage(single.around(), collector, NodalSolver.GROUND);
        } else if (stage instanceof FollowerStage follower) {
            int emitters = collector(follower.around(), follower.device().temperatureKelvin());
            devices(follower.device(), follower.inParallel(), input, NodalSolver.GROUND, emitters, false);
            nextStage(follower.around(), emitters, NodalSolver.GROUND);
        } else if (stage instanceof SingleEndedPair pair) {
            int other = circuit.node();
            resistor(
                    "other side",
                    other,
                    NodalSolver.GROUND,
                    pair.otherOhms(),
                    pair.device().temperatureKelvin());
            halves(pair.device(), pair.inParallel(), pair.around(), input, other, 0.0, Double.POSITIVE_INFINITY);
        } else if (stage instanceof AmplifierStage amplifier) {
            amplifier(amplifier.model(), input);
        } else {
            throw new IllegalArgumentException("no drawing for " + stage);
        }
    }

    /**
     * Both halves in full. The source floats between the two inputs: what the pair draws from one wire it returns to the
     * other, and nothing defines the voltage that both share. It is held at ground, midway, which by the symmetry of the
     * halves changes nothing between the inputs.
     */
    private void balancedPair(BalancedPair pair, Wires wires) {
        circuit.transformer(wires.upper(), NodalSolver.GROUND, NodalSolver.GROUND, wires.lower(), 1.0);
        halves(
                pair.device(),
                pair.inParallel(),
                pair.around(),
                wires.upper(),
                wires.lower(),
                pair.gainOhms(),
                pair.feedbackOhms());
    }

    /** Two halves on an ideal tail, and one next stage across both outputs. */
    private void halves(
            Transistor device,
            int inParallel,
            Surroundings around,
            int input,
            int other,
            double gainOhms,
            double feedbackOhms) {
        double kelvin = device.temperatureKelvin();
        int foot = circuit.node();
        int otherFoot = gainOhms > 0.0 ? circuit.node() : foot;
        if (gainOhms > 0.0) {
            resistor("gain resistor", foot, otherFoot, gainOhms, kelvin);
        }
        int[] feet = {foot, otherFoot};
        int[] inputs = {input, other};
        int[] collectors = new int[2];
        for (int half = 0; half < 2; half++) {
            if (gainOhms > 0.0 && Double.isFinite(feedbackOhms)) {
                // the amplifier's output is a low impedance, and the loop is open
                resistor("feedback resistor", feet[half], NodalSolver.GROUND, feedbackOhms, kelvin);
            }
            int lead = circuit.node();
            resistor("common lead", lead, feet[half], around.commonLead().unbypassedOhms(), kelvin);
            collectors[half] = collector(around, kelvin);
            devices(device, inParallel, inputs[half], collectors[half], lead, around.cascode());
        }
        nextStage(around, collectors[0], collectors[1]);
    }

    private void devices(Transistor device, int inParallel, int input, int collector, int lead, boolean cascode) {
        for (int d = 0; d < inParallel; d++) {
            device(device, input, collector, lead, cascode);
        }
    }

    /** The stage's output node with the load from there to ground. */
    private int collector(Surroundings around, double kelvin) {
        int node = circuit.node();
        around.load().ifPresent(load -> {
            int branch = resistor("load", node, NodalSolver.GROUND, load.ohms(), kelvin);
            excess("load excess", branch, load);
        });
        return node;
    }

    /** The next stage's two generators; the output is behind them. */
    private void nextStage(Surroundings around, int plus, int minus) {
        output = plus;
        outputMinus = minus;
        around.nextStage().ifPresent(next -> {
            output = circuit.node();
            int branch = circuit.branch(plus, output);
            circuit.noiseVoltage(
                    "next stage voltage", branch, corner(next.voltsPerRootHertz(), next.voltageCornerHertz()));
            circuit.noiseCurrent(
                    "next stage current", output, minus, corner(next.ampsPerRootHertz(), next.currentCornerHertz()));
        });
    }

    private void amplifier(AmplifierModel model, int input) {
        output = circuit.node();
        int branch = circuit.branch(input, output);
        circuit.noiseVoltage(
                "amplifier voltage", branch, corner(model.voltsPerRootHertz(), model.voltageCornerHertz()));
        circuit.noiseCurrent(
                "amplifier current",
                output,
                NodalSolver.GROUND,
                corner(model.ampsPerRootHertz(), model.currentCornerHertz()));
        circuit.conductance(output, NodalSolver.GROUND, 1.0 / model.inputOhms());
        circuit.capacitance(output, NodalSolver.GROUND, model.inputFarads());
    }

    /** Resistor, bypass and unbypassed part; returns the node at which the devices' emitters or sources meet. */
    private int commonLead(CommonLead lead, double kelvin) {
        if (lead.unbypassedOhms() == 0.0 && lead.resistorOhms() == 0.0) {
            return NodalSolver.GROUND;
        }
        String name = "common lead";
        int top = circuit.node();
        int foot = NodalSolver.GROUND;
        if (lead.resistorOhms() > 0.0) {
            foot = circuit.node();
            resistor(name, foot, NodalSolver.GROUND, lead.resistorOhms(), kelvin);
            if (lead.bypassFarads() > 0.0) {
                capacitor(
                        name,
                        foot,
                        NodalSolver.GROUND,
                        new Passive.Capacitor(lead.bypassFarads(), 0.0, lead.bypassSeriesOhms()),
                        kelvin);
            }
        }
        resistor(name, top, foot, lead.unbypassedOhms(), kelvin);
        return top;
    }

    private void device(Transistor device, int input, int collector, int lead, boolean cascode) {
        if (device instanceof BiasedBipolar bipolar) {
            bipolar(bipolar, input, collector, lead, cascode);
        } else if (device instanceof BiasedJfet jfet) {
            jfet(jfet, input, collector, lead, cascode);
        } else {
            throw new IllegalArgumentException("no drawing for " + device);
        }
    }

    private void bipolar(BiasedBipolar device, int baseLead, int collectorLead, int emitterLead, boolean cascode) {
        BipolarModel model = device.model();
        double kelvin = device.temperatureKelvin();
        double collectorAmps = device.currentAmps();
        double baseAmps = collectorAmps / model.currentGain().at(collectorAmps);
        double gm = collectorAmps * Q / (K * kelvin);
        double cmu = model.collectorBaseFarads();
        double cpi = Math.max(gm / (2.0 * Math.PI * model.transitionHertz()) - cmu, model.emitterBaseFarads());

        int base = circuit.node();
        resistor("base resistance", baseLead, base, model.baseResistanceOhms(), kelvin);
        int emitter = circuit.node();
        resistor("emitter resistance", emitter, emitterLead, model.emitterResistanceOhms(), kelvin);
        int collector = outputTerminal(collectorLead, cascode);
        circuit.conductance(base, emitter, baseAmps * Q / (K * kelvin));
        circuit.capacitance(base, emitter, cpi);
        intrinsic(base, collector, emitter, gm, collectorAmps / model.earlyVolts(), cmu, cascode);

        circuit.noiseCurrent("base shot", base, emitter, white(2.0 * Q * baseAmps));
        circuit.noiseCurrent("collector shot", collector, emitter, white(2.0 * Q * collectorAmps));
        model.flicker().ifPresent(flicker -> {
            double reference =
                    flicker.collectorCurrentAmps() / model.currentGain().at(flicker.collectorCurrentAmps());
            double atOneRadian = 2.0
                    * Q
                    * reference
                    * Math.pow(baseAmps / reference, flicker.exponent())
                    * flicker.cornerHertz()
                    * 2.0
                    * Math.PI;
            circuit.noiseCurrent("base flicker", base, emitter, omega -> atOneRadian / omega);
        });
    }

    private void jfet(BiasedJfet device, int gate, int drainLead, int sourceLead, boolean cascode) {
        JfetModel model = device.model();
        double kelvin = device.temperatureKelvin();
        double drainAmps = device.currentAmps();
        double square = model.law().measuredSiemens().isPresent()
                ? model.law().measuredSiemens().getAsDouble()
                        * Math.sqrt(drainAmps / model.law().measuredAtAmps())
                : 2.0
                        * Math.sqrt(model.law().saturationAmps() * drainAmps)
                        / model.law().pinchOffVolts();
        double gm = Math.min(square, drainAmps * Q / (K * kelvin));
        double gamma = model.channelNoiseFactor();
        double cgs = model.gateSourceFarads();

        int drain = outputTerminal(drainLead, cascode);
        circuit.capacitance(gate, sourceLead, cgs);
        intrinsic(
                gate,
                drain,
                sourceLead,
                gm,
                model.outputConductanceFactor() * drainAmps,
                model.gateDrainFarads(),
                cascode);

        DoubleUnaryOperator channel = white(4.0 * K * kelvin * gamma * gm);
        if (model.induced().isPresent()) {
            double delta = model.induced().get().delta();
            double c = model.induced().get().correlation();
            DoubleUnaryOperator whole = omega -> 4.0 * K * kelvin * delta * omega * omega * cgs * cgs / gm;
            // the correlated part is j c √(Sg/Sd) times the channel's current
            circuit.noiseCurrents(
                    "channel",
                    drain,
                    sourceLead,
                    channel,
                    gate,
                    sourceLead,
                    omega ->
                            new Complex(0.0, c * Math.sqrt(whole.applyAsDouble(omega) / channel.applyAsDouble(omega))));
            circuit.noiseCurrent("induced gate", gate, sourceLead, omega -> (1.0 - c * c) * whole.applyAsDouble(omega));
        } else {
            circuit.noiseCurrent("channel", drain, sourceLead, channel);
        }
        model.flicker().ifPresent(flicker -> {
            double volts = flicker.voltsPerRootHertz();
            circuit.noiseCurrent(
                    "channel flicker",
                    drain,
                    sourceLead,
                    omega -> gm
                            * gm
                            * volts
                            * volts
                            * Math.pow(2.0 * Math.PI * flicker.hertz() / omega, flicker.exponent()));
        });
        double leakage = model.leakage().amps()
                * Math.pow(
                        2.0,
                        (kelvin - model.leakage().temperatureKelvin())
                                / model.leakage().doublingKelvin());
        circuit.noiseCurrent("gate leakage", gate, sourceLead, white(2.0 * Q * leakage));
    }

    /** Under a cascode the device's output terminal is held and its current copied into the load. */
    private int outputTerminal(int lead, boolean cascode) {
        if (!cascode) {
            return lead;
        }
        int held = circuit.node();
        int current = circuit.branch(NodalSolver.GROUND, held);
        circuit.currentCopy(lead, NodalSolver.GROUND, current);
        return held;
    }

    /** What bipolar transistors and JFETs share between input, output and common terminal. */
    private void intrinsic(
            int in, int out, int common, double gm, double outputSiemens, double feedback, boolean cascode) {
        circuit.transconductance(out, common, in, common, gm);
        if (cascode) {
            // the feedback capacitance ends at the cascode's fixed potential; the output conductance sees no signal
            circuit.capacitance(in, NodalSolver.GROUND, feedback);
        } else {
            circuit.capacitance(in, out, feedback);
            circuit.conductance(out, common, outputSiemens);
        }
    }

    private static DoubleUnaryOperator white(double density) {
        return omega -> density;
    }

    private static DoubleUnaryOperator corner(double amplitude, double cornerHertz) {
        return omega -> amplitude * amplitude * (1.0 + 2.0 * Math.PI * cornerHertz / omega);
    }
}
