# The processes this script starts: each in a session of its own, so that Ctrl-C reaches only the script, which then
# stops them in order. `setpriv --pdeathsig` lets the kernel stop them when the script itself is killed outright.

declare -A child_pid=()
stop_order=(tests web api worker local-services postgres)

# start_child <name> <command...>; its output goes to <name>.log, the last one's stays beside it
start_child() {
  local name=$1
  shift
  [[ ! -s $log_dir/$name.log ]] || mv -f -- "$log_dir/$name.log" "$log_dir/$name.previous.log"
  : >"$log_dir/$name.log"
  setsid setpriv --pdeathsig TERM -- "$@" </dev/null >"$log_dir/$name.log" 2>&1 8>&- 9>&- &
  child_pid[$name]=$!
}

wait_for_child() {
  local name=$1 url=$2 seconds=$3
  node "$parts/waitFor.mjs" "$url" "$seconds" "${child_pid[$name]}" ||
    fail_with_log "$log_dir/$name.log" "The $name process did not come up."
}

is_alive() { kill -0 "$1" 2>/dev/null; }

# PostgreSQL shuts down cleanly and without waiting for its clients on INT; the others do on TERM.
stop_child() {
  local name=$1 pid=${child_pid[$1]:-} signal=TERM tenths
  [[ -n $pid ]] || return 0
  unset "child_pid[$name]"
  [[ $name != postgres ]] || signal=INT
  # The test command is npm, a shell and what they started: all of them have to hear it.
  if [[ $name == tests ]]; then kill -s "$signal" -- "-$pid" 2>/dev/null || true; fi
  kill -s "$signal" "$pid" 2>/dev/null || true
  for ((tenths = 0; tenths < 150; tenths++)); do
    is_alive "$pid" || break
    sleep 0.1
  done
  kill -s KILL -- "-$pid" 2>/dev/null || true
}

stop_children() {
  local name
  for name in "${stop_order[@]}"; do stop_child "$name"; done
}

# Runs once, however the script ends. A second Ctrl-C while stopping changes nothing.
on_exit() {
  local code=$?
  trap '' INT TERM HUP
  trap - EXIT ERR
  set +e
  ((${#child_pid[@]} == 0)) || say "Stopping."
  stop_children
  discard_half_made_cluster
  remove_throwaway
  exit "$code"
}

# Folders of a test run; the server in the first one has ended by now. Logs are kept when something failed.
remove_throwaway() {
  if [[ -n ${throwaway_files:-} && $code != 0 && -d $throwaway_files/log ]]; then
    rm -rf -- "$data/log/test"
    mv -- "$throwaway_files/log" "$data/log/test"
    [[ ! -d $throwaway_files/results ]] || mv -- "$throwaway_files/results" "$data/log/test/results"
    say "The logs, pictures and traces of this test run are in $data/log/test."
  fi
  rm -rf -- ${throwaway_cluster:+"$throwaway_cluster"} ${throwaway_files:+"$throwaway_files"}
}

set_traps() {
  trap on_exit EXIT
  trap 'exit 130' INT
  trap 'exit 143' TERM
  trap 'exit 129' HUP
  trap 'printf "Something unexpected went wrong (%s, line %s).\n" "${BASH_SOURCE[0]##*/}" "$LINENO" >&2' ERR
}
