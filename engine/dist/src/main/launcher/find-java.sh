# Sourced by the launchers: sets java_home and java_version (a number such as 17) of the first Java
# that is new enough, or says what is missing. Reading the "release" file of a Java takes a
# millisecond where asking the Java itself takes fifty.

oldest_java=17

# Follows symbolic links; readlink -f is not everywhere.
real_path() {
  real=$1
  while [ -L "$real" ]; do
    link=$(readlink "$real")
    case $link in
      /*) real=$link ;;
      *) real=${real%/*}/$link ;;
    esac
  done
  printf '%s\n' "$real"
}

# "17.0.15" -> 17, "1.8.0_402" -> 8
feature_of() {
  feature=${1#1.}
  feature=${feature%%[!0-9]*}
  printf '%s\n' "${feature:-0}"
}

# Sets java_home and java_version from a folder that may hold a Java; false when it is too old.
try_java_home() {
  [ -x "$1/bin/java" ] || return 1
  version=
  if [ -r "$1/release" ]; then
    while IFS='=' read -r key value; do
      if [ "$key" = JAVA_VERSION ]; then
        version=${value#\"}
        version=${version%%\"*}
      fi
    done <"$1/release"
  fi
  if [ -z "$version" ]; then
    version=$("$1/bin/java" -version 2>&1 | sed -n 's/.*version "\([^"]*\)".*/\1/p')
  fi
  found_java="$1 (version ${version:-unknown})"
  java_version=$(feature_of "$version")
  java_home=$1
  [ "$java_version" -ge "$oldest_java" ]
}

find_java() {
  found_java=
  if [ -n "${JAVA_HOME:-}" ] && try_java_home "$JAVA_HOME"; then
    return 0
  fi
  on_path=$(command -v java || true)
  if [ -n "$on_path" ]; then
    on_path=$(real_path "$on_path")
    if try_java_home "${on_path%/bin/java}"; then
      return 0
    fi
  fi
  # macOS keeps a stub in /usr/bin and the Javas elsewhere.
  if [ -x /usr/libexec/java_home ]; then
    on_mac=$(/usr/libexec/java_home -v "$oldest_java+" 2>/dev/null || true)
    if [ -n "$on_mac" ] && try_java_home "$on_mac"; then
      return 0
    fi
  fi
  if [ -n "$found_java" ]; then
    echo "evensun: needs Java $oldest_java or newer but found $found_java;" \
      "install one and set JAVA_HOME to its folder" >&2
  else
    echo "evensun: needs Java $oldest_java or newer but found none in JAVA_HOME or PATH;" \
      "install one, or set JAVA_HOME to its folder" >&2
  fi
  return 1
}
