import type { Locator, Page } from 'playwright-core';

export interface WantedTags {
  product: string;
  hardware: string;
  firmware: string;
  state: string;
  bench: string;
  unit?: string;
}

/** The page where files become sweeps. */
export class ImportPage {
  constructor(private readonly page: Page) {}

  async chooseFiles(paths: readonly string[]): Promise<void> {
    await this.page.locator('input[type="file"]').setInputFiles([...paths]);
  }

  async fillTags({ product, hardware, firmware, state, bench, unit }: WantedTags): Promise<void> {
    await this.select('Product', product);
    await this.page.getByLabel('Hardware revision').fill(hardware);
    await this.page.getByLabel('Firmware revision').fill(firmware);
    await this.page.getByLabel('Operating state').first().fill(state);
    await this.page.keyboard.press('Escape');
    await this.select('Bench', bench);
    if (unit !== undefined) await this.page.getByLabel('Unit (optional)').fill(unit);
    await this.page.keyboard.press('Escape');
    await this.select('Levels in the files', 'Corrected levels');
  }

  /** Unfolds the card of a file. */
  async openFile(name: RegExp): Promise<void> {
    await this.page.getByRole('button', { name }).first().click();
  }

  saveButton(): Locator {
    return this.page.getByRole('button', { name: /^Save / });
  }

  /** Saves and waits until every file of the batch is worked through; returns the path of the batch. */
  async saveAndWait(): Promise<string> {
    await this.saveButton().click();
    await this.page.waitForURL(/\/import\/\d+/);
    await this.page
      .getByText(/^(Imported|Finished|Done)/i)
      .first()
      .waitFor();
    return new URL(this.page.url()).pathname;
  }

  private async select(label: string, option: string): Promise<void> {
    await this.page.getByRole('combobox', { name: label, exact: true }).click();
    await this.page.getByRole('option', { name: option }).click();
  }
}
