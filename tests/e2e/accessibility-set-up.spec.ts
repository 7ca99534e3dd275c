import { expectNoViolation } from './support/accessible';
import { expect, test } from './support/fixtures';

test.use({ flags: [] });

test('accessible: set-up of an empty post, also with errors', async ({ windows }) => {
  const desk = await windows.open('desk');
  await desk.goto('/');
  await expect(desk).toHaveURL(/\/set-up$/);
  await expectNoViolation(desk, 'set-up');
  await desk.getByRole('button', { name: 'Set up' }).click();
  await expect(desk.locator('[aria-invalid="true"]').first()).toBeVisible();
  await expectNoViolation(desk, 'set-up with errors');
});
