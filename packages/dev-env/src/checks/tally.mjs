import { printFailure } from '../processes/run-main.mjs';
import { isShuttingDown } from '../processes/shutdown.mjs';

/** Adds up the steps of `npm test`. A step that fails is printed and counted as one and does not keep the next from running. */
export function createTally() {
  const total = { passed: 0, failed: 0 };
  return {
    total,
    /** Resolves with whether everything in the step passed. */
    async step(name, work) {
      const start = Date.now();
      console.log(`\n── ${name}`);
      let counts;
      try {
        counts = await work();
      } catch (error) {
        if (isShuttingDown()) throw error;
        printFailure(error);
        counts = { passed: 0, failed: 1 };
      }
      total.passed += counts.passed;
      total.failed += counts.failed;
      const seconds = ((Date.now() - start) / 1000).toFixed(1);
      console.log(`── ${name}: ${counts.passed} passed, ${counts.failed} failed in ${seconds} s`);
      return counts.failed === 0;
    },
  };
}
