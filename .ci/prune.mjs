// Takes out of the builds what has no source any more: a file that became a folder of the same name would otherwise be
// found before the folder, and a migration that was renamed would run twice.
import { existsSync, readdirSync, rmSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

const root = path.join(path.dirname(fileURLToPath(import.meta.url)), '..');
const BUILDS = [
  { build: 'common/dist', sources: 'common/src' },
  { build: 'backend/dist', sources: 'backend/src' },
  { build: 'database/dist', sources: 'database' },
];

for (const { build, sources } of BUILDS) {
  const folder = path.join(root, build);
  if (!existsSync(folder)) continue;
  for (const file of readdirSync(folder, { recursive: true })) {
    const name = /^(.+?)\.(?:js|js\.map|d\.ts|d\.ts\.map)$/.exec(file)?.[1];
    if (name && !existsSync(path.join(root, sources, `${name}.ts`))) rmSync(path.join(folder, file));
  }
}
