import { readFile } from 'node:fs/promises';
import type { Locator, Page } from 'playwright-core';

/** One way of failing as the ladder says it. */
export interface ShownRung {
  readonly name: string;
  readonly word: string;
  readonly weakest: boolean;
  /** Reaction at failure, in the end's unit, and ratio; null where a sign stands for want of a number. */
  readonly failsAt: number | null;
  readonly ratio: number | null;
}

const VERDICT = /^(?:HOLDS|FAILS|REFER|INCOMPLETE)(?: [\d.]+)?/;

const RUNG = /^(.+?) (holds|fails|refers)(?:, close)?(, the weakest)?, (?:fails at )?(\S+?)(?: \w*)?, ratio ([^\s;]+)/;

const numberIn = (text: string | undefined): number | null => (/^[–∞]$/.test(text ?? '') ? null : Number(text));

const rungOf = (text: string): ShownRung => {
  const [, name, word, weakest, failsAt, ratio] = RUNG.exec(text) ?? [];
  if (name === undefined) throw new Error(`no rung: ${text}`);
  return { name, word: word!, weakest: weakest !== undefined, failsAt: numberIn(failsAt), ratio: numberIn(ratio) };
};

/** The bench in one page of the browser, as the people who use it find their way on it: by roles and names. */
export class Bench {
  constructor(readonly page: Page) {}

  /** What can be done with the whole end. */
  get tools(): Locator {
    return this.page.getByRole('toolbar', { name: 'The whole end' });
  }

  tool(name: string | RegExp): Locator {
    return this.tools.getByRole('button', { name, exact: true });
  }

  /** What the Undo button would take back, or the Redo button bring again; empty where there is nothing. */
  async next(tool: 'Undo' | 'Redo'): Promise<string> {
    const text = (await this.tool(new RegExp(`^${tool}`)).getAttribute('aria-label')) ?? '';
    return text.slice(`${tool}: `.length);
  }

  /** A line of the order, such as `Bolts`. */
  line(title: string): Locator {
    return this.page.getByRole('region', { name: 'Order' }).getByRole('group', { name: title, exact: true });
  }

  /** Opens a line of the order, or closes it where it is open. */
  turn(title: string): Promise<void> {
    return this.line(title).getByRole('button', { name: title, exact: true }).click();
  }

  /** A field of an open line, such as `Pitch`. */
  field(title: string, name: string): Locator {
    return this.line(title).getByLabel(name, { exact: true });
  }

  /** A size on the drawing, such as `Pitch, mm`. */
  size(name: string): Locator {
    return this.page.getByRole('textbox', { name, exact: true });
  }

  get drawing(): Locator {
    return this.page.getByRole('img', { name: 'The beam end, drawn to scale' });
  }

  /** The view on the support, beside or below the other; none where nothing lies on it. */
  get onSupport(): Locator {
    return this.page.getByRole('img', { name: 'What lies on the support, drawn to scale' });
  }

  get ladder(): Locator {
    return this.page.getByRole('list', { name: 'Ways of failing, the weakest last' });
  }

  /** A rung, or a line of the footing. */
  rung(name: string): Locator {
    return this.page.getByRole('button', { name: new RegExp(`^${name}(?:,| holds| fails| refers)`) });
  }

  get rungs(): Promise<ShownRung[]> {
    return this.ladder
      .getByRole('button')
      .allTextContents()
      .then((all) => all.map(rungOf));
  }

  /** Waits until ladder and verdict are those of the end as it stands in the fields. */
  current(): Promise<void> {
    return this.page.getByRole('heading', { level: 2, name: /^Ladder(?! as last complete| nothing yet)/ }).waitFor();
  }

  /** Word and ratio of the verdict, such as `HOLDS 0.81`: over the ladder, on narrow pages in the strip at the foot. */
  get verdict(): Promise<string> {
    const whole = new RegExp(`${VERDICT.source}\\s*$`);
    const head = this.page.getByRole('main').getByRole('paragraph').filter({ hasText: whole });
    const strip = this.page.getByRole('button', { name: VERDICT });
    return head
      .or(strip)
      .first()
      .textContent()
      .then((text) => VERDICT.exec(text ?? '')?.[0] ?? '');
  }

