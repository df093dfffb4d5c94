# What every part uses: how it speaks, how it gives up, what it needs of the machine.
# Expects: root (the checkout), data (its .data folder).

log_dir=$data/log

say() { printf '%s\n' "$*"; }

# One sentence says what is wrong.
fail() {
  printf '%s\n' "$*" >&2
  exit 1
}

# The last words of a log, then the sentence.
fail_with_log() {
  local log=$1
  shift
  tail -n 15 "$log" >&2 || true
  fail "$* The whole log is ${log##*/} in $data/log."
}

make_data_dir() {
  (umask 077 && mkdir -p "$data" "$log_dir" 2>/dev/null) ||
    fail "The folder $data can't be made; is the checkout writable for you?"
  [[ -w $data && -w $log_dir ]] || fail "The folder $data belongs to somebody else; run this as its owner."
}

# Node isn't installed from here: Debian 12 ships 18, and other sources are the owner's decision.
require_node() {
  command -v node >/dev/null || fail "Thudline needs Node 20 (20.19 or newer) and found none."
  local version major minor
  version=$(node --version)
  IFS=. read -r major minor _ <<<"${version#v}"
  ((major == 20 && minor >= 19)) || fail "Thudline needs Node 20 (20.19 or newer), and this is $version."
  command -v npm >/dev/null || fail "Thudline needs npm, which usually comes with Node, and found none."
}

# Only the start holds lock 9; whoever builds or tests holds lock 8. Children get neither.
hold_run_lock() {
  exec 9>"$data/run.lock"
  flock -n 9 || fail "Thudline already runs from this folder at $(cat "$data/address" 2>/dev/null || echo 'an address not yet known'); stop it with Ctrl-C where it was started."
}

hold_build_lock() {
  exec 8>"$data/build.lock"
  flock -n 8 && return
  say "Something else builds or tests in this folder; waiting for it to end."
  flock 8
}

release_build_lock() { exec 8>&-; }
