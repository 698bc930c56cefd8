#!/bin/sh
# The command line of Modewright: modewright-cli.command COMMAND ..., for example modewright-cli.command check MODEL; --help lists the commands.
here=$(cd "$(dirname "$0")" && pwd -P)
JAVA_HOME=${JAVA_HOME:-$(/usr/libexec/java_home -v 17+ 2>/dev/null)}
java=${JAVA_HOME:+$JAVA_HOME/bin/}java
if ! command -v "$java" >/dev/null; then
    echo "Modewright needs Java 17 or newer: install it, or set JAVA_HOME." >&2
    exit 2
fi
terminal=false
[ ! -t 2 ] || terminal=true
exec "$java" "@$here/java.options" -Djava.awt.headless=true -Dmodewright.terminal=$terminal -jar "$here"/plugins/org.eclipse.equinox.launcher_*.jar \
    -nosplash -data @none -application org.modewright.cli.application "$@"
