import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { root } from './project.mjs';
import { StopError, isInstalled, isRoot, must } from './shell.mjs';

/** @typedef {Record<string, { version?: string, optional?: boolean }>} Packages */

/** What npm itself wrote down after its last complete install. */
const installedLock = join(root, 'node_modules', '.package-lock.json');

/** @type {(text: string) => { packages: Packages }} */
const parseLock = JSON.parse;

const packagesIn = (/** @type {string} */ path) => parseLock(readFileSync(path, 'utf8')).packages;

/** Whether node_modules holds what the lock file asks for, development packages included. */
function packagesAreInstalled() {
  if (!existsSync(installedLock)) return false;
  const installed = packagesIn(installedLock);
  return Object.entries(packagesIn(join(root, 'package-lock.json'))).every(([path, wanted]) => {
    if (path === '') return true;
    const found = installed[path];
    return found === undefined ? wanted.optional === true : found.version === wanted.version;
  });
}

/** Installs the npm packages where the lock file asks for others than are there. */
export async function ensureNpmPackages() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);
  if (major < 20 || (major === 20 && minor < 19)) {
    throw new StopError(`Node 20.19 or newer is needed; this is ${process.versions.node}.`);
  }
  if (packagesAreInstalled()) return;
  console.log('Installing npm packages …');
  await must('Installing npm packages', 'npm', ['ci', '--include=dev', '--no-audit', '--no-fund']);
}

/** Debian's package for a program, in the order they are asked for. */
const debianPackages = {
  chromium: 'chromium',
  pdftoppm: 'poppler-utils',
  qpdf: 'qpdf',
  pdfposter: 'pdfposter',
  'rsvg-convert': 'librsvg2-bin',
};

const hasPostgres = () => existsSync('/usr/lib/postgresql') || isInstalled('initdb');

/**
 * Installs Debian's packages as root; an ordinary user is told the one command.
 * @param {'serve' | 'test'} purpose
 */
export async function ensureDebianPackages(purpose) {
  const missing = hasPostgres() ? [] : ['postgresql'];
  if (purpose === 'test') {
    for (const [program, name] of Object.entries(debianPackages)) {
      if (!isInstalled(program)) missing.push(name);
    }
  }
  if (missing.length === 0) return;
  const names = missing.join(' ');
  const byHand = `apt-get update && apt-get install -y ${names}`;
  if (!isRoot()) {
    throw new StopError(
      `These Debian packages are missing: ${names}.\nRun this once:\n\n  sudo sh -c '${byHand}'\n`,
    );
  }
  if (!isInstalled('apt-get')) {
    throw new StopError(`These programs are missing, and this is not Debian: ${names}.`);
  }
  console.log(`Installing Debian packages: ${names} …`);
  const env = { DEBIAN_FRONTEND: 'noninteractive' };
  const wait = ['-o', 'DPkg::Lock::Timeout=600', '-q'];
  await must('Reading the package lists', 'apt-get', [...wait, 'update'], { env });
  await must(
    'Installing Debian packages',
    'apt-get',
    [...wait, 'install', '-y', '--no-install-recommends', ...missing],
    { env },
  );
}
