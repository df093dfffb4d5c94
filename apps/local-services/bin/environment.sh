# Ports, secrets, and what the processes are told. Only what a process needs is put into its environment.

# read_settings <file> <options of settings.mjs...>; sets the variables it prints.
read_settings() {
  local lines name value
  lines=$(node "$parts/settings.mjs" "$@") || fail "Ports and secrets could not be made; see the line above."
  while IFS='=' read -r name value; do printf -v "$name" '%s' "$value"; done <<<"$lines"
}

# start_local_services <folder>; objects and mails each get a folder in it.
start_local_services() {
  start_child local-services env OBJECT_STORE_DIR="$1/objects" S3_PORT="$S3_PORT" S3_BUCKET=thudline \
    S3_ACCESS_KEY="$S3_ACCESS_KEY" S3_SECRET_KEY="$S3_SECRET_KEY" \
    MAIL_DIR="$1/mail" SMTP_PORT="$SMTP_PORT" MAIL_PAGE_PORT="$MAIL_PAGE_PORT" \
    node "$root/apps/local-services/dist/main.js"
  local tenths
  for ((tenths = 0; tenths < 300; tenths++)); do
    ! grep -q '^local services are ready' "$log_dir/local-services.log" || return 0
    is_alive "${child_pid[local-services]}" || break
    sleep 0.1
  done
  fail_with_log "$log_dir/local-services.log" "The local services did not start."
}

# Sets object_store: how the API, the worker and the tests reach the objects.
describe_object_store() {
  object_store=(S3_ENDPOINT="http://127.0.0.1:$S3_PORT" S3_REGION=local S3_BUCKET=thudline
    S3_ACCESS_KEY="$S3_ACCESS_KEY" S3_SECRET_KEY="$S3_SECRET_KEY" S3_FORCE_PATH_STYLE=true
    S3_CHECKSUMS=when-required AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED=true)
}

# Sets mail_service: how the API and the worker send mail. MAIL_SINK_URL is where people and tests read it.
describe_mail_service() {
  mail_sink=http://127.0.0.1:$MAIL_PAGE_PORT
  mail_service=(SMTP_URL="smtp://127.0.0.1:$SMTP_PORT" MAIL_FROM='Thudline <bench@thudline.example>')
}
