import { expect, test } from '@playwright/test'
import { expectAccessible } from './axe'

test('the method page describes every part of the method, from readings to a ranking', async ({ page }) => {
  await page.goto('/method')
  await expect(page).toHaveTitle(/Method 1/)
  const contents = page.getByRole('navigation', { name: 'On this page' }).getByRole('link')
  await expect(contents).toHaveCount(9)
  for (const link of await contents.all()) {
    const title = ((await link.textContent()) ?? '').trim()
    await link.click()
    await expect(page.getByRole('heading', { level: 2, name: title })).toBeInViewport()
  }
})

test('the method page says of each constant where it is from and how far to trust it', async ({ page }) => {
  await page.goto('/method')
  const table = page.getByRole('table', { name: 'Constants of the contrast reserve' })
  const row = table.getByRole('row').filter({ hasText: 'Reserve for fluent reading' })
  await expect(row.getByRole('cell')).toContainText(['10', 'Lovie-Kitchin', 'from memory'])
  await expect(page.getByRole('row').filter({ hasText: 'Page luminance a front light is turned up to' })).toContainText(
    'house',
  )
})

test.describe('without JavaScript', () => {
  test.use({ javaScriptEnabled: false })
  test('the method page is all there', async ({ page }) => {
    await page.goto('/method')
    await expect(page.getByRole('heading', { level: 2 })).toContainText(['Reading spots', 'What we do not know'])
  })
})

test('the method page is accessible in every theme', async ({ page }) => {
  await expectAccessible(page, '/method')
})
