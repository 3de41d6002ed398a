import './checkNode.mjs';

const { runMain } = await import('./say.mjs');
const { start } = await import('./startAll.mjs');
await runMain(() => start(process.argv.slice(2)));
