import { afterEach, beforeEach, expect, vi } from 'vitest';

// A warning that nobody expects is a defect: a test that provokes one on purpose looks at the
// spy and then clears it.
beforeEach(() => {
  vi.spyOn(console, 'warn');
  vi.spyOn(console, 'error');
});

afterEach(() => {
  const said = [...vi.mocked(console.warn).mock.calls, ...vi.mocked(console.error).mock.calls];
  vi.restoreAllMocks();
  expect(said, 'the test printed a warning').toEqual([]);
});
