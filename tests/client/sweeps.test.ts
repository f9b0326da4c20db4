import { flushPromises } from '@vue/test-utils';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { announcement, percent, timeLeft } from '../../src/components/sweeps/progress.ts';
import SweepProgress from '../../src/components/sweeps/SweepProgress.vue';
import { mountInApp } from '../support/client/mount.ts';
import { buttonNamed } from './queries.ts';
import { json, sweepAt } from './support/revisions.ts';

/** A stream of events that the test fills by hand. */
class HandStream extends EventTarget {
  static readonly CLOSED = 2;
  static last: HandStream;
  readyState = 1;
  readonly url: string;
  constructor(url: string) {
    super();
    this.url = url;
    HandStream.last = this;
  }
  close(): void {
    this.readyState = HandStream.CLOSED;
  }
  async send(sweep: unknown): Promise<void> {
    this.dispatchEvent(new MessageEvent('message', { data: JSON.stringify(sweep) }));
    await flushPromises();
  }
}

const ended = vi.fn();
const words = () => document.querySelector('section')?.textContent ?? '';
const said = () => document.querySelector('[role="status"]')?.textContent;

beforeEach(() => {
  ended.mockReset();
  vi.stubGlobal('EventSource', HandStream);
});

describe('a sweep that is followed', () => {
  it('shows the true fraction, the pace and the time left, and says a step of ten per cent once', async () => {
    await mountInApp(SweepProgress, { props: { sweepId: 9, onEnded: ended } });
    expect(HandStream.last.url).toBe('/api/sweeps/9/events');
    await HandStream.last.send(sweepAt(0.374));
    expect(words()).toContain('Running, 37 %');
    expect(words()).toContain('75 of 200 variants · 12\u202f346 cells/s · 42 s left');
    expect(document.querySelector('[role="progressbar"]')?.getAttribute('aria-valuenow')).toBe('37');
    expect(said()).toBe('Sweep at 30 per cent');
    await HandStream.last.send(sweepAt(0.399));
    expect(said()).toBe('Sweep at 30 per cent');
  });

  it('tells when it has ended, and closes the stream', async () => {
    await mountInApp(SweepProgress, { props: { sweepId: 9, onEnded: ended } });
    await HandStream.last.send(sweepAt(1, { state: 'done', secondsLeft: null, can: { cancel: false } }));
    expect(words()).toContain('Done, 100 %');
    expect(ended).toHaveBeenCalledOnce();
    expect(HandStream.last.readyState).toBe(HandStream.CLOSED);
  });

  it('can be cancelled', async () => {
    const fetched = vi.fn<typeof fetch>(() =>
      Promise.resolve(json(200, sweepAt(0.4, { state: 'cancelled', can: { cancel: false } }))),
    );
    vi.stubGlobal('fetch', fetched);
    await mountInApp(SweepProgress, { props: { sweepId: 9, onEnded: ended } });
    await HandStream.last.send(sweepAt(0.4));
    buttonNamed('Cancel the sweep').click();
    await flushPromises();
    expect(fetched.mock.calls[0]?.[0]).toBe('/api/sweeps/9/cancel');
    expect(words()).toContain('Cancelled');
    expect(ended).toHaveBeenCalledOnce();
  });
});

describe('progress in words', () => {
  it('never says 100 per cent before the end', () => {
    expect(percent({ fraction: 0.9999, state: 'running' })).toBe(99);
    expect(percent({ fraction: 1, state: 'done' })).toBe(100);
  });

  it('rounds the time left as people say it', () => {
    expect(timeLeft(0.2)).toBe('1 s left');
    expect(timeLeft(170)).toBe('about 3 min left');
    expect(timeLeft(2 * 3600)).toBe('about 2 h left');
    expect(timeLeft(null)).toBe('');
  });

  it('announces the end as what it was', () => {
    expect(announcement({ fraction: 0.5, state: 'failed' })).toBe('Sweep: failed');
  });
});
