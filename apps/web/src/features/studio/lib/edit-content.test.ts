import { describe, expect, it } from 'vitest';
import { sampleDraft } from '../test/sample-draft.ts';
import {
  clearCells,
  deleteStations,
  fillDown,
  insertStation,
  insertedRow,
  pasteBlock,
  rowsLeftOut,
  setCellText,
} from './edit-content.ts';
import { copyBlock, readBlock } from './station-block.ts';

const one = (row: number, column: number) => ({ top: row, bottom: row, left: column, right: column });

describe('edits of a draft', () => {
  const draft = sampleDraft();
  it('share every station they do not touch', () => {
    const next = setCellText(1, 'chordM', '0.55')(draft);
    expect(next.stations[1]?.chordM).toBe(0.55);
    expect(next.stations[0]).toBe(draft.stations[0]);
    expect(draft.stations[1]?.chordM).toBe(0.7);
  });
  it.each(['1,5', 'NaN', '1e999', '', 'abc'])('keep %j as text', (text) => {
    expect(setCellText(0, 'chordM', text)(draft).stations[0]?.chordM).toBe(text);
  });
  it('insert half way between neighbours and keep the tip last', () => {
    const next = insertStation(1)(draft);
    expect(next.stations[2]).toEqual({
      radiusM: 2.5,
      chordM: 0.65,
      twistDeg: 9,
      thicknessPct: 28.5,
      airfoil: null,
    });
    expect(insertedRow(4, 3)).toBe(3);
    expect(insertStation(3)(draft).stations.map((s) => s.radiusM)).toEqual([1, 2, 3, 3.5, 4]);
    expect(insertStation(0)({ ...draft, stations: [] }).stations).toHaveLength(1);
  });
  it('insert nothing beyond 200 stations', () => {
    const full = sampleDraft(200);
    expect(insertStation(5)(full)).toBe(full);
  });
  it('delete, clear and fill ranges', () => {
    expect(
      deleteStations({ top: 1, bottom: 2, left: 0, right: 0 })(draft).stations.map((s) => s.radiusM),
    ).toEqual([1, 4]);
    const cleared = clearCells({ top: 0, bottom: 0, left: 1, right: 2 })(draft).stations[0];
    expect(cleared).toMatchObject({ radiusM: 1, chordM: '', twistDeg: '' });
    const filled = fillDown({ top: 1, bottom: 3, left: 1, right: 1 })(draft);
    expect(filled.stations.map((s) => s.chordM)).toEqual([0.8, 0.7, 0.7, 0.7]);
    expect(fillDown(one(2, 2))(draft).stations[2]?.twistDeg).toBe(10);
    expect(fillDown(one(0, 2))(draft)).toBe(draft);
  });
});

describe('blocks of a spreadsheet', () => {
  const draft = sampleDraft();
  it('go down and right from the cell, adding stations at the end', () => {
    const block = readBlock('0.61\t5.5\n0.51\t4.5\n0.41\t3.5\n', 1);
    const next = pasteBlock(block, one(2, 1))(draft);
    expect(next.stations.slice(2).map((s) => [s.radiusM, s.chordM, s.twistDeg])).toEqual([
      [3, 0.61, 5.5],
      [4, 0.51, 4.5],
      ['', 0.41, 3.5],
    ]);
  });
  it('keep a bad cell as text and take the rest', () => {
    const next = pasteBlock(readBlock('1\t0,5\t12\n2\t0.4\tx\n', 0), one(0, 0))(draft);
    expect(next.stations.slice(0, 2).map((s) => [s.radiusM, s.chordM, s.twistDeg])).toEqual([
      [1, '0,5', 12],
      [2, 0.4, 'x'],
    ]);
  });
  it('follow their header, leaving columns it does not name alone', () => {
    const block = readBlock('Twist [°]\tRadius [m]\tRemark\n7\t1.5\tok\n', 3);
    expect(block.fields).toEqual(['twistDeg', 'radiusM']);
    expect(pasteBlock(block, one(0, 3))(draft).stations[0]).toEqual({
      ...draft.stations[0],
      radiusM: 1.5,
      twistDeg: 7,
    });
  });
  it('read one value with a comma as one cell, semicolons as columns', () => {
    expect(readBlock('1,5', 1).rows).toEqual([['1,5']]);
    expect(readBlock('1;0,5;3', 0).rows).toEqual([['1', '0,5', '3']]);
    expect(readBlock('1, 0.5, 3', 0).rows).toEqual([['1', '0.5', '3']]);
  });
  it('fill a range with one value', () => {
    const next = pasteBlock(readBlock('0.45', 1), { top: 0, bottom: 2, left: 1, right: 1 })(draft);
    expect(next.stations.map((s) => s.chordM)).toEqual([0.45, 0.45, 0.45, 0.5]);
  });
  it('come back as they were copied, at full precision', () => {
    const fine = setCellText(1, 'chordM', '0.123456789')(draft);
    const text = copyBlock(fine.stations, { top: 0, bottom: 3, left: 0, right: 4 });
    expect(text.split('\r\n')[0]).toBe('Radius [m]\tChord [m]\tTwist [°]\tThickness [%]\tAirfoil');
    expect(pasteBlock(readBlock(text, 0), one(0, 0))(draft).stations).toEqual(fine.stations);
  });
  it('stop at 200 stations and say how many were left out', () => {
    const block = readBlock(Array.from({ length: 250 }, (_, i) => `${i + 1}\t1`).join('\n'), 0);
    expect(pasteBlock(block, one(0, 0))(draft).stations).toHaveLength(200);
    expect(rowsLeftOut(block, 0)).toBe(50);
  });
});
