# `./docker-free-dev.sh test`: throwaway services on free ports, then every test, or the command given.

test_thudline() {
  install_missing_packages 'postgresql:/usr/lib/postgresql/*/bin/postgres' 'chromium:/usr/bin/chromium'
  hold_build_lock
  install_node_modules
  build build:services
  # The whole run builds and then stands on what it built; a single command builds nothing.
  if (($#)); then release_build_lock; else set -- npm run --silent test:all; fi
  make_throwaway
  start_test_services
  describe_test_environment
  run_tests "$@"
}

# The cluster's user makes one folder, so that it may enter; the rest lies in another, which is ours.
make_throwaway() {
  remove_older_throwaways
  throwaway_cluster=$(as_cluster_user mktemp -d "/tmp/thudline-throwaway-$$.XXXXXX")
  throwaway_files=$(mktemp -d "/tmp/thudline-throwaway-$$.XXXXXX")
  log_dir=$throwaway_files/log
  mkdir "$log_dir"
}

# What a run that was killed outright left behind.
remove_older_throwaways() {
  local folder pid
  for folder in /tmp/thudline-throwaway-*; do
    [[ -O $folder || $EUID == 0 ]] || continue
    pid=${folder#/tmp/thudline-throwaway-}
    is_alive "${pid%%.*}" || rm -rf -- "$folder"
  done
}

start_test_services() {
  read_settings "$throwaway_files/settings.json" --port S3_PORT=0 --port POSTGRES_PORT=0 --port API_PORT=0 \
    --port SMTP_PORT=0 --port MAIL_PAGE_PORT=0 --secret S3_ACCESS_KEY --secret S3_SECRET_KEY \
    --secret JWT_SECRET --secret POSTGRES_ADMIN_PASSWORD --secret DATABASE_PASSWORD --password DEMO_PASSWORD
  cluster=$throwaway_cluster/cluster
  make_cluster "$cluster" --no-sync
  start_postgres "$cluster" -c fsync=off -c synchronous_commit=off -c full_page_writes=off -c max_connections=200
  make_database thudline_browser
  start_local_services "$throwaway_files"
}

# The API's tests clone databases through TEST_DATABASE_URL; the browser's have one application on one database.
describe_test_environment() {
  describe_object_store
  describe_mail_service
  mkdir -p "$throwaway_files/scratch" "$throwaway_files/tmp"
  test_environment=(env "${object_store[@]}" "${mail_service[@]}" MAIL_SINK_URL="$mail_sink"
    TEST_DATABASE_URL="$(admin_database_url)"
    BROWSER_DATABASE_URL="$(database_url thudline_browser)" BROWSER_API_PORT="$API_PORT" JWT_SECRET="$JWT_SECRET"
    SCRATCH_DIR="$throwaway_files/scratch" TMPDIR="$throwaway_files/tmp" DEMO_PASSWORD="$DEMO_PASSWORD"
    TEST_RESULTS_DIR="${TEST_RESULTS_DIR:-$throwaway_files/results}")
}

# In a session of its own and waited for, so that a signal to this script is heard at once.
run_tests() {
  local code=0
  pushd "$root" >/dev/null
  setsid setpriv --pdeathsig TERM -- "${test_environment[@]}" "$@" </dev/null 8>&- &
  child_pid[tests]=$!
  popd >/dev/null
  wait "${child_pid[tests]}" || code=$?
  exit "$code"
}
