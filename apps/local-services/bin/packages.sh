# Installs what is missing, from Debian and npm only, and builds.

as_root() { if ((EUID == 0)); then "$@"; else sudo "$@"; fi; }

apt_get() {
  as_root env DEBIAN_FRONTEND=noninteractive apt-get -y --no-install-recommends -o DPkg::Lock::Timeout=120 "$@" \
    </dev/null >>"$log_dir/apt.log" 2>&1
}

# Each argument is `package:file that shows it is there`; the file may be a pattern.
install_missing_packages() {
  local missing=() pair wanted_packages
  for pair in "$@"; do
    compgen -G "${pair#*:}" >/dev/null || missing+=("${pair%%:*}")
  done
  ((${#missing[@]})) || return 0
  wanted_packages=${missing[*]}
  command -v apt-get >/dev/null || fail "Missing: $wanted_packages. Install it; without apt-get this script can't."
  ((EUID == 0)) || command -v sudo >/dev/null ||
    fail "Missing: $wanted_packages. You are not root and have no sudo; ask an administrator to install it."
  say "Installing $wanted_packages. This takes a minute or two."
  [[ " $wanted_packages " != *' postgresql '* ]] || forbid_main_cluster
  apt_get update || fail_with_log "$log_dir/apt.log" "The package lists could not be fetched; is the network there?"
  apt_get install "${missing[@]}" || fail_with_log "$log_dir/apt.log" "Installing $wanted_packages failed."
}

# Debian would make and start a cluster of its own on port 5432, which nobody asked for.
forbid_main_cluster() {
  local folder=/etc/postgresql-common/createcluster.d
  as_root mkdir -p "$folder"
  printf 'create_main_cluster = false\n' | as_root tee "$folder/90-thudline.conf" >/dev/null
}

# `npm ci` takes most of a minute, so it runs only when the lock file is another one than last time.
install_node_modules() {
  local stamp=$root/node_modules/.thudline-lock wanted
  wanted=$(sha256sum <"$root/package-lock.json")
  [[ -f $stamp && $(<"$stamp") == "$wanted" ]] && return
  say "Installing the Node packages. This takes a minute or two."
  (cd "$root" && npm ci --ignore-scripts --no-audit --no-fund) </dev/null >"$log_dir/npm.log" 2>&1 ||
    fail_with_log "$log_dir/npm.log" "Installing the Node packages failed."
  printf '%s\n' "$wanted" >"$stamp"
}

build() {
  local script=$1
  say "Building."
  (cd "$root" && npm run --silent "$script") </dev/null >"$log_dir/build.log" 2>&1 ||
    fail_with_log "$log_dir/build.log" "The build failed."
}
