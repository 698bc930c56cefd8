package org.modewright.cli;

import java.util.List;

/** A command that another bundle offers to the command line, through the extension point {@code org.modewright.cli.command}. */
public interface HeadlessCommand {

    /**
     * Does the work.
     *
     * @param arguments what stands behind the command's name, options included; the command has its own {@code --help}
     * @return the exit status: 0 good, 1 not passed, 2 bad input or options, 3 not completed
     * @throws Exception a fault in words for the user; ends with status 2
     */
    int run(List<String> arguments, CommandContext context) throws Exception;
}
