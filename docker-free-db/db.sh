#!/usr/bin/env bash
# A PostgreSQL cluster on loopback from Debian's packages, without a container.
#
#   db.sh start    make the cluster when there is none, start it, print its address
#   db.sh stop     stop it
#   db.sh status   say whether it runs
#   db.sh url      print the address of the owner role
#   db.sh reset    stop it and delete its data
#
# WADESTONE_DATA names the data folder. As root the server is run as the user postgres.
set -euo pipefail

here=$(cd "$(dirname "$0")" && pwd)
checkout=$(dirname "$here")
key=$(printf '%s' "$checkout" | cksum | cut -d' ' -f1)

as_db_user() {
  if [ "$(id -u)" = 0 ]; then
    (cd / && setpriv --reuid=postgres --regid=postgres --init-groups "$@")
  else
    "$@"
  fi
}

find_bin() {
  local dir
  for dir in /usr/lib/postgresql/*/bin; do
    [ -x "$dir/initdb" ] && bin=$dir
  done
  if [ -z "${bin:-}" ]; then
    echo "PostgreSQL is not installed: the package postgresql is missing. Install it with: apt-get install postgresql" >&2
    exit 3
  fi
}

reachable() { as_db_user test -x "$1" 2>/dev/null; }

data_folder() {
  if [ -n "${WADESTONE_DATA:-}" ]; then
    data=$WADESTONE_DATA
  elif mkdir -p "$here/data" 2>/dev/null && reachable "$here/data"; then
    data=$here/data
  elif [ "$(id -u)" = 0 ]; then
    data=/var/lib/wadestone/$key
  else
    data=${XDG_DATA_HOME:-$HOME/.local/share}/wadestone/$key
  fi
  mkdir -p "$data"
  if [ "$(id -u)" = 0 ]; then chown postgres:postgres "$data"; fi
  cluster=$data/cluster
}

free_port() {
  node -e 'const s=require("net").createServer();s.listen(0,"127.0.0.1",()=>{console.log(s.address().port);s.close()})'
}

port_taken() {
  node -e 'const s=require("net").createServer();s.once("error",()=>process.exit(0));s.listen(+process.argv[1],"127.0.0.1",()=>s.close(()=>process.exit(1)))' "$1"
}

running() { [ -f "$cluster/postmaster.pid" ] && as_db_user "$bin/pg_ctl" -D "$cluster" status >/dev/null 2>&1; }

owner_url() {
  printf 'postgres://wadestone_owner:%s@127.0.0.1:%s/wadestone\n' "$(cat "$data/owner-password")" "$(cat "$data/port")"
}

make_cluster() {
  # A folder left by a run that died in the middle is made anew: it holds no data yet.
  as_db_user rm -rf "$cluster"
  umask 077
  head -c 24 /dev/urandom | od -An -tx1 | tr -d ' \n' >"$data/owner-password"
  if [ "$(id -u)" = 0 ]; then chown postgres:postgres "$data/owner-password"; fi
  as_db_user "$bin/initdb" -D "$cluster" -U wadestone_owner --pwfile="$data/owner-password" \
    -A scram-sha-256 -E UTF8 --locale=C.UTF-8 >"$data/initdb.log" 2>&1 || {
    cat "$data/initdb.log" >&2
    exit 1
  }
  touch "$data/ready"
}

start() {
  find_bin
  if [ ! -f "$data/ready" ]; then make_cluster; fi
  if running; then
    owner_url
    return
  fi
  # After a hard kill the lock file names a process that is gone or is not ours.
  rm -f "$cluster/postmaster.pid"
  local port
  port=$(cat "$data/port" 2>/dev/null || echo 0)
  if [ "$port" = 0 ] || port_taken "$port"; then port=$(free_port); fi
  printf '%s' "$port" >"$data/port"
  as_db_user "$bin/pg_ctl" -D "$cluster" -w -t 60 -l "$cluster/server.log" \
    -o "-p $port -c listen_addresses=127.0.0.1 -c unix_socket_directories=''" start >/dev/null
  make_database
  owner_url
}

make_database() {
  local psql=("$bin/psql" -h 127.0.0.1 -p "$(cat "$data/port")" -U wadestone_owner -d postgres -v ON_ERROR_STOP=1 -qtA)
  export PGPASSWORD
  PGPASSWORD=$(cat "$data/owner-password")
  if [ "$("${psql[@]}" -c "select 1 from pg_database where datname='wadestone'")" != 1 ]; then
    "${psql[@]}" -c 'create database wadestone'
  fi
}

stop() {
  find_bin
  if running; then as_db_user "$bin/pg_ctl" -D "$cluster" -m fast -w stop >/dev/null; fi
}

data_folder
case "${1:-}" in
  start) start ;;
  stop) stop ;;
  status) find_bin; if running; then echo "running at 127.0.0.1:$(cat "$data/port"), data in $data"; else echo "not running, data in $data"; exit 1; fi ;;
  url) owner_url ;;
  folder) echo "$data" ;;
  reset) stop; as_db_user rm -rf "$cluster"; rm -f "$data/ready" "$data/port" "$data/owner-password" ;;
  *) sed -n '2,10p' "$0" | sed 's/^# \{0,1\}//'; exit 2 ;;
esac
