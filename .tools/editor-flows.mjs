/** What a person does with the page: each flow begins with mixer.py of the examples open. */
import { join } from 'node:path';

const patience = { timeout: 60_000 };

export const pageFlows = {
  'a squiggle stands under the fault, and a hover by keyboard tells it': async (page, screenshots) => {
    await page.locator('.monaco-workbench').waitFor(patience);
    await goTo(page, 71, 13);
    await page.locator('.squiggly-error').first().waitFor(patience);
    await page.keyboard.press('Control+K');
    await page.keyboard.press('Control+I');
    const hover = page.locator('.monaco-hover:not(.hidden) .hover-contents', { hasText: 'rad/s' });
    await hover.first().waitFor(patience);
    if (screenshots) await page.screenshot({ path: join(screenshots, 'hover.png') });
  },

  'the problems are listed': async (page, screenshots) => {
    await goTo(page, 71, 13);
    await page.locator('.squiggly-error').first().waitFor(patience);
    await page.keyboard.press('Control+Shift+M');
    await page.locator('.markers-panel .monaco-list-row', { hasText: 'scale-mismatch' }).first().waitFor(patience);
    await page.locator('.markers-panel .monaco-list-row', { hasText: 'hidden-unit' }).first().waitFor(patience);
    if (screenshots) await page.screenshot({ path: join(screenshots, 'problems.png') });
  },

  'the restart stands among the commands': async (page) => {
    await goTo(page, 71, 13);
    await page.locator('.squiggly-error').first().waitFor(patience);
    await page.keyboard.press('F1');
    await page.locator('.quick-input-widget input').first().waitFor(patience);
    await page.keyboard.type('Termwise: Restart');
    await page.locator('.quick-input-list .monaco-list-row', { hasText: 'Restart the Language Server' }).first().waitFor(patience);
    await page.keyboard.press('Enter');
    await page.locator('.quick-input-widget').waitFor({ state: 'hidden', ...patience });
    await page.locator('.squiggly-error').first().waitFor(patience);
  },
};

async function goTo(page, line, column) {
  await page.locator('.view-line').first().waitFor(patience);
  await page.locator('.view-lines').first().click();
  await page.keyboard.press('Control+G');
  await page.locator('.quick-input-widget').waitFor(patience);
  await page.keyboard.type(`:${line}:${column}`);
  await page.keyboard.press('Enter');
  await page.locator('.quick-input-widget').waitFor({ state: 'hidden', ...patience });
}
