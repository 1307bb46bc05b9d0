// Tests that are driven from outside of the editor: one line each, as Mocha's inside it.
export class Tally {
  passed = 0;
  failed = 0;

  async test(title, run) {
    const begun = Date.now();
    try {
      await run();
      this.passed += 1;
      console.log(`  ✓ ${title} (${Date.now() - begun} ms)`);
    } catch (error) {
      this.failed += 1;
      console.log(`  ✗ ${title}`);
      for (const line of String(error.stack ?? error).split('\n')) console.log(`      ${line}`);
    }
  }
}
