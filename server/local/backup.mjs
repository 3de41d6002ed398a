import './checkNode.mjs';

const { resolve, join } = await import('node:path');
const { existsSync } = await import('node:fs');
const { writeBackup } = await import('./archive.mjs');
const { home } = await import('./places.mjs');
const { readArguments, runMain, say, Sentence } = await import('./say.mjs');
const { withDatabase } = await import('./withDatabase.mjs');

await runMain(async () => {
  const { has, rest } = readArguments(process.argv.slice(2), ['--before-migration'], 1);
  const at = new Date().toISOString().slice(0, 19).replace('T', '-').replaceAll(':', '');
  const name = `${has('--before-migration') ? 'before-migration' : 'barmkin'}-${at}.tar`;
  const backups = process.env.BACKUPS_DIR || join(home, 'backups');
  const file = rest[0] === undefined ? join(backups, name) : resolve(rest[0]);
  if (existsSync(file)) throw new Sentence(`${file} is there already: choose another name.`);
  await withDatabase('npm run backup', (database, photosDir) =>
    writeBackup(database, photosDir, file),
  );
  say(`Backed up to ${file}`);
});
