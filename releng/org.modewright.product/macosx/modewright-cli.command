#!/bin/sh
# The command line of Modewright, beside Modewright.app: modewright-cli.command COMMAND ..., for example modewright-cli.command check MODEL.
exec "$(dirname "$0")/Modewright.app/Contents/Eclipse/modewright-cli.command" "$@"
