import AxeBuilder from '@axe-core/playwright';
import { expect, type Page, test } from '@playwright/test';

// A demo sign-in as `npm start` prints it.
const OFFICE = { email: 'office@brackenmoor.example', password: 'grey body, yellow shoulder' };

const signIn = async (page: Page) => {
  await page.goto('/sign-in?next=/imports');
  await page.getByLabel(/mail/i).fill(OFFICE.email);
  await page
    .getByLabel(/password/i)
    .first()
    .fill(OFFICE.password);
  await page.getByRole('button', { name: /sign in/i }).click();
  await page.waitForURL('**/imports');
};

/** A file whose dates and unit only a person can tell, with one row that is refused. */
const csv = (ref: string) =>
  [
    'Ticket,Date,Technician,Site,Appliance,Refrigerant,Nameplate,Recovered amount',
    `${ref}-1,03/04/2015,Pat Quill,Pier 9,CH-1,R410A,8.2,4.4`,
    `${ref}-2,05/06/2015,Pat Quill,Pier 9,CH-1,R410A,8.2,7.4`,
    `${ref}-3,05/06/2015,Pat Quill,Pier 9,CH-1,R-999,8.2,7.4`,
  ].join('\n');

test('a file is asked about, previewed, taken in and undone', async ({ page }) => {
  await signIn(page);
  const ref = `E2E-${Date.now()}`;
  await page.getByLabel(/choose a file/i).setInputFiles({
    name: `${ref}.csv`,
    mimeType: 'text/csv',
    buffer: Buffer.from(csv(ref)),
  });

  await expect(page.getByRole('heading', { level: 1 })).toContainText('2 questions');
  await page.getByRole('radio', { name: /^Day, month, year/ }).check();
  await page.getByRole('radio', { name: /^pounds \(lb\)/ }).check();
  await page.getByRole('button', { name: 'Read the file again' }).first().click();

  await expect(page.getByRole('heading', { level: 1 })).toContainText('2 of 3');
  await expect(page.getByText('“R-999” is no refrigerant of the catalogue.')).toBeVisible();
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect(violations).toEqual([]);

  await page
    .getByRole('button', { name: /^Take in 2/ })
    .first()
    .click();
  await expect(page.getByRole('heading', { level: 1 })).toContainText('2 records came in', { timeout: 30_000 });

  await page.getByRole('button', { name: 'Undo this import' }).click();
  await page.getByRole('button', { name: 'Undo it' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toContainText('was undone', { timeout: 30_000 });
});

test('a picture is refused where it was chosen', async ({ page }) => {
  await signIn(page);
  await page.getByLabel(/choose a file/i).setInputFiles({
    name: 'photo.csv',
    mimeType: 'text/csv',
    buffer: Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]),
  });
  await expect(page.getByText('“photo.csv” is a PNG picture.')).toBeVisible();
});
