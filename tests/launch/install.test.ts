import { chmodSync, existsSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { findPostgres, requirePostgres } from '@/db/cluster/binaries';

const silent = () => {};
const path = process.env.PATH;
let folder: string;
let places: { programs: string; clusterDefaults: string };

/** Puts a program of our own before the system's, so that nothing is installed here. */
const stand = (name: string, script: string): void => {
  writeFileSync(join(folder, 'bin', name), `#!/bin/sh\n${script}\n`);
  chmodSync(join(folder, 'bin', name), 0o755);
};

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'tarebook-install-'));
  mkdirSync(join(folder, 'bin'));
  places = { programs: join(folder, 'postgresql'), clusterDefaults: join(folder, 'createcluster.d') };
  process.env.PATH = `${join(folder, 'bin')}:${path}`;
  // An account that is not root asks sudo first.
  stand('sudo', '[ "$1" = -n ] && shift; exec "$@"');
});
afterEach(() => {
  process.env.PATH = path;
  rmSync(folder, { recursive: true });
});

test('a machine without PostgreSQL gets it from Debian, its package lists brought up to date first', () => {
  stand(
    'apt-get',
    `echo "$@" >> ${folder}/asked
     case "$*" in *install*)
       cat ${places.clusterDefaults}/* > ${folder}/defaults
       mkdir -p ${places.programs}/15/bin && touch ${places.programs}/15/bin/initdb ;;
     esac`,
  );
  expect(findPostgres(places.programs)).toBeNull();
  expect(requirePostgres(silent, places)).toBe(join(places.programs, '15/bin'));
  const asked = readFileSync(join(folder, 'asked'), 'utf8').trim().split('\n');
  expect(asked).toEqual([expect.stringMatching(/ update$/), expect.stringMatching(/ install -y .*\bpostgresql$/)]);
  // postgresql-common, createcluster.conf: with create_main_cluster = false the package makes no cluster of its own.
  expect(readFileSync(join(folder, 'defaults'), 'utf8')).toBe('create_main_cluster = false\n');
  expect(existsSync(join(places.clusterDefaults, 'no-main-cluster.conf'))).toBe(false);
});

test('what apt says is passed on when it cannot install', () => {
  stand('apt-get', 'echo "E: Unable to locate package postgresql" >&2; exit 100');
  expect(() => requirePostgres(silent, places)).toThrow(/could not install postgresql:\nE: Unable to locate/);
});

test('a package that is too old is not taken for the right one', () => {
  stand('apt-get', `mkdir -p ${places.programs}/13/bin && touch ${places.programs}/13/bin/initdb`);
  expect(() => requirePostgres(silent, places)).toThrow(/older than PostgreSQL 15/);
});

test('the newest installed version is taken, and nothing is installed', () => {
  stand('apt-get', 'exit 1');
  for (const version of ['9', '13', '15', '17']) {
    mkdirSync(join(places.programs, version, 'bin'), { recursive: true });
    writeFileSync(join(places.programs, version, 'bin/initdb'), '');
  }
  expect(requirePostgres(silent, places)).toBe(join(places.programs, '17/bin'));
});
