import type { CDPSession, Locator, Page } from '@playwright/test';
import { middle } from './drag.ts';
import { expect } from './test.ts';

const STEPS = 15;

/** One finger on a touch screen, through the browser's own input. */
export class Finger {
  readonly #session: CDPSession;
  #at = { x: 0, y: 0 };

  private constructor(session: CDPSession) {
    this.#session = session;
  }

  static async on(page: Page): Promise<Finger> {
    return new Finger(await page.context().newCDPSession(page));
  }

  async down(on: Locator): Promise<void> {
    this.#at = await middle(on);
    await this.#send('touchStart');
  }

  async moveBy(x: number, y: number): Promise<void> {
    await this.#moveTo({ x: this.#at.x + x, y: this.#at.y + y });
  }

  /** Where it is on the screen: an open gap is not scrolled to under a finger. */
  async moveOver(target: Locator): Promise<void> {
    const box = await target.boundingBox();
    if (!box) throw new Error('There is nothing to move the finger over');
    await this.#moveTo({ x: box.x + box.width / 2, y: box.y + box.height / 2 });
  }

  /** Follows a place that scrolls along until both rest. */
  async restOver(target: Locator): Promise<void> {
    await expect(async () => {
      await this.moveOver(target);
      expect(await target.evaluate(staysUnder, this.#at)).toBe(true);
    }).toPass({ timeout: 15_000 });
  }

  async up(): Promise<void> {
    await this.#send('touchEnd');
  }

  async #moveTo(to: { x: number; y: number }): Promise<void> {
    const from = this.#at;
    for (let step = 1; step <= STEPS; step += 1) {
      const share = step / STEPS;
      this.#at = { x: from.x + (to.x - from.x) * share, y: from.y + (to.y - from.y) * share };
      await this.#send('touchMove');
    }
  }

  async #send(type: 'touchStart' | 'touchMove' | 'touchEnd'): Promise<void> {
    const touchPoints = type === 'touchEnd' ? [] : [this.#at];
    await this.#session.send('Input.dispatchTouchEvent', { type, touchPoints });
  }
}

/** Whether an element lies under a point and, a few frames on, still does where it did. */
async function staysUnder(element: Element, at: { x: number; y: number }): Promise<boolean> {
  const place = () => element.getBoundingClientRect().top;
  const before = place();
  for (let frames = 0; frames < 4; frames += 1)
    await new Promise((drawn) => requestAnimationFrame(drawn));
  return place() === before && element.contains(document.elementFromPoint(at.x, at.y));
}