  /** Name of what has focus, behind the part of the page it stands in: `Bolts: Pitch`. */
  get focused(): Promise<string> {
    return this.page.evaluate(() => {
      const it = document.activeElement;
      if (!(it instanceof HTMLElement) || it === document.body) return '';
      const label = it instanceof HTMLInputElement || it instanceof HTMLSelectElement ? it.labels?.[0] : undefined;
      const part = label && it.closest('fieldset')?.querySelector('legend')?.textContent;
      const name = label?.textContent ?? it.getAttribute('aria-label') ?? it.textContent ?? '';
      return part ? `${part}: ${name}` : name;
    });
  }

  /** What is said about a field beside it: its fault, or how it was read. */
  noteOf(field: Locator): Promise<string> {
    return field.evaluate((it) =>
      (it.getAttribute('aria-describedby') ?? '')
        .split(' ')
        .map((id) => document.getElementById(id)?.textContent ?? '')
        .join(' '),
    );
  }

  press(...keys: readonly string[]): Promise<void> {
    return keys.reduce((before, key) => before.then(() => this.page.keyboard.press(key)), Promise.resolve());
  }

  /** Goes on by the Tab key until something of this name has focus. */
  async tabTo(name: string): Promise<void> {
    for (let presses = 0; presses < 200; presses += 1) {
      if ((await this.focused) === name) return;
      await this.press('Tab');
    }
    throw new Error(`the Tab key does not come to ${name}`);
  }

  /** Types over what stands in a size on the drawing, and leaves it. */
  async type(name: string, text: string): Promise<void> {
    await this.size(name).focus();
    await this.size(name).selectText();
    await this.page.keyboard.type(text);
    await this.press('Tab');
  }

  /** Bytes of the file that an action hands over, and its name. */
  async handed(action: () => Promise<unknown>): Promise<{ readonly name: string; readonly bytes: Buffer }> {
    const [download] = await Promise.all([this.page.waitForEvent('download'), action()]);
    return { name: download.suggestedFilename(), bytes: await readFile(await download.path()) };
  }

  /** Text of the end's file. */
  async saved(): Promise<string> {
    const { bytes } = await this.handed(() => this.tool('Save').click());
    return bytes.toString('utf8');
  }

  /** The end's sheet. */
  sheet(): Promise<{ readonly name: string; readonly bytes: Buffer }> {
    return this.handed(() => this.page.getByRole('button', { name: 'Issue sheet' }).click());
  }

  /** Goes to a link of the bench in the page that is open. */
  follow(link: string): Promise<void> {
    return this.page.evaluate((hash) => {
      location.hash = hash;
    }, link);
  }

  /** Opens a file by the Open button. */
  async openFile(name: string, bytes: Buffer): Promise<void> {
    const [chooser] = await Promise.all([this.page.waitForEvent('filechooser'), this.tool('Open').click()]);
    await chooser.setFiles({ name, mimeType: '', buffer: bytes });
  }

  /** Drops a file on the page, once the page takes what is held over it. */
  async drop(name: string, bytes: Buffer): Promise<void> {
    const dataTransfer = await this.page.evaluateHandle(
      ([text, called]) => {
        const transfer = new DataTransfer();
        transfer.items.add(new File([Uint8Array.from(atob(text), (letter) => letter.charCodeAt(0))], called));
        return transfer;
      },
      [bytes.toString('base64'), name] as const,
    );
    await this.page.waitForFunction((held) => {
      const over = new DragEvent('dragover', { bubbles: true, cancelable: true, dataTransfer: held });
      return !document.body.dispatchEvent(over);
    }, dataTransfer);
    await this.page.getByRole('main').dispatchEvent('drop', { dataTransfer });
  }
}
