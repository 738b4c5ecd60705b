import { readFile } from 'node:fs/promises';
import path from 'node:path';
import { chromium } from '@playwright/test';
import * as z from 'zod/mini';
import { root } from '#fakes/prepare.mjs';
import { startProgram } from './program.ts';
import { atMost, never, type Part } from './report.ts';

const client = path.join(root, 'dist/client');
const manifest = z.record(z.string(), z.object({ file: z.string() }));

/** Scripts that a browser loads until the first step stands there with its calendar. */
async function scriptsOfFirstStep(url: string): Promise<readonly string[]> {
  const browser = await chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: ['--no-sandbox', '--disable-gpu'],
  });
  try {
    const page = await browser.newPage();
    const scripts = new Set<string>();
    page.on('response', (response) => {
      if (response.request().resourceType() === 'script') {
        scripts.add(new URL(response.url()).pathname);
      }
    });
    await page.goto(`${url}/order/day`);
    await page.getByLabel('Number of people').fill('20');
    await page.getByText('Birthday', { exact: true }).click();
    await page.getByRole('grid').waitFor();
    await page.waitForLoadState('networkidle');
    return [...scripts];
  } finally {
    await browser.close();
  }
}

/** Files that only the staff's pages are made of, by the build's own list of sources. */
async function staffFiles(): Promise<ReadonlySet<string>> {
  const text = await readFile(path.join(client, '.vite/manifest.json'), 'utf8');
  return new Set(
    Object.entries(manifest.parse(JSON.parse(text)))
      .filter(([source]) => /\/(routes\/staff|app\/staff-)/.test(source))
      .map(([, { file }]) => `/${file}`),
  );
}

export const firstLoad: Part = {
  name: 'first-load',
  about: 'script that the wizard’s first step loads, the date picker included, gzipped',
  async run(note) {
    const program = await startProgram();
    try {
      const scripts = await scriptsOfFirstStep(program.url);
      const staff = await staffFiles();
      if (staff.size === 0) throw new Error('The build lists no page of the staff’s.');
      let total = 0;
      for (const script of scripts) {
        const { length } = await readFile(path.join(client, `${script}.gz`));
        note(`${(length / 1000).toFixed(1).padStart(6)} kB  ${path.basename(script)}`);
        total += length;
      }
      return [
        atMost('first step’s script, kB gzipped', 150, total / 1000),
        never(
          'a customer loads a page of the staff’s',
          scripts.filter((it) => staff.has(it)).length,
        ),
      ];
    } finally {
      await program.stop();
    }
  },
};
