import { existsSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { shutDown } from '../processes/shutdown.mjs';
import { ensureBinaries } from './binaries.mjs';
import { startCluster } from './cluster.mjs';
import { dropDatabase, ensureDatabase } from './database.mjs';
import { runningPort } from './running-server.mjs';
import { sql } from './sql.mjs';
import { throwAwayFolder } from './throw-away.mjs';

const SECRETS = { ownerPassword: 'owner-1', appPassword: 'app-1' };
const LOST = { settings: ['fsync=off'] };
let place;
let bin;
let cluster;
let database;

const start = async () => {
  cluster = await startCluster(bin, { ...place, ...LOST });
  database = await ensureDatabase(bin, cluster, 'kept', SECRETS);
};

beforeAll(async () => {
  const folder = throwAwayFolder();
  place = { dataDir: join(folder, 'postgres'), secretFile: join(folder, 'postgres.json') };
  bin = await ensureBinaries();
  await start();
});

afterAll(shutDown);

describe('the private cluster', () => {
  it('keeps its password to its owner and lets nobody in without one', async () => {
    expect(statSync(place.secretFile).mode & 0o777).toBe(0o600);
    const wrong = cluster.url('postgres', 'postgres', 'wrong');
    await expect(sql(bin, wrong, 'SELECT 1')).rejects.toThrow(/password authentication failed/u);
  });

  it('listens on loopback only', async () => {
    const listens = await sql(bin, cluster.url('postgres'), 'SHOW listen_addresses');
    expect(listens.trim()).toBe('127.0.0.1');
  });

  it('has an application role that owns nothing and may create nothing', async () => {
    const facts = await sql(
      bin,
      cluster.url('postgres'),
      "SELECT rolsuper, rolcreatedb, rolcreaterole FROM pg_roles WHERE rolname LIKE 'tipward%'; " +
        "SELECT pg_get_userbyid(datdba) FROM pg_database WHERE datname = 'kept'",
    );
    expect(facts.trim().split('\n')).toEqual(['f|f|f', 'f|f|f', 'tipward_owner']);
    await expect(sql(bin, database.appUrl, 'CREATE TABLE mine (n int)')).rejects.toThrow(
      /permission denied/u,
    );
  });

  it('makes its database once', async () => {
    expect(database.created).toBe(true);
    expect((await ensureDatabase(bin, cluster, 'kept', SECRETS)).created).toBe(false);
  });

  it('keeps data and port over a restart', async () => {
    await sql(bin, database.ownerUrl, 'CREATE TABLE kept (n int); INSERT INTO kept VALUES (27)');
    const { port } = cluster;
    await cluster.stop();
    expect(runningPort(place.dataDir)).toBeNull();
    await start();
    expect(cluster.port).toBe(port);
    expect((await sql(bin, database.ownerUrl, 'SELECT n FROM kept')).trim()).toBe('27');
  });

  it('takes over a server that already runs', async () => {
    const again = await startCluster(bin, { ...place, leaveRunning: true });
    expect(again).toMatchObject({ wasRunning: true, port: cluster.port });
  });

  it('starts beside a lock file whose number belongs to another process, and on another port where its own is taken', async () => {
    await cluster.stop();
    writeFileSync(join(place.dataDir, 'postmaster.pid'), `${process.pid}\n${place.dataDir}\n`);
    const server = createServer();
    await new Promise((resolve) => server.listen(cluster.port, '127.0.0.1', resolve));
    const before = cluster.port;
    await start();
    expect(cluster.port).not.toBe(before);
    expect(JSON.parse(readFileSync(place.secretFile, 'utf8')).port).toBe(cluster.port);
    expect((await sql(bin, database.ownerUrl, 'SELECT n FROM kept')).trim()).toBe('27');
    await new Promise((resolve) => server.close(resolve));
  });

  it('drops its database when asked', async () => {
    await dropDatabase(bin, cluster, 'kept');
    expect((await ensureDatabase(bin, cluster, 'kept', SECRETS)).created).toBe(true);
  });

  it('leaves no socket folder behind', async () => {
    const { sockets } = JSON.parse(readFileSync(place.secretFile, 'utf8'));
    expect(existsSync(sockets)).toBe(true);
    await cluster.stop();
    expect(existsSync(sockets)).toBe(false);
  });
});
