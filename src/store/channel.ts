/** What tabs of one device tell each other: that something was written, never what. */

export interface Told {
  readonly appraisal: string;
}

export interface Channel {
  tell(told: Told): void;
  close(): void;
}

/** Where the browser has no channel, other tabs find out when they next write. */
export function openChannel(name: string, hear: (told: Told) => void): Channel {
  if (typeof BroadcastChannel === 'undefined') return { tell: () => {}, close: () => {} };
  const channel = new BroadcastChannel(name);
  channel.onmessage = ({ data }) => {
    if (typeof data?.appraisal === 'string') hear(data);
  };
  return {
    tell: (told) => channel.postMessage(told),
    close: () => channel.close(),
  };
}
