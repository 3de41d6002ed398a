import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { findChromium } from './chromium.mjs';
import { root } from './places.mjs';
import { must } from './run.mjs';
import { runMain, say } from './say.mjs';

/**
 * Draws the icons of the installed app from `icon.svg`, once after the mark was changed:
 * `node server/local/drawIcons.mjs`. What it draws is committed.
 */

const folder = join(root, 'src/public');
const mark = readFileSync(join(folder, 'icon.svg'), 'utf8');
const ground = /fill="(#[0-9a-f]{6})"/.exec(mark)?.[1] ?? '';

/**
 * A phone cuts its own shape out of a maskable icon: what counts stays within a circle of 40 % of
 * the width (W3C, Web Application Manifest, "Icon masks"), so the mark is drawn smaller there.
 */
const ICONS = [
  { file: 'icon-192.png', size: 192, share: 1, ground: 'transparent' },
  { file: 'icon-512.png', size: 512, share: 1, ground: 'transparent' },
  { file: 'icon-maskable-512.png', size: 512, share: 0.8, ground },
  { file: 'apple-touch-icon.png', size: 180, share: 0.92, ground },
];

/** @param {(typeof ICONS)[number]} icon */
function pageOf(icon) {
  const side = icon.size * icon.share;
  const inset = (icon.size - side) / 2;
  return `<body style="margin:0;background:${icon.ground}"><div style="position:absolute;left:${inset}px;top:${inset}px;width:${side}px;height:${side}px">${mark}</div></body>`;
}

async function drawAll() {
  const chromium = await findChromium();
  const work = mkdtempSync(join(tmpdir(), 'barmkin-icons-'));
  try {
    for (const icon of ICONS) {
      const page = join(work, `${icon.file}.html`);
      writeFileSync(page, pageOf(icon));
      await must(`Drawing ${icon.file}`, chromium, [
        '--headless',
        '--no-sandbox',
        '--disable-gpu',
        '--disable-dev-shm-usage',
        '--hide-scrollbars',
        '--default-background-color=00000000',
        `--user-data-dir=${join(work, 'profile')}`,
        `--window-size=${icon.size},${icon.size}`,
        `--screenshot=${join(folder, icon.file)}`,
        pathToFileURL(page).href,
      ]);
      say(`Drew ${icon.file}`);
    }
  } finally {
    rmSync(work, { recursive: true, force: true });
  }
}

await runMain(drawAll);
