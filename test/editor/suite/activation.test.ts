import assert from 'node:assert/strict';
import { extensions } from 'vscode';

suite('activation', () => {
  test('trivial', async () => {
    const extension = extensions.getExtension('isonym.isonym');
    assert.ok(extension);
    void extension.activate();
  });
});
