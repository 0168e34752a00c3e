import { describe, expect, it } from 'vitest';
import { safePath } from '@/app/sign-in/safe-path';

describe('where signing in leads', () => {
  it.each(['/roster', '/roster/ros_1?zoom=2', '/'])('keeps the path %s of this site', (path) => {
    expect(safePath(path)).toBe(path);
  });

  it.each([
    undefined,
    '',
    'roster',
    '//elsewhere.example',
    '/\\elsewhere.example',
    'https://elsewhere.example/',
    'javascript:alert(1)',
    '/roster\\..\\..',
    '/a\nb',
    '/sign-in?callbackUrl=/sign-in',
  ])('falls back to the first sheet for %j', (target) => {
    expect(safePath(target)).toBe('/');
  });
});
