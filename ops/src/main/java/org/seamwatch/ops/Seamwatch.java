package org.seamwatch.ops;

import java.util.concurrent.Callable;
import org.seamwatch.schemas.ProductVersion;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** The command line. Exit codes: 0 done, 1 failed, 2 the user's input is wrong, 130 interrupted half-way. */
@Command(
        name = "seamwatch",
        description = {
            "Watches streams of case reports for the beginnings of outbreaks.",
            "An alarm is a statistical signal, not a confirmed outbreak; silence is not safety."
        },
        synopsisSubcommandLabel = "COMMAND",
        commandListHeading = "%nCommands:%n",
        optionListHeading = "%nOptions:%n",
        exitCodeListHeading = "%nExit codes:%n",
        exitCodeList = {
            "0:done",
            "1:failed",
            "2:the input is wrong: a plan, a file, an option",
            "130:interrupted half-way"
        },
        mixinStandardHelpOptions = true,
        versionProvider = Seamwatch.Version.class,
        scope = CommandLine.ScopeType.INHERIT,
        subcommands = {
            DemoCommand.class,
            RunCommand.class,
            CheckCommand.class,
            ReplayCommand.class,
            SendCommand.class,
            ScenarioCommand.class
        })
public final class Seamwatch implements Callable<Integer> {

    @Spec
    private CommandSpec spec = CommandSpec.create();

    @Option(
            names = "--verbose",
            scope = CommandLine.ScopeType.INHERIT,
            description = "show where an unexpected failure came from")
    private boolean verbose;

    /** Runs a command and exits with its code. */
    public static void main(String[] args) {
        Console console = Console.system();
        int code = run(console, args);
        console.flush();
        System.exit(code);
    }

    /** Runs a command; its exit code. */
    static int run(Console console, String... args) {
        return commandLine(console).execute(args);
    }

    static CommandLine commandLine(Console console) {
        Seamwatch root = new Seamwatch();
        CommandLine line = new CommandLine(root, new Commands(console))
                .setOut(console.out())
                .setErr(console.err())
                .setCaseInsensitiveEnumValuesAllowed(true);
        Failures failures = new Failures(console.err(), () -> root.verbose);
        line.setParameterExceptionHandler(failures::usage);
        line.setExecutionExceptionHandler((e, command, parsed) -> failures.failed(e));
        return line;
    }

    @Override
    public Integer call() {
        throw new ParameterException(spec.commandLine(), "a command must be given");
    }

    /** Gives commands what they write to. */
    private record Commands(Console console) implements CommandLine.IFactory {

        @Override
        public <K> K create(Class<K> type) throws Exception {
            try {
                return type.getDeclaredConstructor(Console.class).newInstance(console);
            } catch (NoSuchMethodException e) {
                return CommandLine.defaultFactory().create(type);
            }
        }
    }

    /** The version for {@code --version}. */
    static final class Version implements CommandLine.IVersionProvider {

        @Override
        public String[] getVersion() {
            return new String[] {"seamwatch " + ProductVersion.CURRENT};
        }
    }
}
