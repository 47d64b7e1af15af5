/**
 * Sets the checkout up, from nothing but Node 20: installs when the lock file changed, compiles the
 * kernel and builds when their sources changed, and is silent when there is nothing to do. Every npm script starts with it.
 * `prepare.mjs install` stops short of dist/. Digests, not times, decide what changed, so that a
 * fresh clone and a switched branch are told apart from an edited file that was put back.
 */
import { spawn } from "node:child_process";
import { createHash } from "node:crypto";
import * as fs from "node:fs";
import { tmpdir } from "node:os";
import { basename, dirname, join, relative } from "node:path";
import { setTimeout as sleep } from "node:timers/promises";
import { fileURLToPath } from "node:url";

const ROOT = fileURLToPath(new URL("..", import.meta.url));
const MODULES = join(ROOT, "node_modules");
const DIST = join(ROOT, "dist");
const INSTALLED = join(MODULES, ".flatlimit-stamp");
const BUILT = join(DIST, ".stamp");
/** The compiled kernel, as a module that holds its bytes: made here, not kept in the repository. */
const KERNEL = join(ROOT, "src", "kernel", "compiled.ts");
const LOCK = join(ROOT, ".config", ".prepare-lock");
const OWNERS = join(LOCK, "owners");
const BREAKING = `${LOCK}-breaking`;

const HEARTBEAT_MS = 2_000;
/** A lock whose owner has not been heard of for so long is nobody's. */
const STALE_MS = 60_000;
/** A lock without an owner's name yet: its owner is between two system calls, or died there. */
const NAMELESS_MS = 5_000;
/** What a program that is asked to end may take before it is killed. */
const GRACE_MS = 2_000;

/** The program that runs now. @type {import("node:child_process").ChildProcess | undefined} */
let worker;
/** The exit status, once a signal asked to end. @type {number | undefined} */
let interrupted;

/** @param {string} line */
const say = (line) => process.stderr.write(`set-up: ${line}\n`);

/** @param {string} line @returns {never} */
function fail(line) {
  say(line);
  process.exit(1);
}

/** @param {readonly string[]} paths files and folders, relative to the root */
function digest(paths) {
  const hash = createHash("sha256");
  /** @param {string} path */
  const add = (path) => {
    const full = join(ROOT, path);
    const found = fs.statSync(full, { throwIfNoEntry: false });
    if (found === undefined) return;
    if (found.isDirectory()) {
      for (const name of fs.readdirSync(full).sort()) add(`${path}/${name}`);
    } else {
      hash.update(`${path}\0${found.size}\0`).update(fs.readFileSync(full));
    }
  };
  paths.forEach(add);
  return hash.digest("hex");
}

/** A small file's text; undefined when it is not there (or no longer: others remove files too). @param {string} path */
function read(path) {
  try {
    return fs.readFileSync(path, "utf8").trim();
  } catch {
    return undefined;
  }
}

const lockFileDigest = () => digest(["package-lock.json"]);
const sourcesDigest = () => digest(["package-lock.json", "tsconfig.json", "src"]);
const kernelDigest = () =>
  digest(["package-lock.json", "src/kernel/assembly", "src/kernel/layout.ts"]);
const isInstalled = () => read(INSTALLED) === lockFileDigest();
const isKernelCompiled = () => read(KERNEL)?.includes(kernelDigest()) === true;
const isBuilt = () => read(BUILT) === sourcesDigest();

/**
 * Runs a program to its end; its output is shown only when it fails.
 * @param {string} what for the failure's line
 * @param {string} command
 * @param {readonly string[]} args
 */
async function run(what, command, args) {
  const shell = process.platform === "win32" && command === "npm";
  const child = spawn(command, args, { cwd: ROOT, shell, stdio: ["ignore", "pipe", "pipe"] });
  worker = child;
  writeOwners();
  /** @type {Buffer[]} */
  const output = [];
  child.stdout.on("data", (chunk) => output.push(chunk));
  child.stderr.on("data", (chunk) => output.push(chunk));
  const ended = await new Promise((resolve) => {
    child.once("error", (error) => resolve(error.message));
    child.once("close", (status, signal) => resolve(signal ?? status));
  });
  worker = undefined;
  if (interrupted !== undefined) process.exit(interrupted);
  if (ended === 0) return;
  process.stderr.write(Buffer.concat(output));
  fail(`${what} failed (${ended})`);
}

async function install() {
  const stamp = lockFileDigest();
  say("installing the dependencies of package-lock.json");
  fs.rmSync(INSTALLED, { force: true });
  fs.rmSync(BUILT, { force: true });
  const args = ["ci", "--no-audit", "--no-fund", "--ignore-scripts=false", "--include=dev"];
  const npm = process.env["npm_execpath"];
  if (npm !== undefined && basename(npm) === "npm-cli.js") {
    await run("npm ci", process.execPath, [npm, ...args]);
  } else {
    await run("npm ci", "npm", args);
  }
  fs.writeFileSync(INSTALLED, `${stamp}\n`);
}

