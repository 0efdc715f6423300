import { CountsInput } from '$lib/page/counts-input.svelte';
import { isOtherText } from '$lib/page/is-other-text';
import { describe, expect, it } from 'vitest';

const always = () => true;

describe('the counts in the field', () => {
  it('an edited example is called edited, and counts typed over it have no name', () => {
    const input = new CountsInput();
    input.replace('0,185\n1,1149\n2,3265', 'X', { trials: '12' });
    expect(input.name).toBe('X');
    expect(input.edit('0,185\n1,1150\n2,3265')).toBe(false);
    expect(input.name).toBe('X, edited');
    expect(input.origin?.settings).toEqual({ trials: '12' });
    expect(input.edit('3,44\n4,21\n5,7')).toBe(true);
    expect([input.name, input.origin]).toEqual([null, null]);
  });
  it('another file does not keep the settings of an example; bringing it back does', async () => {
    const input = new CountsInput();
    input.replace('0,1', 'X', { trials: '12' });
    expect(await input.take([new File(['3,4'], 'a.csv'), new File(['5,6'], 'b.csv')], always)).toBe(true);
    expect(input).toMatchObject({ name: 'a.csv', text: '3,4', notice: 'Of 2 files, a.csv was taken.' });
    expect(input.origin?.settings).toEqual({});
    input.undo();
    expect(input).toMatchObject({ name: 'X', text: '0,1', notice: '' });
    expect(input.origin?.settings).toEqual({ trials: '12' });
  });
  it('an empty file is named and takes nothing away', async () => {
    const input = new CountsInput();
    input.edit('0,1');
    expect(await input.take([new File([], 'void.csv')], always)).toBe(false);
    expect(input).toMatchObject({ text: '0,1', notice: 'void.csv is empty.' });
  });
  it('a slow file does not overwrite what came after it', async () => {
    const input = new CountsInput();
    input.edit('0,1');
    expect(await input.take([new File(['3,4'], 'slow.csv')], () => false)).toBe(false);
    expect(input.text).toBe('0,1');
  });
});

describe('isOtherText', () => {
  it.each([
    ['0,1\n1,2', '0,1\n1,2\n2,900\n3,800\n4,700', false],
    ['0,1\n1,2\n2,3', '2,3', false],
    ['0,1\n1,2', '', true],
    ['0,1\n1,2', '5,7\n6,9', true]
  ])('%j to %j is %s', (before, after, other) => expect(isOtherText(before, after)).toBe(other));
});
