import { expect, type Page } from '@playwright/test';
import { BENCH_PATHS } from './addresses';

/** The screens of a bench, in the order in which the story passes them. */
export type BenchScene =
  | 'bench-list'
  | 'bench-not-mine'
  | 'bench-pulling'
  | 'bench-void'
  | 'bench-keys'
  | 'bench-sign-off'
  | 'bench-ready'
  | 'bench-wrong-code'
  | 'bench-free'
  | 'bench-called'
  | 'bench-start'
  | 'bench-start-errors';

/**
 * An operator's way through bench 1 of a fresh rehearsal, by keyboard: takes over the half-run check
 * there, lets the simulated tester finish it, signs off, hands back, and takes the next tag up to its
 * start form. `scene` is called at each screen, while it stands still.
 */
export async function benchStory(
  bench: Page,
  scene: (name: BenchScene) => Promise<void>,
): Promise<void> {
  await bench.goto('/bench');
  await expect(bench.getByRole('link', { name: /Bench 1/ }).first()).toBeVisible();
  await scene('bench-list');
  await bench.goto(BENCH_PATHS[0]!);
  const take = bench.getByRole('button', { name: 'Take this bench' }).last();
  await expect(take).toBeVisible();
  await scene('bench-not-mine');
  await take.click();

  const pulling = bench.getByRole('region', { name: 'The pull in hand' });
  const offered = bench.getByRole('region', { name: 'From the tester' });
  const simulate = bench.getByRole('button', { name: /simulate/i }).first();
  const heading = (name: RegExp) => bench.getByRole('heading', { name });
  await expect(pulling).toBeVisible();
  const signOff = bench.getByRole('button', { name: /Sign off/ }).first();
  for (let pull = 0; !(await signOff.isVisible()); pull += 1) {
    await expect(simulate).toBeEnabled();
    await bench.keyboard.press('s');
    await expect(offered).toBeVisible();
    if (pull === 1) await midPull(bench, scene);
    await bench.keyboard.press('Enter');
    await expect(offered).toHaveCount(0);
    await expect(pulling.or(signOff).first()).toBeVisible();
  }
  await scene('bench-sign-off');
  await bench.keyboard.press('Control+Enter');
  const back = heading(/^Hand [A-Y]\d\d back$/);
  await expect(back).toBeVisible();
  await scene('bench-ready');
  const code = /[A-Y]\d\d/.exec(await back.innerText())![0];
  const ticketCode = bench.getByLabel('Code on the visitor’s ticket');
  await ticketCode.fill('A01');
  await bench.keyboard.press('Enter');
  await expect(bench.getByText(/Do not hand it over/).first()).toBeVisible();
  await scene('bench-wrong-code');
  await ticketCode.fill(code);
  await bench.keyboard.press('Enter');

  const call = bench.getByRole('button', { name: /^Call [A-Y]\d\d/ }).first();
  await expect(call).toBeVisible();
  await scene('bench-free');
  await call.click();
  const isHere = bench.getByRole('button', { name: /tool is here/i }).first();
  await expect(isHere).toBeVisible();
  await scene('bench-called');
  await bench.keyboard.press('Enter');
  const start = bench.getByRole('button', { name: /start the check/i }).first();
  await expect(start).toBeVisible();
  await scene('bench-start');
  await bench.keyboard.press('Control+Enter');
  await expect(bench.locator('[aria-invalid="true"]').first()).toBeVisible();
  await scene('bench-start-errors');
}

/** A value waits to be accepted: the two panels that can be open beside it. */
async function midPull(bench: Page, scene: (name: BenchScene) => Promise<void>): Promise<void> {
  await scene('bench-pulling');
  const panels = [
    { key: 'v', title: /What went wrong/, name: 'bench-void' },
    { key: '?', title: /All keys/, name: 'bench-keys' },
  ] as const;
  for (const { key, title, name } of panels) {
    const heading = bench.getByRole('heading', { name: title });
    await bench.keyboard.press(key);
    await expect(heading).toBeVisible();
    await scene(name);
    await bench.keyboard.press('Escape');
    await expect(heading).toHaveCount(0);
  }
}
