'use client';

import { Button } from './button';
import { type Theme, themeCookie } from './theme';

const yearSeconds = 365 * 24 * 3600;

/** Changes between Paper and Blueprint and keeps the choice for a year. */
export function ThemeSwitch() {
  return (
    <Button look="quiet" className="text-second! font-normal!" onClick={switchTheme}>
      <span className="dark:hidden">Dark theme</span>
      <span className="hidden dark:inline">Light theme</span>
    </Button>
  );
}

function switchTheme() {
  const next: Theme = shownTheme() === 'paper' ? 'blueprint' : 'paper';
  document.documentElement.dataset.theme = next;
  // biome-ignore lint/suspicious/noDocumentCookie: the Cookie Store API is missing in some browsers
  document.cookie = `${themeCookie}=${next}; path=/; max-age=${yearSeconds}; samesite=lax`;
}

function shownTheme(): Theme {
  const chosen = document.documentElement.dataset.theme;
  if (chosen === 'paper' || chosen === 'blueprint') return chosen;
  return window.matchMedia('(prefers-color-scheme: dark)').matches ? 'blueprint' : 'paper';
}
