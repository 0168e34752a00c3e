import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative, resolve } from 'node:path';
import { describe, expect, it } from 'vitest';

/*
 * The house rules of DEVELOPERS.md as a test: it reads imports as text and names every breach.
 */

/** Data flows down this list; a module imports only those above it. */
const flow = [
  'units',
  'access',
  'people',
  'coverage',
  'rules',
  'problem',
  'model',
  'solver',
  'proof',
  'sizing',
  'mail',
  'roster',
  'hours',
];
const pure = ['units', 'problem', 'model', 'proof'];
const root = resolve(import.meta.dirname, '..');

function filesOf(folder: string): string[] {
  return readdirSync(join(root, folder), { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile() && /\.(ts|tsx|mjs)$/.test(entry.name))
    .map((entry) => relative(root, join(entry.parentPath, entry.name)));
}

/** What a file imports: repository paths without ending for our own files, package names otherwise. */
function importsOf(file: string): { target: string; isOwn: boolean; isType: boolean }[] {
  const text = readFileSync(join(root, file), 'utf8');
  const pattern =
    /(?:import|export)\s+(type\s)?[^;'"]*?from\s+['"]([^'"]+)['"]|import\(\s*['"]([^'"]+)['"]\s*\)/g;
  return [...text.matchAll(pattern)].map((match) => {
    const target = match[2] ?? match[3] ?? '';
    const isType = Boolean(match[1]);
    if (target.startsWith('@/')) return { target: target.slice(2), isOwn: true, isType };
    if (!target.startsWith('.')) return { target, isOwn: false, isType };
    return { target: relative(root, resolve(root, dirname(file), target)), isOwn: true, isType };
  });
}

const moduleOf = (path: string) => /^modules\/([^/]+)/.exec(path)?.[1] ?? null;

describe('the direction of imports', () => {
  const moduleFiles = filesOf('modules');

  it('has every module in the flow', () => {
    const folders = readdirSync(join(root, 'modules')).sort();
    expect(folders).toEqual([...flow].sort());
  });

  it('goes only up the list of modules and only through a door', () => {
    const breaches = moduleFiles.flatMap((file) => {
      const own = moduleOf(file) ?? '';
      return importsOf(file).flatMap(({ target, isOwn }) => {
        const other = isOwn ? moduleOf(target) : null;
        if (!other || other === own) return [];
        const isDoor = /^modules\/[^/]+(\/(index|server))?$/.test(target);
        const isUp = flow.indexOf(other) < flow.indexOf(own);
        return isDoor && isUp ? [] : [`${file} -> ${target}`];
      });
    });
    expect(breaches).toEqual([]);
  });

  it('never leads from modules, db or emails to app, and never from modules to Next or React', () => {
    const breaches = [...moduleFiles, ...filesOf('db'), ...filesOf('emails')].flatMap((file) =>
      importsOf(file)
        .filter(({ target, isOwn }) =>
          isOwn
            ? target.startsWith('app/')
            : file.startsWith('modules/') && /^(next|react|@tanstack)(\/|$|-)/.test(target),
        )
        .map(({ target }) => `${file} -> ${target}`),
    );
    expect(breaches).toEqual([]);
  });

  it('keeps the browser-safe doors free of the database, of Node and of server doors', () => {
    const breaches: string[] = [];
    const visit = (file: string, seen: Set<string>, from: string): void => {
      if (seen.has(file)) return;
      seen.add(file);
      for (const { target, isOwn, isType } of importsOf(file)) {
        if (isType) continue;
        if (!isOwn && target.startsWith('node:')) breaches.push(`${from}: ${file} -> ${target}`);
        if (!isOwn) continue;
        if (target.startsWith('db/')) breaches.push(`${from}: ${file} -> ${target}`);
        const next = [`${target}.ts`, `${target}/index.ts`].find((path) =>
          existsSync(join(root, path)),
        );
        if (next) visit(next, seen, from);
      }
    };
    for (const name of flow) {
      const door = `modules/${name}/index.ts`;
      if (existsSync(join(root, door))) visit(door, new Set(), door);
    }
    expect(breaches).toEqual([]);
  });

  it('keeps pure modules free of I/O, and the proof free of the model and the solver', () => {
    const breaches = moduleFiles
      .filter((file) => pure.includes(moduleOf(file) ?? ''))
      .flatMap((file) =>
        importsOf(file)
          .filter(({ target, isOwn }) =>
            isOwn ? target.startsWith('db/') : target.startsWith('node:'),
          )
          .map(({ target }) => `${file} -> ${target}`),
      );
    const shared = moduleFiles
      .filter((file) => file.startsWith('modules/proof/'))
      .flatMap((file) =>
        importsOf(file)
          .filter(({ target }) => ['model', 'solver'].includes(moduleOf(target) ?? ''))
          .map(({ target }) => `${file} -> ${target}`),
      );
    expect([...breaches, ...shared]).toEqual([]);
  });
});

describe('one place for each thing', () => {
  it('asks the clock only in units, db/clock and the screens', () => {
    const breaches = filesOf('modules')
      .filter((file) => !file.startsWith('modules/units/'))
      .filter((file) => /new Date\(|Date\.now\(/.test(readFileSync(join(root, file), 'utf8')));
    expect(breaches).toEqual([]);
  });

  it('writes SQL only in stores and db', () => {
    const breaches = [...filesOf('modules'), ...filesOf('app')].filter(
      (file) =>
        !/\/store(-[a-z-]+)?\.ts$/.test(file) &&
        importsOf(file).some(
          ({ target, isType }) =>
            !isType && (target.startsWith('drizzle-orm') || target.startsWith('db/schema')),
        ),
    );
    expect(breaches).toEqual([]);
  });

  it('reads the environment only in db/env', () => {
    const breaches = [
      ...filesOf('modules'),
      ...filesOf('app'),
      ...filesOf('db'),
      ...filesOf('emails'),
    ]
      .filter((file) => !['db/env.ts', 'app/serve.mjs'].includes(file))
      .filter((file) => readFileSync(join(root, file), 'utf8').includes('process.env'));
    expect(breaches).toEqual([]);
  });

  it('guards every page by requireActor and every route by endpoint', () => {
    const open = [
      'app/sign-in/page.tsx',
      'app/not-allowed/page.tsx',
      'app/page.tsx',
      'app/help/page.tsx',
    ];
    const breaches = filesOf('app').filter((file) => {
      const text = readFileSync(join(root, file), 'utf8');
      if (file.endsWith('/page.tsx') && !open.includes(file)) return !/requireActor\('/.test(text);
      if (file.endsWith('/route.ts') && !file.startsWith('app/api/auth/'))
        return !/= endpoint\(/.test(text);
      return false;
    });
    expect(breaches).toEqual([]);
  });

  it('has nothing at the top that the map does not name', () => {
    const named = ['app', 'db', 'drizzle', 'emails', 'modules', 'public', 'tests'];
    const generated = ['node_modules', 'dist', 'var', 'test-results', 'playwright-report'];
    const folders = readdirSync(root, { withFileTypes: true })
      .filter((entry) => entry.isDirectory() && !entry.name.startsWith('.'))
      .map((entry) => entry.name)
      .filter((name) => !generated.includes(name));
    expect(folders.sort()).toEqual(named);
  });
});
