import './checkNode.mjs';

const { resolve } = await import('node:path');
const { existsSync } = await import('node:fs');
const { readBackup } = await import('./archive.mjs');
const { confirm, readArguments, runMain, say, Sentence } = await import('./say.mjs');
const { withDatabase } = await import('./withDatabase.mjs');

await runMain(async () => {
  const { has, rest } = readArguments(process.argv.slice(2), ['--yes'], 1);
  if (rest[0] === undefined) throw new Sentence('Which file? npm run restore FILE');
  const file = resolve(rest[0]);
  if (!existsSync(file)) throw new Sentence(`There is no file ${file}.`);
  await confirm('This puts the backup in place of everything that is there now.', has('--yes'));
  await withDatabase('npm run restore', async (database, photosDir) => {
    const manifest = await readBackup(database, photosDir, file);
    say(`Restored what was backed up at ${manifest.madeAt}`);
  });
});
