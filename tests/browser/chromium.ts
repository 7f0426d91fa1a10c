import { existsSync } from 'node:fs';
import { type Browser, chromium } from 'playwright-core';

const installed = [
  process.env.CHROMIUM ?? '',
  '/usr/bin/chromium',
  '/usr/bin/chromium-browser',
  '/usr/bin/google-chrome',
  '/usr/bin/google-chrome-stable',
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
  '/Applications/Chromium.app/Contents/MacOS/Chromium',
  'C:\\Program Files\\Google\\Chrome\\Application\\chrome.exe',
];

/** A Chromium or Chrome already on the machine, else the one inside a development dependency (Linux). */
export const launch = async (): Promise<Browser> => {
  const args = [
    '--no-sandbox',
    '--disable-gpu',
    '--disable-quic',
    '--no-first-run',
    '--disable-background-networking',
    '--disable-component-update',
    '--disable-sync',
  ];
  const own = installed.find((path) => path && existsSync(path));
  try {
    if (own) return await chromium.launch({ executablePath: own, args, headless: true });
    const { default: shipped } = await import('@sparticuz/chromium');
    return await chromium.launch({
      executablePath: await shipped.executablePath(),
      args,
      headless: true,
    });
  } catch (cause) {
    throw new Error('No browser could be started: install Chromium or Chrome, or name one in CHROMIUM.', { cause });
  }
};
