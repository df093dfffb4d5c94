# A PostgreSQL cluster of our own: its own folder and port, TCP on 127.0.0.1 only, passwords checked.
# Expects in the environment of the script: POSTGRES_PORT, POSTGRES_ADMIN_PASSWORD, DATABASE_PASSWORD.

# The server refuses to run as root, so root runs it as the postgres user, from a folder that user can enter.
as_cluster_user() {
  if ((EUID == 0)); then
    (cd / && runuser -u postgres -- "$@")
  else
    "$@"
  fi
}

# Sets pg_bin: the newest installed server, or the one the cluster was made with.
choose_postgres() {
  local cluster=$1 made_with
  made_with=$(as_cluster_user cat "$cluster/PG_VERSION" 2>/dev/null || true)
  if [[ -n $made_with ]]; then
    pg_bin=/usr/lib/postgresql/$made_with/bin
  else
    pg_bin=$(printf '%s\n' /usr/lib/postgresql/*/bin | sort -V | tail -n 1)
  fi
  [[ -x $pg_bin/postgres ]] ||
    fail "The data in $cluster needs PostgreSQL $made_with, which is no longer installed; install it, or start afresh with --reset."
}

# An ordinary user's cluster lives in .data. The postgres user can't enter that folder, so root's lives beside Debian's.
cluster_dir() {
  if ((EUID == 0)); then
    printf '/var/lib/postgresql/thudline-%.8s' "$(printf '%s' "$root" | sha256sum)"
  else
    printf '%s' "$data/postgres"
  fi
}

# Root's cluster outlives a checkout that was deleted; its passwords went with the checkout, and so did the recordings.
set_aside_foreign_cluster() {
  local cluster=$1 id=$2 aside
  [[ $EUID == 0 && -d $cluster ]] || return 0
  [[ $(cat "$cluster/thudline-id" 2>/dev/null) == "$id" ]] && return
  aside=$cluster-set-aside-$(date +%Y%m%d-%H%M%S)
  mv -- "$cluster" "$aside"
  say "An older database of a deleted checkout in this place was moved to $aside; delete it when nobody needs it."
}

# make_cluster <folder> <initdb options...>; made beside and renamed, so that half a cluster is never taken for a whole.
make_cluster() {
  local cluster=$1 making=$1.making
  shift
  ! as_cluster_user test -f "$cluster/PG_VERSION" || return 0
  half_made_cluster=$making
  discard_half_made_cluster
  as_cluster_user mkdir -m 0700 -- "$making"
  printf '%s\n' "$POSTGRES_ADMIN_PASSWORD" | as_cluster_user sh -c 'umask 077; cat >"$1"' - "$making.password"
  local made=yes
  choose_postgres "$making"
  as_cluster_user "$pg_bin/initdb" -D "$making" --username=thudline_admin \
    --pwfile="$making.password" --auth=scram-sha-256 --locale=C.UTF-8 -E UTF8 "$@" >"$log_dir/initdb.log" 2>&1 || made=no
  as_cluster_user rm -f -- "$making.password"
  [[ $made == yes ]] || fail_with_log "$log_dir/initdb.log" "The database could not be made."
  printf '%s\n' "${CLUSTER_ID:-throwaway}" | as_cluster_user sh -c 'cat >"$1"' - "$making/thudline-id"
  as_cluster_user mv -- "$making" "$cluster"
  half_made_cluster=
}

# Its password file goes first; this also runs when the script is interrupted.
discard_half_made_cluster() {
  [[ -z ${half_made_cluster:-} ]] || as_cluster_user rm -rf -- "$half_made_cluster.password" "$half_made_cluster"
}

# A server left by a script that was killed outright is on its way out; two on one folder would not start.
wait_for_leftover_postgres() {
  local cluster=$1 pid tenths
  pid=$(as_cluster_user head -n 1 "$cluster/postmaster.pid" 2>/dev/null || true)
  [[ -n $pid ]] && tr '\0' ' ' <"/proc/$pid/cmdline" 2>/dev/null | grep -qF -- "$cluster" || return 0
  kill -s INT "$pid" 2>/dev/null || true
  for ((tenths = 0; tenths < 150; tenths++)); do
    is_alive "$pid" || return 0
    sleep 0.1
  done
  fail "An older database server (process $pid) still uses $cluster; stop it first."
}

# start_postgres <folder> <server options...>
start_postgres() {
  local cluster=$1 tenths
  shift
  choose_postgres "$cluster"
  wait_for_leftover_postgres "$cluster"
  local server=("$pg_bin/postgres" -D "$cluster" -p "$POSTGRES_PORT" -c listen_addresses=127.0.0.1
    -c unix_socket_directories= "$@")
  # Not runuser: it stays in between, and kills the server two seconds after passing a signal on.
  if ((EUID == 0)); then
    server=(setpriv --reuid=postgres --regid=postgres --init-groups --pdeathsig INT -- "${server[@]}")
  fi
  pushd / >/dev/null
  start_child postgres "${server[@]}"
  popd >/dev/null
  for ((tenths = 0; tenths < 300; tenths++)); do
    "$pg_bin/pg_isready" -q -h 127.0.0.1 -p "$POSTGRES_PORT" && return
    is_alive "${child_pid[postgres]}" || break
    sleep 0.1
  done
  fail_with_log "$log_dir/postgres.log" "The database server did not start."
}

psql_admin() {
  PGPASSWORD=$POSTGRES_ADMIN_PASSWORD "$pg_bin/psql" -X -q -A -t -v ON_ERROR_STOP=1 \
    -h 127.0.0.1 -p "$POSTGRES_PORT" -U thudline_admin -d postgres "$@"
}

# The application signs in as the owner of its database, not as a superuser.
make_database() {
  local name=$1
  if [[ -z $(psql_admin -c "select 1 from pg_roles where rolname = 'thudline'") ]]; then
    printf "create role thudline login password '%s'\n" "$DATABASE_PASSWORD" | psql_admin
  fi
  [[ -n $(psql_admin -c "select 1 from pg_database where datname = '$name'") ]] ||
    psql_admin -c "create database $name owner thudline"
}

admin_database_url() { printf 'postgresql://thudline_admin:%s@127.0.0.1:%s/postgres' "$POSTGRES_ADMIN_PASSWORD" "$POSTGRES_PORT"; }
database_url() { printf 'postgresql://thudline:%s@127.0.0.1:%s/%s' "$DATABASE_PASSWORD" "$POSTGRES_PORT" "$1"; }
