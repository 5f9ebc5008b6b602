package org.crossreach.cli;

import java.util.concurrent.Callable;

/** A command: what can be said to it, and what it does; it gives an {@link ExitCode}. */
interface Job extends Callable<Integer> {

  Usage usage();
}
