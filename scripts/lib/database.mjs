/**
 * A private MariaDB server for one data folder: `<home>/mariadb`. A server that already runs on it is used
 * and left running; one that we start is stopped again by whoever opened it.
 */
import {
  existsSync,
  mkdirSync,
  mkdtempSync,
  readFileSync,
  realpathSync,
  renameSync,
  rmSync,
  writeFileSync,
} from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { setTimeout as wait } from "node:timers/promises";
import * as mariadb from "./mariadb.mjs";
import { lastLines, Problem, say } from "./output.mjs";
import { firstFreePort } from "./ports.mjs";
import { commandLine, hasEnded, isRunning } from "./process.mjs";

const longestSocketPath = 100; // The system cuts off at about 107 bytes.
const patience = { start: 120_000, stop: 60_000 };

/**
 * Makes sure a server runs on the data folder.
 * @param {object} options
 * @param {string} options.home the folder that holds, or will hold, `mariadb`
 * @param {number} options.port where to begin looking for a free port
 * @param {{ databaseRoot: string, databaseApp: string }} options.secrets
 * @param {string[]} options.databases the databases to create
 * @param {boolean} [options.forgetful] fast and careless, for tests
 * @param {AbortSignal} [options.interrupt]
 */
export async function openDatabase(options) {
  const { home, secrets, databases, forgetful = false, interrupt } = options;
  const programs = await mariadb.findPrograms(interrupt);
  const paths = pathsOf(home);
  const running = await findRunningServer(programs, paths, secrets, interrupt);
  if (running) {
    say("Database", `already running on 127.0.0.1:${running.port}`);
    return handle(programs, running.port, secrets, async () => {});
  }

  mkdirSync(paths.folder, { recursive: true, mode: 0o700 });
  if (!existsSync(paths.data)) say("Database", "making its data directory");
  await mariadb.makeDataDirectory(programs, paths.data, interrupt);
  if (existsSync(paths.log)) renameSync(paths.log, paths.previousLog);
  writeFileSync(paths.firstStatements, mariadb.firstStatements(secrets, databases), { mode: 0o600 });

  const port = await firstFreePort(options.port);
  const sockets = socketFolder(paths.folder);
  const child = mariadb.spawnServer(programs.server, {
    dataDirectory: paths.data,
    port,
    socket: join(sockets, "server.sock"),
    pidFile: paths.pidFile,
    log: paths.log,
    firstStatements: paths.firstStatements,
    forgetful,
  });
  writeFileSync(paths.record, JSON.stringify({ pid: child.pid, port }));
  const close = async () => {
    await stopServer(child.pid);
    rmSync(paths.record, { force: true });
    if (sockets !== paths.folder) rmSync(sockets, { recursive: true, force: true });
  };
  try {
    await untilReady(programs, paths, { pid: child.pid, port }, secrets, interrupt);
  } catch (error) {
    await close();
    throw error;
  } finally {
    rmSync(paths.firstStatements, { force: true });
  }
  say("Database", `started on 127.0.0.1:${port}`);
  return handle(programs, port, secrets, close);
}

/** Stops the server that runs on a data folder, whoever started it; false when none runs. */
export async function stopDatabase(home) {
  const paths = pathsOf(home);
  const record = readRecord(paths);
  if (!record || !isRunning(record.pid) || !servesFolder(record.pid, paths)) return false;
  await stopServer(record.pid);
  rmSync(paths.record, { force: true });
  return true;
}

function handle(programs, port, secrets, close) {
  const access = { port, password: secrets.databaseApp };
  return {
    /** The address of one of its databases. */
    url: (name) => mariadb.databaseUrl(access, name),
    /** Empties a database by dropping and creating it. */
    async recreate(name) {
      const sql = `DROP DATABASE IF EXISTS \`${name}\`;\n${mariadb.createDatabase(name)}`;
      const { code, output } = await mariadb.query(programs, access, sql);
      if (code !== 0) throw new Problem(`The database ${name} could not be created.`, { details: output });
    },
    /** Stops the server, if opening it started it. */
    close,
  };
}

function pathsOf(home) {
  const folder = join(home, "mariadb");
  return {
    folder,
    data: join(folder, "data"),
    record: join(folder, "server.json"),
    pidFile: join(folder, "server.pid"),
    log: join(folder, "server.log"),
    previousLog: join(folder, "server.previous.log"),
    firstStatements: join(folder, "first-statements.sql"),
  };
}

function readRecord(paths) {
  try {
    return JSON.parse(readFileSync(paths.record, "utf8"));
  } catch {
    return undefined;
  }
}

/** The server of an earlier start, when it still runs on our data. A record left by a crash is dropped. */
async function findRunningServer(programs, paths, secrets, interrupt) {
  const record = readRecord(paths);
  if (!record) return undefined;
  if (isRunning(record.pid) && servesFolder(record.pid, paths)) {
    await untilReady(programs, paths, record, secrets, interrupt);
    return record;
  }
  rmSync(paths.record, { force: true });
  return undefined;
}

/** Whether a process is a server of our data: after a crash its number may belong to something else. */
function servesFolder(pid, paths) {
  return `${commandLine(pid).trim()} `.includes(` --datadir=${paths.data} `);
}

/** Waits until the server lets the app's account in and says that it serves our data. */
async function untilReady(programs, paths, { pid, port }, secrets, interrupt) {
  const deadline = performance.now() + patience.start;
  const access = { port, password: secrets.databaseApp };
  while (pid !== undefined && isRunning(pid) && performance.now() < deadline) {
    interrupt?.throwIfAborted();
    const { code, stdout } = await mariadb.query(programs, access, "SELECT @@datadir");
    if (code === 0 && isSameFolder(stdout.trim(), paths.data)) return;
    await wait(150);
  }
  interrupt?.throwIfAborted();
  throw new Problem("The database did not start.", {
    details: existsSync(paths.log) ? lastLines(readFileSync(paths.log, "utf8")) : "",
    todo:
      `read the lines above (the whole log is ${paths.log}). Often the disk is full, or another program ` +
      "uses the same data. To begin again with empty data: `node scripts/reset.mjs`",
  });
}

function isSameFolder(one, other) {
  try {
    return realpathSync(one) === realpathSync(other);
  } catch {
    return false;
  }
}

/** Asks a server to end and waits for it. It is never killed: it may be writing. */
async function stopServer(pid) {
  if (pid === undefined || !isRunning(pid)) return;
  process.kill(pid, "SIGTERM");
  if (await hasEnded(pid, patience.stop)) return;
  say("Database", `still busy ending (process ${pid}); it goes on without us`);
}

/** Where the socket goes: beside the data, or in a short temporary folder when that path is too long. */
function socketFolder(folder) {
  if (Buffer.byteLength(join(folder, "server.sock")) <= longestSocketPath) return folder;
  return mkdtempSync(join(tmpdir(), "plumbay-"));
}
