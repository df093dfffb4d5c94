#!/usr/bin/env bash
# Runs or tests Thudline on one machine, without containers. The parts are in apps/local-services/bin.
set -Eeuo pipefail

# Started in the background by another script, Ctrl-C's signal would be ignored, and bash can't undo that from inside.
if [[ $(trap -p INT) == "trap -- '' SIGINT" ]]; then exec env --default-signal=INT "$BASH" "${BASH_SOURCE[0]}" "$@"; fi

root=$(cd "$(dirname "${BASH_SOURCE[0]}")" && pwd -P)
data=$root/.data
parts=$root/apps/local-services/bin
reset=no demo=yes production_build=no

help() {
  cat <<'HELP'
Usage: ./docker-free-dev.sh [options]        start Thudline on this machine
       ./docker-free-dev.sh test [command]   run every test, or one command in the test environment

Starting installs what is missing (PostgreSQL, Node packages), starts everything on 127.0.0.1, uploads demo takes,
and prints the address. Ctrl-C stops all it started. What it keeps lies in .data (root: the database beside Debian's).

  --no-demo            start without demo people and takes
  --production-build   serve the built web application from the API, instead of Vite's server for development
  --reset              first remove the database, recordings and settings of this checkout
  --help               this text

Testing uses a database and an object store of its own and throws them away. One suite, for example:
  ./docker-free-dev.sh test npx jest --selectProjects api
HELP
}

for part in common packages environment children database start test; do
  # shellcheck source=/dev/null
  source "$parts/$part.sh"
done

mode=start test_command=()
while (($#)); do
  case $1 in
    test)
      mode=test
      shift
      test_command=("$@")
      break
      ;;
    --reset) reset=yes ;;
    --no-demo) demo=no ;;
    --production-build) production_build=yes ;;
    --help | -h)
      help
      exit
      ;;
    *) fail "There is no option $1; ./docker-free-dev.sh --help lists them." ;;
  esac
  shift
done

set_traps
require_node
make_data_dir
if [[ $mode == test ]]; then test_thudline "${test_command[@]}"; else start_thudline; fi
