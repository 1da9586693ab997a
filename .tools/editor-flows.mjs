/** What a person does with the page: each flow begins with mixer.py of the examples open. */
import { join } from 'node:path';

const patience = { timeout: 60_000 };

/** Where something does not come, the page as it is then says why. */
export async function lastLook(page, screenshots, name) {
  if (screenshots) await page.screenshot({ path: join(screenshots, `failed-${name.replace(/\W+/g, '-')}.png`) });
}

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

  'the light bulb offers what settles the finding': async (page, screenshots) => {
    await goTo(page, 71, 13);
    await page.locator('.squiggly-error').first().waitFor(patience);
    await openMenu(page, /pi/);
    if (screenshots) await page.screenshot({ path: join(screenshots, 'fixes.png') });
    await page.keyboard.press('Enter');
    await page.locator('.view-line', { hasText: 'pi' }).first().waitFor(patience);
    await page.locator('.squiggly-error').first().waitFor({ state: 'detached', ...patience });
    await page.keyboard.press('Control+Z');
    await page.locator('.squiggly-error').first().waitFor(patience);
  },

  'units that follow and counts stand in the text': async (page, screenshots) => {
    await goTo(page, 71, 1);
    await page.locator('.squiggly-error').first().waitFor(patience);
    await page.locator('.codelens-decoration:visible', { hasText: /units.known/ }).first().waitFor(patience);
    await page.locator('.statusbar-item', { hasText: /Units.\d/ }).first().waitFor(patience);
    if (screenshots) await page.screenshot({ path: join(screenshots, 'hints.png') });
  },

  'a note is completed with the unit that follows': async (page, screenshots) => {
    await goTo(page, 71, 40);
    await page.locator('.squiggly-error').first().waitFor(patience);
    await page.keyboard.press('End');
    await page.keyboard.press('Enter');
    await page.keyboard.type('M_max = 1.5 * M  # [');
    await page.locator('.suggest-widget.visible .monaco-list-row', { hasText: 'N m' }).first().waitFor(patience);
    if (screenshots) await page.screenshot({ path: join(screenshots, 'completion.png') });
  },

  'a sentence becomes groups': async (page, screenshots) => {
    await goTo(page, 71, 1);
    await page.locator('.squiggly-error').first().waitFor(patience);
    await page.keyboard.press('Control+End');
    await page.keyboard.press('Enter');
    await page.keyboard.type('# P depends on N, D, rho, mu');
    await page.keyboard.press('Escape');
    await openMenu(page, /dimensionless.groups/);
    if (screenshots) await page.screenshot({ path: join(screenshots, 'groups.png') });
    await page.keyboard.press('Enter');
    await page.locator('.view-line', { hasText: 'Reynolds number' }).first().waitFor(patience);
  },

  'symbols without a unit are listed': async (page, screenshots) => {
    await goTo(page, 71, 1);
    await page.locator('.squiggly-error').first().waitFor(patience);
    await page.keyboard.press('Control+P');
    await page.locator('.quick-input-widget input').first().waitFor(patience);
    await page.keyboard.type('trial.py');
    await page.locator('.quick-input-list .monaco-list-row', { hasText: 'trial.py' }).first().waitFor(patience);
    await page.keyboard.press('Enter');
    await page.locator('.tab.active', { hasText: 'trial.py' }).first().waitFor(patience);
    await page.keyboard.press('F1');
    await page.locator('.quick-input-widget input').first().waitFor(patience);
    await page.keyboard.type('Focus on Symbols without a Unit');
    await page.locator('.quick-input-list .monaco-list-row', { hasText: 'Symbols without a Unit' }).first().waitFor(patience);
    await page.keyboard.press('Enter');
    await page.locator('.pane-header', { hasText: 'Symbols without a Unit' }).first().waitFor(patience);
    await page.locator('.pane-body .monaco-list-row', { hasText: /used/ }).first().waitFor(patience);
    if (screenshots) await page.screenshot({ path: join(screenshots, 'coverage.png') });
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

/** The menu of the light bulb with a row of these words; asked for again where the editor was not ready for it. */
async function openMenu(page, words) {
  const row = page.locator('.action-widget .monaco-list-row', { hasText: words }).first();
  for (let tries = 0; tries < 20; tries++) {
    await page.keyboard.press('Control+.');
    const came = await row.waitFor({ timeout: 3000 }).then(() => true, () => false);
    if (came) return;
    await page.keyboard.press('Escape');
  }
  throw new Error(`no row with ${words} in the menu`);
}

/** Those that are tried with the server in a worker, too. */
export const webFlows = ['a squiggle stands under the fault, and a hover by keyboard tells it', 'the light bulb offers what settles the finding'];

async function goTo(page, line, column) {
  await page.locator('.view-line').first().waitFor(patience);
  await page.locator('.view-lines').first().click();
  await page.keyboard.press('Control+G');
  await page.locator('.quick-input-widget').waitFor(patience);
  await page.keyboard.type(`:${line}:${column}`);
  await page.keyboard.press('Enter');
  await page.locator('.quick-input-widget').waitFor({ state: 'hidden', ...patience });
}
