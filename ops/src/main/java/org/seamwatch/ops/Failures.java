package org.seamwatch.ops;

import java.io.PrintWriter;
import java.util.Locale;
import java.util.function.BooleanSupplier;
import java.util.regex.Pattern;
import org.apache.kafka.common.KafkaException;
import org.apache.kafka.common.config.ConfigException;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.InputException;
import org.seamwatch.topology.replay.ResultFileException;
import org.seamwatch.topology.service.NoBrokerException;
import picocli.CommandLine;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.UnmatchedArgumentException;

/** Says what went wrong in one clear line, and gives the exit code. */
final class Failures {

    static final int DONE = 0;
    static final int FAILED = 1;
    static final int WRONG_INPUT = 2;
    static final int INTERRUPTED = 130;

    private static final Pattern NO_NUMBER =
            Pattern.compile("^Invalid value for option '(\\S+)'(?: \\(.*?\\))?: '(.*)' is not an? (?:int|long)$");

    private final PrintWriter err;
    private final BooleanSupplier verbose;

    Failures(PrintWriter err, BooleanSupplier verbose) {
        this.err = err;
        this.verbose = verbose;
    }

    /** An option or argument is wrong. */
    int usage(ParameterException e, String[] args) {
        CommandLine command = e.getCommandLine();
        String said = NO_NUMBER.matcher(oneLine(e.getMessage())).replaceFirst("$1 must be a whole number, was '$2'");
        String near = "";
        if (e instanceof UnmatchedArgumentException unmatched
                && !unmatched.getSuggestions().isEmpty()) {
            near = "; did you mean " + String.join(" or ", unmatched.getSuggestions()) + "?";
        }
        line(lowerFirst(said) + near + " (see " + command.getCommandSpec().qualifiedName() + " --help)");
        return WRONG_INPUT;
    }

    /** A command has failed. */
    int failed(Throwable e) {
        if (e instanceof InputException) {
            line(oneLine(e.getMessage()));
            return WRONG_INPUT;
        }
        if (e instanceof CommandFailure || e instanceof ResultFileException || e instanceof NoBrokerException) {
            line(oneLine(e.getMessage()));
            trace(e);
            return FAILED;
        }
        if (e instanceof KafkaException) {
            Throwable root = root(e);
            line("kafka: " + oneLine(root.getMessage()));
            trace(e);
            return root instanceof ConfigException ? WRONG_INPUT : FAILED;
        }
        line("unexpected " + e.getClass().getSimpleName() + ": " + oneLine(e.getMessage())
                + (verbose.getAsBoolean() ? "" : " (--verbose shows where)"));
        trace(e);
        return FAILED;
    }

    /** Clients wrap what is wrong in sentences that do not say it. */
    private static Throwable root(Throwable e) {
        Throwable root = e;
        while (root.getCause() != null) {
            root = root.getCause();
        }
        return root;
    }

    private void trace(Throwable e) {
        if (verbose.getAsBoolean()) {
            e.printStackTrace(err);
        }
    }

    private void line(String text) {
        err.println("seamwatch: " + text);
        err.flush();
    }

    private static String oneLine(@Nullable String text) {
        return text == null ? "no message" : text.strip().replaceAll("\\s*[\\r\\n]+\\s*", " ");
    }

    private static String lowerFirst(String text) {
        return text.isEmpty() ? text : text.substring(0, 1).toLowerCase(Locale.ROOT) + text.substring(1);
    }
}
