# `./docker-free-dev.sh`: the running product, with demo data unless told otherwise.

start_thudline() {
  hold_run_lock
  [[ $reset == no ]] || remove_own_data
  rm -f "$data/address"
  prepare_start
  read_settings "$data/settings.json" --port WEB_PORT=4700 --port API_PORT=4701 --port S3_PORT=4702 \
    --port POSTGRES_PORT=4703 --port SMTP_PORT=4704 --port MAIL_PAGE_PORT=4705 \
    --secret S3_ACCESS_KEY --secret S3_SECRET_KEY --secret JWT_SECRET --secret CLUSTER_ID \
    --secret POSTGRES_ADMIN_PASSWORD --secret DATABASE_PASSWORD --password DEMO_PASSWORD
  start_services
  start_application
  [[ $demo == no ]] || seed_demo
  printf '%s\n' "$address" >"$data/address"
  greet
  watch_children
}

# Only what this checkout made; the locks stay, because they are held.
remove_own_data() {
  local cluster
  cluster=$(cluster_dir)
  [[ ! -d $cluster ]] || wait_for_leftover_postgres "$cluster"
  rm -rf -- "$cluster" "$cluster.making" "$cluster.making.password"
  find "$data" -mindepth 1 -maxdepth 1 ! -name '*.lock' ! -name log -exec rm -rf -- {} +
  say "Removed the database, the recordings and the settings of this checkout."
}

prepare_start() {
  install_missing_packages 'postgresql:/usr/lib/postgresql/*/bin/postgres'
  hold_build_lock
  install_node_modules
  if [[ $production_build == yes ]]; then build build; else build build:node; fi
  release_build_lock
}

start_services() {
  say "Starting."
  cluster=$(cluster_dir)
  set_aside_foreign_cluster "$cluster" "$CLUSTER_ID"
  make_cluster "$cluster"
  start_postgres "$cluster"
  make_database thudline
  start_local_services "$data"
}

# People use one address: Vite's server stands there (the default), or the API itself, with the built application.
start_application() {
  address=http://127.0.0.1:$WEB_PORT
  [[ $production_build == no ]] || API_PORT=$WEB_PORT
  api=http://127.0.0.1:$API_PORT
  describe_object_store
  describe_mail_service
  application=(env "${object_store[@]}" "${mail_service[@]}" DATABASE_URL="$(database_url thudline)"
    JWT_SECRET="$JWT_SECRET" PUBLIC_URL="$address" SCRATCH_DIR="$data/scratch" HOST=127.0.0.1 PORT="$API_PORT")
  mkdir -p "$data/scratch"
  migrate
  start_api
  start_worker
  wait_for_child api "$api/api/health" 60
  [[ $production_build == yes ]] || start_vite
}

migrate() {
  "${application[@]}" node "$root/apps/api/dist/database/migrate.js" </dev/null >"$log_dir/migrate.log" 2>&1 8>&- 9>&- ||
    fail_with_log "$log_dir/migrate.log" "The database could not be brought up to date."
}

start_api() {
  local web_dist=()
  [[ $production_build == no ]] || web_dist=(WEB_DIST="$root/apps/web/dist" NODE_ENV=production)
  start_child api "${application[@]}" "${web_dist[@]}" node "$root/apps/api/dist/main.js"
}

start_worker() { start_child worker "${application[@]}" node "$root/apps/api/dist/worker-main.js"; }

start_vite() {
  pushd "$root/apps/web" >/dev/null
  start_child web env API_URL="$api" PORT="$WEB_PORT" node "$root/node_modules/vite/bin/vite.js" \
    --host 127.0.0.1 --port "$WEB_PORT" --strictPort
  popd >/dev/null
  wait_for_child web "$address/" 60
}

seed_demo() {
  say "Uploading the demo takes."
  local sample_take
  sample_take=$(API_URL=$api PUBLIC_URL=$address DEMO_PASSWORD=$DEMO_PASSWORD node "$root/fixtures/dist/seedDemo.js" \
    </dev/null 2>"$log_dir/seed.log" 8>&- 9>&-) || fail_with_log "$log_dir/seed.log" "The demo could not be set up."
  [[ ! -s $log_dir/seed.log ]] || say "$(<"$log_dir/seed.log")"
  # Nothing is printed where that take was deleted or has no sheet.
  [[ -z $sample_take ]] || "${application[@]}" node "$root/apps/api/dist/sample-take.js" "$sample_take" \
    </dev/null >>"$log_dir/seed.log" 2>&1 8>&- 9>&- || fail_with_log "$log_dir/seed.log" "The sample sheet could not be chosen."
}

greet() {
  say ""
  say "Thudline runs at $address"
  if [[ $demo == yes ]]; then
    say "Sign in as the player  juno@example.org  or the teacher  oda@example.org"
    say "with the password      $DEMO_PASSWORD"
  fi
  say "Mail it sends is shown at $mail_sink"
  say "Logs are in $log_dir. Ctrl-C stops everything."
}

# What keeps nothing in its memory is replaced, as a service manager would do it; any other death ends the whole.
watch_children() {
  local ended name code deaths_s=()
  while :; do
    code=0
    # Bash would print a line of its own about a child that was killed.
    { wait -n -p ended "${child_pid[@]}" || code=$?; } 2>/dev/null
    for name in "${!child_pid[@]}"; do [[ ${child_pid[$name]} != "${ended:-}" ]] || break; done
    unset "child_pid[$name]"
    deaths_s+=("$SECONDS")
    if [[ $name == worker || $name == local-services ]] && ! deaths_are_too_many; then
      say "The $name process ended (code $code); starting another."
      if [[ $name == worker ]]; then start_worker; else start_local_services "$data"; fi
    else
      fail_with_log "$log_dir/$name.log" "The $name process ended by itself (code $code), so everything is stopped."
    fi
  done
}

# Five deaths within a minute: common practice for service managers, no source.
deaths_are_too_many() {
  local count=${#deaths_s[@]}
  ((count >= 5 && deaths_s[count - 1] - deaths_s[count - 5] < 60))
}