/** Lets `npx flatlimit` find the command of this checkout. @param {string} main */
function linkCommand(main) {
  if (!fs.existsSync(main)) return;
  fs.chmodSync(main, 0o755);
  if (process.platform === "win32") return;
  const link = join(MODULES, ".bin", "flatlimit");
  fs.rmSync(link, { force: true });
  fs.symlinkSync(relative(dirname(link), main), link);
}

async function compileKernel() {
  say("compiling the kernel to WebAssembly");
  const stamp = kernelDigest();
  const compiler = join(MODULES, "assemblyscript", "bin", "asc.js");
  const folder = fs.mkdtempSync(join(tmpdir(), "flatlimit-"));
  const output = join(folder, "kernel.wasm");
  const options =
    "-O3 --noAssert --runtime stub --enable simd --enable threads --enable bulk-memory";
  const memory = "--importMemory --sharedMemory --initialMemory 1 --maximumMemory 65536";
  await run("the kernel's compiler", process.execPath, [
    compiler,
    ...["src/kernel/assembly/index.ts", "-o", output],
    ...options.split(" "),
    ...memory.split(" "),
  ]);
  const text = fs.readFileSync(output).toString("base64");
  fs.rmSync(folder, { recursive: true });
  const head = `/* Compiled from assembly/ by .config/prepare.mjs; sources ${stamp}. */`;
  fs.writeFileSync(KERNEL, `${head}\nexport const COMPILED_KERNEL =\n  "${text}";\n`);
}

async function build() {
  const stamp = sourcesDigest();
  say("building dist/ from src/");
  fs.rmSync(DIST, { recursive: true, force: true });
  const compiler = join(MODULES, "typescript", "bin", "tsc");
  await run("tsc", process.execPath, [compiler, "-p", "tsconfig.json"]);
  linkCommand(join(DIST, "cli", "main.js"));
  fs.mkdirSync(DIST, { recursive: true });
  fs.writeFileSync(BUILT, `${stamp}\n`);
}

/** Makes a folder; false when it is there already. @param {string} path */
function claim(path) {
  try {
    fs.mkdirSync(path);
    return true;
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code === "EEXIST") return false;
    throw error;
  }
}

/** @param {number} pid */
function isAlive(pid) {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return /** @type {NodeJS.ErrnoException} */ (error).code === "EPERM";
  }
}

/** @param {string} path */
const age = (path) => {
  const found = fs.statSync(path, { throwIfNoEntry: false });
  return found === undefined ? 0 : Date.now() - found.mtimeMs;
};

/** The processes that hold the lock: the set-up and, should it be killed, what it had started. */
const owners = () => (read(OWNERS) ?? "").split(" ").map(Number).filter(Boolean);

const isOurs = () => owners()[0] === process.pid;

function writeOwners() {
  fs.writeFileSync(OWNERS, [process.pid, worker?.pid ?? ""].join(" "));
}

function isStale() {
  const pids = owners();
  if (pids.length === 0) return age(LOCK) > NAMELESS_MS;
  return !pids.some(isAlive) || age(LOCK) > STALE_MS;
}

/** Breaks a stale lock; one process at a time, so that nobody breaks the lock that comes next. */
function breakStaleLock() {
  if (age(BREAKING) > STALE_MS) fs.rmSync(BREAKING, { recursive: true, force: true });
  if (!claim(BREAKING)) return;
  if (isStale()) fs.rmSync(LOCK, { recursive: true, force: true });
  fs.rmSync(BREAKING, { recursive: true, force: true });
}

async function takeLock() {
  let told = false;
  while (!claim(LOCK)) {
    if (isStale()) breakStaleLock();
    else if (!told) {
      say("waiting for another set-up of this checkout to end");
      told = true;
    }
    await sleep(200);
  }
  writeOwners();
  const beat = () => isOurs() && fs.utimesSync(LOCK, new Date(), new Date());
  setInterval(beat, HEARTBEAT_MS).unref();
  process.once("exit", () => isOurs() && fs.rmSync(LOCK, { recursive: true, force: true }));
  process.on("SIGINT", () => interrupt(130));
  process.on("SIGTERM", () => interrupt(143));
}

/** Ends when what runs has ended, lest it go on writing after the lock is gone. @param {number} status */
function interrupt(status) {
  interrupted = status;
  if (worker === undefined) process.exit(status);
  worker.kill();
  const dying = worker;
  setTimeout(() => dying.kill("SIGKILL"), GRACE_MS).unref();
}

const mode = process.argv[2] ?? "build";
if (mode !== "build" && mode !== "install") fail(`expected "build" or "install", got "${mode}"`);
if (Number(process.versions.node.split(".")[0]) < 20) {
  fail(`Node 20 or later is needed, this is ${process.versions.node}`);
}
const isReady = () => isInstalled() && isKernelCompiled() && (mode === "install" || isBuilt());
if (!isReady()) {
  await takeLock();
  if (!isInstalled()) await install();
  if (!isKernelCompiled()) await compileKernel();
  if (mode === "build" && !isBuilt()) await build();
}
