import type { Locator } from 'playwright-core';
import type { SizeName } from './browser';
import type { Visitor } from './visitor';

/** The bench as a person works it, at either size. */
export class BenchPage {
  constructor(
    readonly visitor: Visitor,
    readonly size: SizeName,
  ) {}

  private get page() {
    return this.visitor.page;
  }

  async open(projectId: string): Promise<void> {
    await this.visitor.open(`/projects/${projectId}/bench`);
    await this.ready();
  }

  async ready(): Promise<void> {
    await this.page.getByRole('region', { name: 'Gains' }).waitFor();
    await this.chart(/Nyquist curve/).waitFor({ state: 'attached' });
  }

  chart(name: RegExp) {
    return this.page.getByRole('img', { name }).first();
  }

  /** What every chart says of itself: moves with the loop. */
  descriptions(): Promise<string[]> {
    const charts = this.page.getByRole('img', { name: /A, now/ });
    return charts.evaluateAll((images) => images.map((image) => image.getAttribute('aria-label') ?? ''));
  }

  /** What stands on top once it rests: while the room is looked for, dots stand in its place. */
  async strip(): Promise<string> {
    const strip = this.page.getByRole('region', { name: 'Verdict and margins' });
    await strip.filter({ hasNotText: '…' }).waitFor();
    return strip.innerText();
  }

  rule(gain: string) {
    return this.page.getByRole('slider', { name: new RegExp(`^${gain},`) }).first();
  }

  /** Where a gain can be seen by its name: its tile on a phone, its field on a wide screen. */
  gain(name: string) {
    return this.size === 'phone'
      ? this.page.getByRole('radio', { name: new RegExp(`^${name} `) })
      : this.page.getByRole('textbox', { name: new RegExp(`^${name},`) });
  }

  /** Opens All settings, does something there, and closes it. */
  async inSettings(change: (sheet: Locator) => Promise<void>): Promise<void> {
    await this.visitor.press('All settings');
    const sheet = this.page.getByRole('dialog', { name: 'All settings' });
    await sheet.waitFor();
    await change(sheet);
    await sheet.getByRole('button', { name: 'Close' }).click();
    await sheet.waitFor({ state: 'hidden' });
  }

  /** Makes one gain the one that rule and nudges move; on a wide screen each has its own. */
  async choose(gain: string): Promise<void> {
    if (this.size === 'phone') await this.page.getByRole('radio', { name: new RegExp(`^${gain} `) }).click();
  }

  async nudgeUp(gain: string): Promise<void> {
    await this.choose(gain);
    await this.visitor.press(`${gain} up 1 %`);
  }

  /** Types a gain: into its field on a wide screen, on the keypad of a phone. */
  async type(gain: string, text: string): Promise<void> {
    if (this.size === 'wide') {
      await this.enter(gain, text);
      return;
    }
    await this.choose(gain);
    await this.visitor.press(new RegExp(`^${gain} .*enter a number`));
    const keypad = this.page.getByRole('dialog');
    await keypad.waitFor();
    for (const key of text) await keypad.getByRole('button', { name: key === '.' ? 'Decimal point' : key, exact: true }).click();
    await keypad.getByRole('button', { name: `Set ${gain} to ${text}` }).click();
  }

  /** Writes into a gain's field of a wide screen. Focused first: the field then writes the gain out in full and selects it. */
  async enter(gain: string, text: string): Promise<void> {
    const field = this.gain(gain);
    await field.focus();
    await field.fill(text);
    await field.press('Enter');
  }

  keep() {
    return this.visitor.button(/^Keep/);
  }

  status() {
    return this.page.getByRole('region', { name: 'Gains' }).getByRole('status').first();
  }
}
