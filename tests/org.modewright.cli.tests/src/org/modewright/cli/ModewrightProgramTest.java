package org.modewright.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Help, options and faults of the command line itself. */
class ModewrightProgramTest {

    @Test
    void helpNamesEveryCommandAndTheExitStatuses() {
        Console console = Console.run("--help");
        assertEquals(0, console.status());
        for (String word : List.of("check", "solve", "convert", "Exit status: 0", "licensed engineer")) {
            assertTrue(console.out().contains(word), console.toString());
        }
        assertEquals(console.out(), Console.run("help").out());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "check|MODEL --modes --below --rules --list-rules --directions --json --csv --threads --quiet --all-elements --shapes",
        "solve|MODEL K.mtx --modes --below --rules --list-rules --directions --json --csv --threads --quiet --all-elements --shapes",
        "convert|IN OUT .mtx .zip --quiet"
    })
    void helpOfACommandNamesItsOptions(String command, String words) {
        Console console = Console.run(command, "--help");
        assertEquals(0, console.status(), console.toString());
        for (String word : words.split(" ")) {
            assertTrue(console.out().contains(word), word + " in " + console);
        }
        assertEquals(console.out(), Console.run("help", command).out());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "|give a command", "chek a|no command \"chek\"; there are: check, solve, convert", "report a|no command \"report\"",
        "check|give MODEL", "solve|give MODEL", "check a b|Unmatched argument", "check --modes 0 a|1 or more",
        "check --modes x a|whole number", "check --below -1 a|greater than 0", "check --below inf a|not a number",
        "check --below Infinity a|greater than 0", "check --directions x,w a|no direction", "check --threads 0 a|1 or more",
        "check --wrong a|Unknown option", "check --json|Missing required parameter", "solve a.mtx|K.mtx M.mtx",
        "solve a.mtx b.modewright|K.mtx M.mtx", "convert a|Missing required parameter", "convert a b.doc|.modewright, .zip or .mtx",
        "solve a.mtx b.mtx --rules common-90|has no directions", "solve a.mtx b.mtx --shapes s.h5|has no directions"
    })
    void wrongOptionsEndWithTwoAndAHint(String arguments, String text) {
        Console console = arguments == null ? Console.run() : Console.run(arguments.split(" "));
        assertEquals(2, console.status(), console.toString());
        assertEquals("", console.out());
        assertTrue(console.err().contains(text), console.toString());
        assertTrue(console.err().contains("--help"), console.toString());
    }

    @ParameterizedTest
    @ValueSource(strings = {"--list-rules", "check --list-rules", "solve --list-rules"})
    void rulePacksAreListed(String arguments) {
        Console console = Console.run(arguments.split(" "));
        assertEquals(0, console.status());
        assertTrue(console.out().startsWith("common-90"), console.toString());
    }

    @Test
    void versionIsPrinted() {
        assertEquals("Modewright 0.1.0", Console.run("--version").out().strip());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "check nowhere.modewright|there is no such file", "check sample:nothing|there are: demo, tip-mass",
        "check sample:demo --rules strict|There is no rule pack \"strict\"; there are: common-90",
        "check k.mtx|only solve takes matrices", "check sample:tip-mass --json nowhere/r.json|folder does not exist",
        "convert sample:tip-mass nowhere/x.modewright|folder does not exist", "solve nowhere.K.mtx nowhere.M.mtx|there is no such file"
    })
    void badInputEndsWithTwo(String arguments, String text) {
        Console console = Console.run(arguments.split(" "));
        assertEquals(2, console.status(), console.toString());
        assertEquals("", console.out());
        assertTrue(console.err().contains(text), console.toString());
    }

    @Test
    void anOfferedCommandGetsItsArgumentsAndIsListed() {
        List<String> got = new ArrayList<>();
        OfferedCommand offered = new OfferedCommand("measure", "Measures something.", () -> (arguments, context) -> {
            got.addAll(arguments);
            context.out().println(context.program());
            return 1;
        });
        Console console = Console.withOffered(offered, "measure", "a", "--big", "-x", "7");
        assertEquals(1, console.status(), console.toString());
        assertEquals(List.of("a", "--big", "-x", "7"), got);
        assertTrue(console.out().startsWith("Modewright"));
        assertTrue(Console.withOffered(offered, "--help").out().contains("Measures something."));
        assertTrue(Console.withOffered(offered, "wrong").err().contains("convert, measure"));
        assertEquals("Modewright 0.1.0", Console.withOffered(offered, "measure").out().strip());
    }

    @Test
    void theMemoryThatIsTooSmallEndsWithThree() {
        OfferedCommand greedy = new OfferedCommand("greedy", "Takes all memory.", () -> (arguments, context) -> {
            throw new OutOfMemoryError("Java heap space");
        });
        Console console = Console.withOffered(greedy, "greedy");
        assertEquals(3, console.status());
        assertTrue(console.err().contains("MiB is too small"), console.toString());
    }

    /** A fault of the program is never mistaken for an audit that does not pass. */
    @Test
    void aFaultOfTheProgramEndsWithThree() {
        for (Throwable fault : List.of(new IllegalStateException("odd"), new NoClassDefFoundError("odd"))) {
            Console console = Console.withOffered(new OfferedCommand("odd", "Fails.", () -> (arguments, context) -> {
                if (fault instanceof Error error) {
                    throw error;
                }
                throw (Exception) fault;
            }), "odd");
            assertEquals(3, console.status());
            assertTrue(console.err().contains("fault of the program") && console.err().contains("odd"), console.toString());
        }
    }

    @Test
    void aCancelEndsWithThreeAndWritesNothing() {
        Console console = Console.cancelled(() -> true, "check", "sample:demo");
        assertEquals(3, console.status(), console.toString());
        assertEquals("", console.out());
        assertTrue(console.err().contains("Cancelled"), console.toString());
    }

    @Test
    void progressGoesToStandardErrorAlone() {
        Console plain = Console.run("check", "sample:two-storeys");
        assertFalse(plain.err().isEmpty());
        assertFalse(plain.err().contains("\r"));
        assertEquals(plain.err().lines().distinct().count(), plain.err().lines().count(), plain.err());
        Console terminal = Console.onTerminal("check", "sample:two-storeys");
        assertTrue(terminal.err().startsWith("\r"));
        assertFalse(terminal.err().contains("\n"));
        assertTrue(terminal.err().endsWith(" \r"));
        assertEquals("", Console.run("check", "sample:two-storeys", "--quiet").err());
        assertEquals(plain.out(), terminal.out());
    }
}
