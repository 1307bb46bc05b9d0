// What a person does with a workbench page: open a file, look for a squiggle, rest the mouse on a word.
/* global document, NodeFilter -- functions given to the page run in the browser */
import { join } from 'node:path';

/** Generous, for machines that do other things at the same time; nothing here measures speed. */
const patienceMs = 60_000;

/** Opens one file of `folder` in a workbench and waits until its text is on the screen. */
export async function openInWorkbench(browser, workbench, folder, file, payload = {}) {
  const page = await browser.newPage({ viewport: { width: 1280, height: 900 }, reducedMotion: 'reduce' });
  page.setDefaultTimeout(patienceMs);
  const url = workbench.urlOf(folder, { openFile: workbench.uriOf(join(folder, file)), ...payload });
  await page.goto(url);
  await page.locator('.monaco-editor .view-line').first().waitFor();
  return page;
}

/** The rectangle of the first place in the editor that shows `text`, in CSS pixels. */
export async function placeOf(page, text) {
  const found = await page.waitForFunction((wanted) => {
    for (const line of document.querySelectorAll('.monaco-editor .view-line')) {
      const walker = document.createTreeWalker(line, NodeFilter.SHOW_TEXT);
      const pieces = [];
      let whole = '';
      for (let node = walker.nextNode(); node; node = walker.nextNode()) {
        pieces.push({ node, start: whole.length });
        // The editor shows blanks as non-breaking ones.
        whole += node.data.replaceAll('\u00a0', ' ');
      }
      const at = whole.indexOf(wanted);
      if (at === -1) continue;
      const pieceAt = (offset) => pieces.findLast((piece) => piece.start <= offset);
      const [first, last] = [pieceAt(at), pieceAt(at + wanted.length - 1)];
      const range = document.createRange();
      range.setStart(first.node, at - first.start);
      range.setEnd(last.node, at + wanted.length - last.start);
      const { x, y, width, height } = range.getBoundingClientRect();
      return { x, y, width, height };
    }
    return undefined;
  }, text);
  return found.jsonValue();
}

/** Waits for an error's squiggle under one character of a text. */
export async function squiggleUnder(page, text, character) {
  const { x, y, width, height } = await placeOf(page, text);
  const middle = { x: x + (width * (character + 0.5)) / text.length, y: y + height / 2 };
  await page.waitForFunction(
    (point) =>
      [...document.querySelectorAll('.monaco-editor .squiggly-error')].some((squiggle) => {
        const box = squiggle.getBoundingClientRect();
        return box.left < point.x && point.x < box.right && box.top < point.y && point.y < box.bottom;
      }),
    middle,
  );
}

/** Rests the mouse on one character of a text, as a person would: not in one jump. */
export async function rest(page, text, character = Math.floor(text.length / 2)) {
  const { x, y, width, height } = await placeOf(page, text);
  const across = (width * (character + 0.5)) / text.length;
  await page.mouse.move(x + across - 40, y + height / 2 + 30);
  await page.mouse.move(x + across, y + height / 2, { steps: 8 });
}

export const hover = '.monaco-hover:not(.hidden)';

/**
 * Rests the mouse on a text until the hover has a picture: the first hovers after a start come without, while the
 * toolkit is loading, and a person comes back to the word.
 */
export async function restUntilDrawn(page, text) {
  const picture = page.locator(`${hover} img`).first();
  const deadline = Date.now() + patienceMs;
  do {
    await rest(page, text);
    const drawn = await picture.waitFor({ timeout: 4000 }).then(
      () => true,
      () => false,
    );
    if (drawn) return;
    await leave(page);
  } while (Date.now() < deadline);
  throw new Error(`the hover on ${text} never had a drawing`);
}

export async function leave(page) {
  await page.keyboard.press('Escape');
  await page.mouse.move(5, 5, { steps: 4 });
  await page.locator(hover).waitFor({ state: 'hidden' });
}
