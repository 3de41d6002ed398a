import './checkNode.mjs';

// `npm run bench [PART…]`: the figures in the README, measured on this machine.
const { join } = await import('node:path');
const { ensureBuild } = await import('./build.mjs');
const { ensurePackages } = await import('./packages.mjs');
const { root, testDist } = await import('./places.mjs');
const { show } = await import('./run.mjs');
const { runMain } = await import('./say.mjs');

await runMain(async () => {
  await ensurePackages();
  await ensureBuild(testDist);
  const script = join(root, 'tests/bench/index.ts');
  return show(process.execPath, ['--import', 'tsx', script, ...process.argv.slice(2)], {
    cwd: root,
    env: { ...process.env, NODE_ENV: 'production', BARMKIN_DIST: testDist },
  });
});
