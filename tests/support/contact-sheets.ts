/**
 * `npm run contact-sheets [-- FOLDER]`: draws every case in every view, palette and theme for a person to look
 * at, as HTML and PNG into FOLDER (`.data/contact-sheets` unless given).
 */
import { mkdirSync, writeFileSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { launchBrowser } from './browser.ts';
import { sheetPage } from './contact-sheets/page.ts';
import { contactSheets } from './contact-sheets/sheets.ts';

const folder = resolve(process.argv[2] ?? '.data/contact-sheets');
mkdirSync(folder, { recursive: true });
const browser = await launchBrowser();
try {
  const page = await browser.newPage({ viewport: { width: 1400, height: 900 } });
  for (const sheet of contactSheets())
    for (const theme of ['light', 'dark'] as const) {
      const file = join(folder, `${sheet.name} ${theme}`.replaceAll(' ', '-'));
      const html = sheetPage(sheet, theme);
      writeFileSync(`${file}.html`, html);
      await page.setContent(html);
      await page.evaluate(() => document.fonts.ready);
      await page.screenshot({ path: `${file}.png`, fullPage: true });
      process.stdout.write(`${file}.png\n`);
    }
} finally {
  await browser.close();
}
