# Shared by the scripts of this folder: where things are, a fitting JDK and Maven, what has changed, what is missing.
# shellcheck shell=bash

root=$(cd "$(dirname "${BASH_SOURCE[0]}")/.." && pwd -P)
work=$root/target
maven_version=3.9.9
maven_minor_wanted=9

fail() {
    printf '%s\n' "$@" >&2
    exit 2
}

# The JDK must be 17 or newer and hold a compiler.
need_jdk() {
    local java=java version
    [ -z "${JAVA_HOME:-}" ] || java=$JAVA_HOME/bin/java
    version=$("$java" -version 2>&1 | sed -n 's/.* version "\([0-9]*\).*/\1/p;T;q')
    if [ -z "$version" ] || [ "$version" -lt 17 ] || ! "$java" --list-modules 2>/dev/null | grep -q '^jdk.compiler@'; then
        fail "A JDK 17 or newer is needed (found: ${version:-none}). On Debian: apt-get install openjdk-17-jdk-headless; else set JAVA_HOME."
    fi
}

# Sets $mvn to a Maven that is new enough for the build. An older one, such as Debian's, fetches the newer one by its coordinates.
need_maven() {
    local version cache=${XDG_CACHE_HOME:-${HOME:-$work}/.cache}/modewright
    command -v mvn >/dev/null || fail "Maven is needed. On Debian: apt-get install maven"
    mkdir -p "$cache" 2>/dev/null || cache=$work/cache
    mvn=$cache/apache-maven-$maven_version/bin/mvn
    [ ! -f "$mvn" ] || return 0
    version=$(mvn -B -version 2>/dev/null | sed -n 's/.*Apache Maven 3\.\([0-9]*\)\..*/\1/p')
    if [ -n "$version" ] && [ "$version" -ge $maven_minor_wanted ]; then
        mvn=$(command -v mvn)
        return 0
    fi
    mkdir -p "$work" "$cache.new.$$"
    # shellcheck disable=SC2086
    (cd "$cache.new.$$" && mvn -B -q ${MAVEN_ARGS:-} org.apache.maven.plugins:maven-dependency-plugin:3.8.1:unpack \
        -Dartifact=org.apache.maven:apache-maven:$maven_version:zip:bin -DoutputDirectory=.) >"$work/maven.log" 2>&1 \
        || fail "Maven $maven_version could not be fetched with $(command -v mvn); the build needs 3.9 or newer. See $work/maven.log"
    mkdir -p "$cache"
    mv "$cache.new.$$/apache-maven-$maven_version" "$cache/" 2>/dev/null || [ -f "$mvn" ]
    rm -rf "$cache.new.$$"
}

run_maven() {
    (cd "$root" && "$mvn" -B "$@")
}

# Prints a hash of every file in the given files and folders of the repository that is not a product of the build.
fingerprint() {
    (cd "$root" && find "$@" \( -name target -o -name bin \) -prune -o -type f -print0 | LC_ALL=C sort -z | xargs -0 sha256sum | sha256sum | cut -c1-16)
}

# The Debian packages among those given that are not there, one a line; nothing where there is no dpkg.
missing_packages() {
    local package
    command -v dpkg-query >/dev/null || return 0
    for package in "$@"; do
        dpkg-query -W -f '${db:Status-Status}' "$package" 2>/dev/null | grep -qx installed || printf '%s\n' "$package"
    done
}

# Installs the given Debian packages where they are missing and that is allowed, else says what to install.
need_packages() {
    local missing
    mapfile -t missing < <(missing_packages "$@")
    [ ${#missing[@]} -gt 0 ] || return 0
    if [ "$(id -u)" = 0 ]; then
        mkdir -p "$work"
        { apt-get update && DEBIAN_FRONTEND=noninteractive apt-get install -y --no-install-recommends "${missing[@]}"; } >"$work/packages.log" 2>&1 </dev/null \
            || fail "These Debian packages could not be installed: ${missing[*]}" "See $work/packages.log"
    else
        fail "These Debian packages are missing: ${missing[*]}" "Install them as root: apt-get install ${missing[*]}"
    fi
}
