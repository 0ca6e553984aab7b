import type { Page } from 'playwright-core';

/** Handheld scanners type a character every few ms (common practice, no source). */
const GAP_SECONDS = 0.008;

/**
 * Types as a handheld scanner does, Enter at the end. Each key carries its own time, so that a busy machine doesn't
 * turn the scanner into a slow typist.
 */
export async function scanByHand(page: Page, text: string): Promise<void> {
  const session = await page.context().newCDPSession(page);
  const keys = [...Array.from(text, (key) => ({ key, text: key })), ENTER];
  const startSeconds = Date.now() / 1000 - keys.length * GAP_SECONDS;
  await Promise.all(
    keys.flatMap((key, i) => {
      const timestamp = startSeconds + i * GAP_SECONDS;
      return [
        session.send('Input.dispatchKeyEvent', { type: 'keyDown', timestamp, ...key }),
        session.send('Input.dispatchKeyEvent', { type: 'keyUp', timestamp, key: key.key }),
      ];
    }),
  );
  await session.detach();
}

const ENTER = { key: 'Enter', code: 'Enter', text: '\r', windowsVirtualKeyCode: 13 };
