/* global document, getComputedStyle -- functions given to the page run in the browser */
// What the user sees, in each kind of theme: the squiggle, and the hover with a drawing that can be seen. Leaves
// pictures for human eyes.
import { mkdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { hover, leave, openInWorkbench, rest, restUntilDrawn, squiggleUnder } from './page.mjs';
import { screenshotFolder } from './paths.mjs';
import { writeFolderSettings } from './workbench.mjs';

const themes = [
  { kind: 'dark', name: 'Default Dark Modern', bodyClass: 'vs-dark' },
  { kind: 'light', name: 'Default Light Modern', bodyClass: 'vs' },
  { kind: 'high-contrast', name: 'Default High Contrast', bodyClass: 'hc-black' },
  { kind: 'high-contrast-light', name: 'Default High Contrast Light', bodyClass: 'hc-light' },
];

/** Graphical objects need 3:1; WCAG 2.1, success criterion 1.4.11. */
const leastContrast = 3;

/**
 * How the drawing in the open hover stands out: contrast ratio after WCAG 2.1 between its darkest ink and the
 * background under it, and whether all of it can be seen without scrolling sideways.
 */
async function drawingInHover(page) {
  const picture = page.locator(`${hover} img`).first();
  return picture.evaluate(async (img) => {
    await img.decode();
    const canvas = document.createElement('canvas');
    canvas.width = img.naturalWidth * 2;
    canvas.height = img.naturalHeight * 2;
    const ink = canvas.getContext('2d');
    ink.drawImage(img, 0, 0, canvas.width, canvas.height);
    const pixels = ink.getImageData(0, 0, canvas.width, canvas.height).data;
    let strongest = [0, 0, 0, 0];
    let inked = 0;
    for (let at = 0; at < pixels.length; at += 4) {
      if (pixels[at + 3] > 128) inked += 1;
      if (pixels[at + 3] > strongest[3]) strongest = [...pixels.slice(at, at + 4)];
    }
    let behind = img;
    while (/^rgba\(.*, 0\)$|^transparent$/.test(getComputedStyle(behind).backgroundColor)) {
      behind = behind.parentElement;
    }
    const background = getComputedStyle(behind)
      .backgroundColor.match(/[\d.]+/g)
      .map(Number);
    const luminance = (rgb) => {
      const [r, g, b] = rgb.slice(0, 3).map((value) => {
        const part = value / 255;
        return part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4;
      });
      return 0.2126 * r + 0.7152 * g + 0.0722 * b;
    };
    const [dark, light] = [luminance(strongest), luminance(background)].sort((a, b) => a - b);
    const box = img.getBoundingClientRect();
    const frame = img.closest('.monaco-hover').getBoundingClientRect();
    return {
      inked,
      contrast: (light + 0.05) / (dark + 0.05),
      colour: strongest,
      cut: box.left < frame.left || box.right > frame.right,
      width: box.width,
      height: box.height,
    };
  });
}

export async function checkLooks(tally, browser, workbench, extension, folder, file) {
  rmSync(screenshotFolder, { recursive: true, force: true });
  mkdirSync(screenshotFolder, { recursive: true });
  // Hovers fade in; the picture is of the end of it.
  const shoot = (page, name, clip) =>
    page.screenshot({ path: join(screenshotFolder, `${name}.png`), animations: 'disabled', clip });
  writeFolderSettings(folder, { 'workbench.colorTheme': themes[0].name });
  const page = await openInWorkbench(browser, workbench, folder, file, {
    extensionDevelopmentPath: workbench.uriOf(extension),
  });
  await tally.test('look: the fifth bond of a carbon atom is underlined', async () => {
    await squiggleUnder(page, 'CC(C)(C)(C)C', 1);
    await shoot(page, 'squiggle');
  });
  await tally.test('look: keys and values of a block have colours of their own', async () => {
    const colours = await page.evaluate(() =>
      [...document.querySelectorAll('.monaco-editor .view-line')]
        .filter((line) => line.textContent.replaceAll('\u00a0', ' ').startsWith('label: L-2'))
        .flatMap((line) =>
          [...line.querySelectorAll('span span')].map((span) => getComputedStyle(span).color),
        ),
    );
    if (new Set(colours).size < 2) throw new Error(`all of "label: L-2" is ${colours.join(', ')}`);
  });
  for (const { kind, name, bodyClass } of themes) {
    await tally.test(`look: the drawing stands out in a ${kind} theme, changed while running`, async () => {
      writeFolderSettings(folder, { 'workbench.colorTheme': name });
      await page.locator(`.monaco-workbench.${bodyClass}`).waitFor();
      await restUntilDrawn(page, 'COc1ccc(cc1)C(C)O');
      const drawing = await drawingInHover(page);
      await shoot(page, `hover-${kind}`);
      await leave(page);
      if (drawing.inked < 200) throw new Error(`hardly anything is drawn: ${JSON.stringify(drawing)}`);
      if (drawing.contrast < leastContrast) throw new Error(`too faint: ${JSON.stringify(drawing)}`);
      if (drawing.cut) throw new Error(`the drawing is cut: ${JSON.stringify(drawing)}`);
    });
  }
  for (const [what, text, character] of [
    ['finding', 'CC(C)(C)(C)C', 1],
    ['name', '1-(4-methoxyphenyl)ethan-1-ol'],
    ['formula', 'C9H12O2'],
  ]) {
    await tally.test(`look: resting the mouse on a ${what} says something`, async () => {
      await rest(page, text, character);
      await page.locator(hover).first().waitFor();
      // Whatever draws itself into the hover a moment later belongs into the picture.
      await page
        .locator(`${hover} img`)
        .first()
        .waitFor({ timeout: 3000 })
        .catch(() => undefined);
      await shoot(page, `hover-${what}`);
      await leave(page);
    });
  }
  await showPage(page, folder, shoot);
  await page.close();
}

/** The picture of the README: faults underlined, and the hover below the structure so that it covers none. */
async function showPage(page, folder, shoot) {
  writeFolderSettings(folder, {
    'workbench.colorTheme': 'Default Light Modern',
    'editor.minimap.enabled': false,
    'editor.hover.above': false,
    'workbench.sideBar.location': 'right',
  });
  await page.locator('.monaco-workbench.vs').waitFor();
  await page.keyboard.press('Control+b');
  await page.locator('.monaco-editor .minimap').waitFor({ state: 'hidden' });
  await restUntilDrawn(page, 'COc1ccc(cc1)C(C)O');
  await shoot(page, 'page', { x: 0, y: 35, width: 840, height: 650 });
}
