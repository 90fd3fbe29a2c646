import { existsSync } from 'node:fs';
import { chromium, type Browser } from 'playwright-core';

const INSTALLED = [
  '/usr/bin/chromium',
  '/usr/bin/chromium-browser',
  '/usr/bin/google-chrome',
  '/usr/bin/google-chrome-stable',
  '/usr/bin/microsoft-edge',
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
  '/Applications/Microsoft Edge.app/Contents/MacOS/Microsoft Edge',
  'C:\\Program Files\\Google\\Chrome\\Application\\chrome.exe',
  'C:\\Program Files (x86)\\Microsoft\\Edge\\Application\\msedge.exe',
];

const ARGUMENTS = ['--no-sandbox', '--disable-gpu', '--disable-background-networking', '--no-first-run'];

/**
 * Starts a browser with an empty profile: the one that `CHROME_PATH` names, else an installed one, else that of the
 * npm package `@sparticuz/chromium` where it is installed.
 * @throws Error that says what to install where there is none
 */
export async function launchChromium(): Promise<Browser> {
  const executablePath = process.env['CHROME_PATH'] ?? INSTALLED.find((file) => existsSync(file)) ?? (await packaged());
  return chromium.launch({ executablePath, args: ARGUMENTS });
}

async function packaged(): Promise<string> {
  process.env['AWS_EXECUTION_ENV'] ??= 'AWS_Lambda_nodejs20.x';
  const name = '@sparticuz/chromium';
  try {
    const { default: binary } = (await import(name)) as { default: { executablePath(): Promise<string> } };
    return await binary.executablePath();
  } catch {
    throw new Error(
      'no browser for the tests: set CHROME_PATH to a Chromium, install one, or run "npm install --no-save @sparticuz/chromium"',
    );
  }
}
