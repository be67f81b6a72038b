package hissledger.choose;

import hissledger.circuit.CommonLead;
import hissledger.circuit.NextStage;
import hissledger.circuit.PairParts;
import hissledger.circuit.Passive;
import hissledger.circuit.PathElement;
import hissledger.circuit.SeriesElement;
import hissledger.circuit.ShuntElement;
import hissledger.circuit.StagePlan;
import hissledger.circuit.Surroundings;
import hissledger.circuit.Transformer;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleFunction;

/** The parts around the device of a design, each with its value and a way to change it. */
final class Parts {
    /**
     * A part.
     *
     * @param name its name
     * @param value its value, SI
     * @param change the design with another value of it
     */
    record Part(String name, double value, DoubleFunction<Design> change) {
        /** The design with another value of this part. */
        Design with(double other) {
            return change.apply(other);
        }
    }

    private Parts() {}

    /** All parts of a design whose value is not zero. */
    static List<Part> of(Design design) {
        List<Part> parts = new ArrayList<>();
        for (int k = 0; k < design.path().size(); k++) {
            addElement(parts, design, k);
        }
        addSurroundings(parts, design);
        parts.removeIf(part -> part.value() == 0.0 || Double.isInfinite(part.value()));
        return parts;
    }

    private static void addElement(List<Part> parts, Design design, int index) {
        PathElement element = design.path().get(index);
        if (element instanceof SeriesElement series) {
            parts.add(new Part(
                    series.name(),
                    value(series.part()),
                    value -> design.withElement(
                            index,
                            new SeriesElement(
                                    series.name(),
                                    with(series.part(), value),
                                    series.legs(),
                                    series.temperatureKelvin()))));
        } else if (element instanceof ShuntElement shunt) {
            parts.add(new Part(
                    shunt.name(),
                    value(shunt.part()),
                    value -> design.withElement(
                            index,
                            new ShuntElement(
                                    shunt.name(),
                                    with(shunt.part(), value),
                                    shunt.legs(),
                                    shunt.temperatureKelvin(),
                                    shunt.supply()))));
        } else if (element instanceof Transformer transformer) {
            OpenValue.Ratio ratio =
                    new OpenValue.Ratio(transformer.name(), transformer.ratio(), 2.0 * transformer.ratio());
            parts.add(
                    new Part(transformer.name() + ", ratio", transformer.ratio(), value -> design.with(ratio, value)));
        }
    }

    private static double value(Passive part) {
        if (part instanceof Passive.Resistor resistor) {
            return resistor.ohms();
        }
        return part instanceof Passive.Capacitor capacitor ? capacitor.farads() : ((Passive.Inductor) part).henries();
    }

    private static Passive with(Passive part, double value) {
        if (part instanceof Passive.Resistor resistor) {
            return new Passive.Resistor(value, resistor.noiseIndex(), resistor.directVolts());
        }
        return part instanceof Passive.Capacitor capacitor
                ? new Passive.Capacitor(value, capacitor.lossTangent(), capacitor.seriesOhms())
                : new Passive.Inductor(value);
    }

    private static void addSurroundings(List<Part> parts, Design design) {
        StagePlan plan = design.candidate().plan();
        Surroundings around = plan.around();
        CommonLead lead = around.commonLead();
        around.load()
                .ifPresent(load -> parts.add(new Part(
                        "load",
                        load.ohms(),
                        value -> around(
                                design,
                                new Surroundings(
                                        lead,
                                        Optional.of((Passive.Resistor) with(load, value)),
                                        around.nextStage(),
                                        around.cascode())))));
        parts.add(new Part(
                "common lead, unbypassed",
                lead.unbypassedOhms(),
                value -> lead(
                        design,
                        new CommonLead(value, lead.resistorOhms(), lead.bypassFarads(), lead.bypassSeriesOhms()))));
        parts.add(new Part(
                "common lead, resistor",
                lead.resistorOhms(),
                value -> lead(
                        design,
                        new CommonLead(lead.unbypassedOhms(), value, lead.bypassFarads(), lead.bypassSeriesOhms()))));
        parts.add(new Part(
                "common lead, bypass",
                lead.bypassFarads(),
                value -> lead(
                        design,
                        new CommonLead(lead.unbypassedOhms(), lead.resistorOhms(), value, lead.bypassSeriesOhms()))));
        around.nextStage()
                .ifPresent(next -> parts.add(new Part(
                        "next stage voltage noise",
                        next.voltsPerRootHertz(),
                        value -> around(
                                design,
                                new Surroundings(
                                        lead,
                                        around.load(),
                                        Optional.of(new NextStage(
                                                value,
                                                next.voltageCornerHertz(),
                                                next.ampsPerRootHertz(),
                                                next.currentCornerHertz())),
                                        around.cascode())))));
        PairParts pair = plan.pair();
        parts.add(new Part(
                "gain resistor",
                pair.gainOhms(),
                value -> pair(design, new PairParts(value, pair.feedbackOhms(), pair.otherOhms()))));
        parts.add(new Part(
                "feedback resistor",
                pair.feedbackOhms(),
                value -> pair(design, new PairParts(pair.gainOhms(), value, pair.otherOhms()))));
        parts.add(new Part(
                "other side",
                pair.otherOhms(),
                value -> pair(design, new PairParts(pair.gainOhms(), pair.feedbackOhms(), value))));
    }

    private static Design lead(Design design, CommonLead lead) {
        Surroundings around = design.candidate().plan().around();
        return around(design, new Surroundings(lead, around.load(), around.nextStage(), around.cascode()));
    }

    private static Design around(Design design, Surroundings around) {
        StagePlan plan = design.candidate().plan();
        return design.withPlan(new StagePlan(plan.arrangement(), plan.inParallel(), around, plan.pair()));
    }

    private static Design pair(Design design, PairParts pair) {
        StagePlan plan = design.candidate().plan();
        return design.withPlan(new StagePlan(plan.arrangement(), plan.inParallel(), plan.around(), pair));
    }
}
