#!/usr/bin/env bash
# `npm run make-admin -- mail@…`: whoever joined with that address runs the installation from now on. Where the
# environment names a database it is that one; else the one that ./docker-free-dev.sh keeps on this machine, while it runs.
set -Eeuo pipefail
root=$(cd "$(dirname "${BASH_SOURCE[0]}")/../../.." && pwd -P)
settings=$root/.data/settings.json

if [[ -z ${DATABASE_URL:-} ]]; then
  [[ -f $settings ]] || {
    echo "Start Thudline first (./docker-free-dev.sh), or set DATABASE_URL and the other settings." >&2
    exit 1
  }
  kept() { node -p 'JSON.parse(require("fs").readFileSync(process.argv[1], "utf8"))[process.argv[2]]' "$settings" "$1"; }
  # Only the database is asked; the rest has to be there.
  export DATABASE_URL=postgresql://thudline:$(kept DATABASE_PASSWORD)@127.0.0.1:$(kept POSTGRES_PORT)/thudline
  export S3_BUCKET=unused S3_ACCESS_KEY=unused S3_SECRET_KEY=unused SCRATCH_DIR=/unused PUBLIC_URL=http://127.0.0.1
  export JWT_SECRET=unused-by-this-command-but-long-enough
fi
exec node "$root/apps/api/dist/make-admin.js" "$@"
