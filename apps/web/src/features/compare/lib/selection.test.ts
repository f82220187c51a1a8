import { describe, expect, it } from 'vitest';
import { readSelection, without, writeSelection } from './selection.ts';

const id = (n: number) => `00000000-0000-4000-8000-${String(n).padStart(12, '0')}`;
const read = (query: string) => readSelection(new URLSearchParams(query));

describe('the selection of a comparison', () => {
  it('keeps the order of the link; the first is the reference', () => {
    const { selection, problem } = read(`d=${id(1)}&v=${id(2)}&l=7`);
    expect(selection).toEqual({
      items: [
        { kind: 'draft', id: id(1) },
        { kind: 'version', id: id(2) },
      ],
      baseId: id(1),
    });
    expect(problem).toBeNull();
  });
  it('takes the reference the link names', () => {
    expect(read(`v=${id(1)}&v=${id(2)}&base=${id(2)}`).selection.baseId).toBe(id(2));
    expect(read(`v=${id(1)}&v=${id(2)}&base=${id(3)}`).selection.baseId).toBe(id(1));
  });
  it('says what it could not read and what is too much', () => {
    expect(read(`v=nonsense&v=${id(1)}&v=${id(1)}`)).toMatchObject({
      problem: 'One item of the link could not be read.',
      selection: { items: [{ id: id(1) }] },
    });
    const seven = read(Array.from({ length: 7 }, (_, i) => `v=${id(i + 1)}`).join('&'));
    expect(seven.selection.items).toHaveLength(6);
    expect(seven.problem).toContain('at most 6');
  });
  it('writes what it read, cursors kept', () => {
    const query = `v=${id(1)}&v=${id(2)}&base=${id(2)}&r=3.2`;
    const { selection } = read(query);
    const back = writeSelection(new URLSearchParams(query), selection);
    expect(readSelection(back).selection).toEqual(selection);
    expect(back.get('r')).toBe('3.2');
  });
  it('finds another reference when the reference is taken out', () => {
    expect(without(read(`v=${id(1)}&v=${id(2)}`).selection, id(1))).toEqual({
      items: [{ kind: 'version', id: id(2) }],
      baseId: id(2),
    });
  });
});
