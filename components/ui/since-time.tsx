'use client';

import { useSyncExternalStore } from 'react';

/** How long ago a moment (ISO 8601) was, in words; the exact time is its title. Kept up to date by the minute. */
export function SinceTime({ moment }: { moment: string }) {
  const minute = useSyncExternalStore(everyMinute, presentMinute, () => null);
  const date = new Date(moment);
  return (
    <time dateTime={moment} title={date.toISOString().slice(0, 16).replace('T', ' ') + ' UTC'}>
      {minute === null ? moment.slice(0, 10) : since(date, minute * MINUTE)}
    </time>
  );
}

const MINUTE = 60_000;
const HOUR = 60 * MINUTE;
const DAY = 24 * HOUR;
const words = new Intl.RelativeTimeFormat('en', { numeric: 'auto' });

function since(date: Date, now: number): string {
  const past = now - date.getTime();
  if (past < MINUTE) return 'just now';
  if (past < HOUR) return words.format(-Math.floor(past / MINUTE), 'minute');
  if (past < DAY) return words.format(-Math.floor(past / HOUR), 'hour');
  if (past < 14 * DAY) return words.format(-Math.floor(past / DAY), 'day');
  return date.toLocaleDateString('en-GB', { day: 'numeric', month: 'long', year: 'numeric' });
}

function presentMinute(): number {
  return Math.floor(Date.now() / MINUTE);
}

function everyMinute(changed: () => void): () => void {
  const timer = setInterval(changed, MINUTE);
  return () => clearInterval(timer);
}
