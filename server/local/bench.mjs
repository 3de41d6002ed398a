import './checkNode.mjs';

// `npm run bench [PART…]`: the figures in the README, measured on this machine.
const { join } = await import('node:path');
const { ensureBuild } = await import('./build.mjs');
const { ensurePackages } = await import('./packages.mjs');
const { root, testDist, testHome } = await import('./places.mjs');
const { show } = await import('./run.mjs');
const { runMain } = await import('./say.mjs');
const { joinCluster } = await import('./sharedCluster.mjs');

await runMain(async () => {
  await ensurePackages();
  await ensureBuild(testDist);
  // A cluster with PostgreSQL's own settings: a write counts when it is on the disk.
  const { cluster, leave } = await joinCluster(`${testHome}-bench`, []);
  try {
    const script = join(root, 'tests/bench/index.ts');
    return await show(process.execPath, ['--import', 'tsx', script, ...process.argv.slice(2)], {
      cwd: root,
      env: {
        ...process.env,
        NODE_ENV: 'production',
        BENCH_CLUSTER: cluster.url(''),
        BARMKIN_DIST: testDist,
      },
    });
  } finally {
    await leave();
  }
});
