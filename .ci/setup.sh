# Shared set-up, sourced by examples/run.sh and tests/run.sh. POSIX sh.
# shellcheck shell=sh
#
#     need_packages g++ cmake      installs those Debian packages that are missing; fails, and says which, where it
#                                  cannot

say() { printf '%s\n' "$*" >&2; }

is_installed() {
    [ "$(dpkg-query -W -f '${db:Status-Status}' "$1" 2>/dev/null)" = installed ]
}

need_packages() {
    missing=
    for package in "$@"; do
        is_installed "$package" || missing="$missing $package"
    done
    [ -n "$missing" ] || return 0
    if ! command -v apt-get >/dev/null 2>&1; then
        say "Missing packages (Debian's names):$missing"
        say "They cannot be installed from here, since there is no apt-get. Please install them and run this again."
        return 1
    fi
    if [ "$(id -u)" -eq 0 ]; then
        as_root=
    elif sudo -n true 2>/dev/null; then
        as_root='sudo -n'
    else
        say "Missing packages:$missing"
        say "Only root can install them: apt-get install$missing"
        return 1
    fi
    say "Installing$missing ..."
    apt_log=$(mktemp) || return 1
    # The words of as_root and missing are meant to be split.
    # shellcheck disable=SC2086
    if $as_root apt-get update >"$apt_log" 2>&1 &&
        $as_root env DEBIAN_FRONTEND=noninteractive apt-get install -y --no-install-recommends $missing \
            >>"$apt_log" 2>&1 </dev/null; then
        rm -f "$apt_log"
    else
        tail -n 20 "$apt_log" >&2
        rm -f "$apt_log"
        say "Could not install$missing."
        return 1
    fi
}
