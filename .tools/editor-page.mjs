/** A page with the workbench in it, in a browser without a window. */
import { existsSync } from 'node:fs';
import { format } from 'node:util';
import { chromium } from 'playwright-core';

const browsers = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome', '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome'];
const quiet = ['--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking', '--disable-component-update', '--disable-sync'];

export function hasBrowser() {
  return findBrowser() !== undefined;
}

/** The Chromium of this machine. Throws where there is none, and says what to do. */
export function browserExecutable() {
  const found = findBrowser();
  if (!found) throw new Error('There is neither a desktop VS Code (code) nor a Chromium here. Install chromium, or name one in TERMWISE_BROWSER.');
  return found;
}

function findBrowser() {
  return [process.env.TERMWISE_BROWSER, ...browsers].find((each) => each && existsSync(each));
}

/** Opens a workspace; `payload` is what the workbench takes from its address. `exit` holds the result of a suite. */
export async function openPage({ executablePath, workbench, workspace, payload, log }) {
  const browser = await chromium.launch({ executablePath, args: quiet });
  const page = await browser.newPage({ viewport: { width: 1280, height: 800 } });
  // What the page says of itself, for whoever looks for a fault.
  if (process.env.TERMWISE_PAGE_LOG) page.on('console', (message) => process.stderr.write(`${message.type()}: ${message.text()}\n`));
  const exit = new Promise((resolve) => void page.exposeFunction('codeAutomationExit', resolve));
  await page.exposeFunction('codeAutomationLog', (_type, args) => log(format(...args)));
  await page.goto(`http://${workbench.authority}/?folder=${encodeURI(workspace)}&payload=${encodeURIComponent(JSON.stringify(payload))}`);
  return { page, exit, close: () => browser.close() };
}
