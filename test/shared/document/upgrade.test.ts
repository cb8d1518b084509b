import { latestVersion, type Upgrade, upgraded } from '#shared/document/upgrade';

/** An invented format that has come to version 3: a name became a title, a title became a list. */
const renamed: Upgrade = document => {
  const { name, ...rest } = { name: undefined, ...document } as Record<string, unknown>;
  return { ...rest, version: 2, title: name };
};
const listed: Upgrade = document => {
  const { title, ...rest } = { title: undefined, ...document } as Record<string, unknown>;
  return { ...rest, version: 3, titles: [title] };
};
const VERSIONS = { format: 'invented', upgrades: [renamed, listed] };

it('knows the version that it writes', () => {
  expect(latestVersion(VERSIONS)).toBe(3);
  expect(latestVersion({ format: 'young', upgrades: [] })).toBe(1);
});

it.each([
  ['the first', { format: 'invented', version: 1, name: 'Quay', kept: 5 }],
  ['the second', { format: 'invented', version: 2, title: 'Quay', kept: 5 }],
  ['the latest', { format: 'invented', version: 3, titles: ['Quay'], kept: 5 }],
])('takes a document of %s version to the latest, step by step', (_which, document) => {
  const before = structuredClone(document);
  expect(upgraded(document, VERSIONS)).toEqual({
    value: { format: 'invented', version: 3, titles: ['Quay'], kept: 5 },
  });
  expect(document).toEqual(before);
});

it('refuses a later version with what it would take to read it, and another format', () => {
  expect(upgraded({ format: 'invented', version: 4 }, VERSIONS)).toEqual({
    fault: { pointer: '/version', detail: expect.stringContaining('reads up to version 3') },
  });
  expect(upgraded({ format: 'other', version: 1 }, VERSIONS)).toEqual({
    fault: { pointer: '/format', detail: 'must be "invented", is "other"' },
  });
});

it.each([{}, { version: 'one' }, { version: 0 }, { version: 1.5 }, { format: 7, version: 3 }])(
  'hands on what is no document of a known version, for the schema to speak about: %j',
  value => {
    expect(upgraded(value, VERSIONS)).toEqual({ value });
  },
);
