import { expect, test } from 'vitest';
import { readCases } from '@/lib/commands/case-file';
import { compareCase } from '@/lib/commands/compare-case';

// Reference values by an independent slow solver, checked against a second one: tests/fixtures/cases/README.md.
const cases = readCases('tests/fixtures/cases');

test('all 22 reference cases are here', () => expect(cases).toHaveLength(22));

test.each(cases.map((reference) => [reference.id, reference.title, reference] as const))(
  'reference case %s (%s) is met at every receiver, exact zeros included',
  (_, __, reference) => {
    const result = compareCase(reference);
    expect(result.passed, `${result.worst} at ${result.where}`).toBe(true);
  },
);
