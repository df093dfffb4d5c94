/**
 * What a browser has to load of JavaScript before each page can be read, gzip, from Vite's manifest of the last build:
 * the entry, the page, and everything they import statically. What a page loads afterwards is listed beside it.
 * Fails when a page is heavier than its budget.
 */
import { readFileSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { gzipSync } from 'node:zlib';

/** kB are 1,000 bytes. A shared sheet is opened on phones, by people who have none of it in their cache. */
const budgetKb = { every: 250, 'src/pages/SharedPage.tsx': 200 };
const dist = resolve(import.meta.dirname, '../dist');

function readManifest() {
  try {
    return JSON.parse(readFileSync(join(dist, '.vite/manifest.json'), 'utf8'));
  } catch (error) {
    throw new Error(`There is no build to weigh (${error.message}). Build first: npm run build.`);
  }
}

const manifest = readManifest();

/** Keys of the manifest: these and all they import, directly or not. */
function withImports(keys, seen = new Set()) {
  for (const key of keys.filter((wanted) => !seen.has(wanted))) {
    seen.add(key);
    withImports(manifest[key].imports ?? [], seen);
  }
  return seen;
}

const gzipBytes = new Map();
function weightKb(keys) {
  let bytes = 0;
  for (const file of new Set([...keys].map((key) => manifest[key].file))) {
    if (!gzipBytes.has(file)) gzipBytes.set(file, gzipSync(readFileSync(join(dist, file))).length);
    bytes += gzipBytes.get(file);
  }
  return bytes / 1000;
}

function weigh(entry, page) {
  const first = withImports([entry, page]);
  const laterKeys = [...first]
    .filter((key) => key !== entry)
    .flatMap((key) => manifest[key].dynamicImports ?? []);
  const later = [...withImports(laterKeys)].filter((key) => !first.has(key));
  return {
    page,
    firstKb: weightKb(first),
    laterKb: weightKb(later),
    budgetKb: budgetKb[page] ?? budgetKb.every,
  };
}

const entry = Object.keys(manifest).find((key) => manifest[key].isEntry);
const pages = (manifest[entry].dynamicImports ?? []).filter((key) => key.startsWith('src/pages/'));
if (pages.length === 0) throw new Error('The manifest names no page, so nothing was weighed.');

const rows = pages.map((page) => weigh(entry, page)).sort((a, b) => b.firstKb - a.firstKb);
for (const { page, firstKb, laterKb, budgetKb: budget } of rows) {
  const name = page.slice('src/pages/'.length).padEnd(24);
  const verdict = firstKb <= budget ? `fits ${budget}` : `is over its budget of ${budget}`;
  console.log(
    `${name} ${firstKb.toFixed(1).padStart(6)} kB first, ${laterKb.toFixed(1).padStart(5)} kB later; ${verdict}`,
  );
}
if (rows.some(({ firstKb, budgetKb: budget }) => firstKb > budget)) process.exitCode = 1;
