package hissledger.cli;

import hissledger.choose.Candidate;
import hissledger.choose.Design;
import hissledger.choose.Scenario;
import hissledger.files.Catalogue;
import hissledger.files.Fault;
import hissledger.files.InputException;
import hissledger.files.ScenarioReader;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** The scenario and the devices that a verb works on. */
final class Inputs {
    @Parameters(index = "0", paramLabel = "SCENARIO", description = "the scenario file")
    private Path scenario = Path.of("");

    @Option(
            names = "--devices",
            paramLabel = "DIR",
            description =
                    "a folder of device files that add to the shipped ones or replace them by id; may be repeated")
    private List<Path> folders = new ArrayList<>();

    /** The scenario file, as the user named it. */
    String file() {
        return scenario.toString();
    }

    /** Reads the scenario and makes sure that each candidate can be computed. */
    Scenario read() throws InputException {
        Scenario read = ScenarioReader.read(scenario, Catalogue.load(folders));
        List<Fault> faults = new ArrayList<>();
        for (int k = 0; k < read.candidates().size(); k++) {
            Candidate candidate = read.candidates().get(k);
            try {
                Design.of(read, candidate);
            } catch (IllegalArgumentException fault) {
                faults.add(new Fault(
                        scenario.toString(),
                        0,
                        0,
                        "candidates[" + k + "]",
                        "(" + candidate.name() + ") cannot be computed: " + fault.getMessage()));
            }
        }
        if (!faults.isEmpty()) {
            throw new InputException(faults);
        }
        return read;
    }
}
