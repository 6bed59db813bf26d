package org.seamwatch.ops;

import java.util.concurrent.Callable;
import picocli.CommandLine.Command;

/** Sends. */
@Command(name = "send")
final class SendCommand implements Callable<Integer> {
    @Override
    public Integer call() {
        return 0;
    }
}
