// Written for any Node that reads modules at all, so that an old one gets a sentence and not a syntax error.
const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);
if (major < 20 || (major === 20 && minor < 19)) {
  console.error(`Barmkin needs Node.js 20.19 or newer; this is ${process.versions.node}.`);
  process.exit(1);
}
