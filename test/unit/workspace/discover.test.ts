import { execFileSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join, relative } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { byPath, discoverNotebooks } from '../../../server/workspace/discover.ts';

const made: string[] = [];
afterAll(() => {
  for (const folder of made) rmSync(folder, { recursive: true, force: true });
});

/** A folder with these files in it. */
function tree(files: Record<string, string>): string {
  const root = mkdtempSync(join(tmpdir(), 'isonym-tree-'));
  made.push(root);
  for (const [path, text] of Object.entries(files)) {
    mkdirSync(dirname(join(root, path)), { recursive: true });
    writeFileSync(join(root, path), text);
  }
  return root;
}

function found(root: string, folder = ''): string[] {
  return discoverNotebooks(join(root, folder)).files.map((file) => relative(root, file));
}

describe('finding notebook pages', () => {
  it('takes Markdown files in a settled order and stays out of .git and node_modules', () => {
    const root = tree({
      'b.md': '',
      'a/z.markdown': '',
      'a/B.MD': '',
      'a.txt': '',
      'node_modules/p/readme.md': '',
      '.git/x.md': '',
      'a-b/c.md': '',
    });
    expect(found(root)).toEqual(['a/B.MD', 'a/z.markdown', 'a-b/c.md', 'b.md']);
  });

  it('ignores what git ignores: nested rules, exceptions, folders', () => {
    const files = {
      '.gitignore': 'drafts/\n*.tmp.md\n/top.md\nDeep/**/old.md\n',
      'top.md': '',
      'x.tmp.md': '',
      'drafts/a.md': '',
      'keep/.gitignore': '!x.tmp.md\nsecret.md\n',
      'keep/x.tmp.md': '',
      'keep/secret.md': '',
      'keep/top.md': '',
      'Deep/a/b/old.md': '',
      'deep/a/b/old.md': '',
      'seen.md': '',
    };
    const root = tree(files);
    execFileSync('git', ['init', '-q', root]);
    // Git itself is the reference.
    const listed = execFileSync('git', ['-C', root, 'ls-files', '--others', '--exclude-standard', '*.md'], {
      encoding: 'utf8',
    });
    expect(found(root)).toEqual(listed.trim().split('\n').sort(byPath));
    expect(found(root, 'keep')).toEqual(['keep/top.md', 'keep/x.tmp.md']);
  });

  it('searches a folder that was named although git ignores it', () => {
    const root = tree({ '.gitignore': 'drafts/\n', '.git/HEAD': '', 'drafts/a.md': '', 'drafts/b/c.md': '' });
    expect(found(root)).toEqual([]);
    expect(found(root, 'drafts')).toEqual(['drafts/a.md', 'drafts/b/c.md']);
  });

  it('follows links to files elsewhere, not to folders or to files that it finds anyway', () => {
    const elsewhere = tree({ 'shared.md': '' });
    const root = tree({ 'a/real.md': '' });
    symlinkSync(join(root, 'a'), join(root, 'a', 'loop'));
    symlinkSync(join(root, 'a', 'real.md'), join(root, 'again.md'));
    symlinkSync(join(elsewhere, 'shared.md'), join(root, 'link.md'));
    symlinkSync(join(root, 'nowhere.md'), join(root, 'broken.md'));
    expect(found(root)).toEqual(['a/real.md', 'link.md']);
  });

  it('says which folder could not be listed', () => {
    const root = tree({ 'a.md': '' });
    const { files, problems } = discoverNotebooks(join(root, 'missing'));
    expect(files).toEqual([]);
    expect(problems).toHaveLength(1);
  });
});
