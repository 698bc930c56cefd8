#!/bin/sh
# Starts the workbench of Modewright. Projects are kept in ~/.modewright/workspace, or in the folder that MODEWRIGHT_WORKSPACE names.
here=$(cd "$(dirname "$0")" && pwd -P)
JAVA_HOME=${JAVA_HOME:-$(/usr/libexec/java_home -v 17+ 2>/dev/null)}
java=${JAVA_HOME:+$JAVA_HOME/bin/}java
if ! command -v "$java" >/dev/null; then
    echo "Modewright needs Java 17 or newer: install it, or set JAVA_HOME." >&2
    exit 2
fi
exec "$java" "@$here/java.options" -XstartOnFirstThread -Xdock:name=Modewright "-Xdock:icon=$here/modewright.icns" -jar "$here"/plugins/org.eclipse.equinox.launcher_*.jar \
    -data "${MODEWRIGHT_WORKSPACE:-$HOME/.modewright/workspace}" "$@"
