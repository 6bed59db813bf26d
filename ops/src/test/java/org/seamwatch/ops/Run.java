package org.seamwatch.ops;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.util.List;

/**
 * A command run in this process.
 *
 * @param code its exit code
 * @param out what it wrote to standard output
 * @param err what it wrote to standard error
 */
record Run(int code, String out, String err) {

    static Run of(Object... args) {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        Console console = new Console(new PrintWriter(out), new PrintWriter(err), false);
        String[] words = new String[args.length];
        for (int i = 0; i < args.length; i++) {
            words[i] = String.valueOf(args[i]);
        }
        int code = Seamwatch.run(console, words);
        console.flush();
        return new Run(code, out.toString(), err.toString());
    }

    List<String> errLines() {
        return err.lines().toList();
    }
}
