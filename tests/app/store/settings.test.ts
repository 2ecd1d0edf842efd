import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';

const KEY = 'steelyard.settings';

beforeEach(() => {
  localStorage.clear();
  vi.resetModules();
});
afterEach(() => {
  vi.restoreAllMocks();
});

const settings = () => import('../../../src/store/settings.ts');
const deviceSpeaks = (...languages: string[]) =>
  vi.spyOn(navigator, 'languages', 'get').mockReturnValue(languages);

describe('settings', () => {
  it('begin with the first of the device’s languages that the app speaks', async () => {
    deviceSpeaks('pt-BR', 'fr-CD', 'en');
    const { getSettings } = await settings();
    expect(getSettings()).toEqual({
      language: 'fr',
      theme: 'system',
      thresholds: {},
      samples: 1_000,
      workers: null,
    });
  });

  it('fall back on English', async () => {
    deviceSpeaks('sw');
    expect((await settings()).getSettings().language).toBe('en');
  });

  it('are kept', async () => {
    (await settings()).changeSettings({ theme: 'dark', thresholds: { tiny: 750 } });
    vi.resetModules();
    const { theme, thresholds } = (await settings()).getSettings();
    expect({ theme, thresholds }).toEqual({ theme: 'dark', thresholds: { tiny: 750 } });
  });

  it('lose no more than the part that is spoilt', async () => {
    const spoilt = {
      theme: 'pink',
      language: 'fr',
      thresholds: { a: 'x', b: -1, c: 20 },
      samples: -5,
      workers: 3,
    };
    localStorage.setItem(KEY, JSON.stringify(spoilt));
    const { getSettings } = await settings();
    expect(getSettings()).toEqual({
      language: 'fr',
      theme: 'system',
      thresholds: { c: 20 },
      samples: 1_000,
      workers: 3,
    });
  });

  it.each(['not json', 'null', '[]', '"x"'])('survive %s in their place', async (text) => {
    localStorage.setItem(KEY, text);
    expect((await settings()).getSettings().theme).toBe('system');
  });

  it('hold until the page is closed where the storage is barred', async () => {
    const { changeSettings, getSettings } = await settings();
    vi.spyOn(Storage.prototype, 'setItem').mockImplementation(() => {
      throw new DOMException('full', 'QuotaExceededError');
    });
    changeSettings({ theme: 'light' });
    expect(getSettings().theme).toBe('light');
  });

  it('tell who listens', async () => {
    const { changeSettings, subscribeSettings } = await settings();
    const heard = vi.fn();
    const leave = subscribeSettings(heard);
    changeSettings({ theme: 'dark' });
    leave();
    changeSettings({ theme: 'light' });
    expect(heard).toHaveBeenCalledTimes(1);
  });
});
