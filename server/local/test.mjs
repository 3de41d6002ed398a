import './checkNode.mjs';

const { runMain } = await import('./say.mjs');
const { testAll } = await import('./testAll.mjs');
await runMain(() => testAll(process.argv.slice(2)));
