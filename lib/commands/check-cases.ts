/**
 * npm run check:cases [-- DIR]: every reference case against the engine. Prints the worst relative error of each,
 * exits 1 past the tolerances, 2 when the cases cannot be read.
 */
import { readCases } from './case-file';
import { compareCase } from './compare-case';

const directory = process.argv[2] ?? 'tests/fixtures/cases';

try {
  const results = readCases(directory).map((reference) => {
    const result = compareCase(reference);
    const verdict = result.passed ? 'ok  ' : 'FAIL';
    console.log(`${result.id}  ${verdict}  ${result.worst.toExponential(2)}  (${result.where})`);
    return result;
  });
  const worst = Math.max(...results.map((result) => result.worst));
  const receivers = results.reduce((sum, result) => sum + result.receivers, 0);
  console.log(
    `worst relative error ${worst.toExponential(2)} over ${receivers} receivers in ${results.length} cases`,
  );
  process.exitCode = results.every((result) => result.passed) ? 0 : 1;
} catch (error) {
  console.error(`check:cases could not run: ${(error as Error).message}`);
  process.exitCode = 2;
}
