import { describe, expect, it } from 'vitest';
import type { Hand } from '../helpers/hand';
import { handAtBench } from '../helpers/hand';

const shapes = (hand: Hand) => hand.editor.job().outlines.map(({ shape }) => shape);
const last = (hand: Hand) => hand.editor.job().outlines.at(-1);
const selected = (hand: Hand) => hand.editor.store.getState().session.selection.outlines;
const labels = (hand: Hand) => hand.editor.store.getState().history.past.map(({ label }) => label);

describe('drawing a rectangle', () => {
  it('from corner to corner in one drag is one step, and the new outline is selected', () => {
    const hand = handAtBench().tool('rect').drag([20, 30], [60, 50]);
    expect(last(hand)?.shape).toEqual({
      type: 'rect',
      x: 20,
      y: 30,
      width: 40,
      height: 20,
      radius: 0,
      rotate: 0,
    });
    expect(labels(hand)).toEqual(['Draw rectangle']);
    expect(selected(hand)).toEqual([last(hand)?.id]);
    expect(hand.editor.store.getState().session.tool).toBe('select');
  });

  it('from two clicks is the same as from one drag, in any direction', () => {
    const hand = handAtBench().tool('rect').click(60, 50).move(20, 30).click(20, 30);
    expect(last(hand)?.shape).toMatchObject({ x: 20, y: 30, width: 40, height: 20 });
  });

  it('shows its sizes while it grows, and typed ones make it exact', () => {
    const hand = handAtBench().tool('rect').press(10, 10).move(33, 27);
    expect(hand.draft()).toMatchObject({ sizes: [{ value: 23 }, { value: 17 }] });
    hand.sizes(25.4, null);
    expect(last(hand)?.shape).toMatchObject({ x: 10, y: 10, width: 25.4, height: 17 });
  });

  it('with shift is a square', () => {
    const hand = handAtBench().tool('rect').drag([10, 10], [30, 15], { shift: true });
    expect(last(hand)?.shape).toMatchObject({ width: 20, height: 20 });
  });

  it('is dropped by Escape, exactly', () => {
    const hand = handAtBench();
    const before = hand.editor.job();
    hand.tool('rect').press(10, 10).move(30, 30).key('Escape').lift(30, 30);
    expect(hand.editor.job()).toBe(before);
    expect(hand.draft()).toBeNull();
  });

  it('changes nothing in the hand of a reader', () => {
    const hand = handAtBench({ readOnly: true });
    const before = hand.editor.job();
    hand.tool('rect').drag([20, 30], [60, 50]);
    expect(hand.editor.job()).toBe(before);
  });
});

describe('drawing an ellipse', () => {
  it('fills the box', () => {
    const hand = handAtBench().tool('ellipse').drag([20, 30], [60, 50]);
    expect(last(hand)?.shape).toEqual({ type: 'ellipse', cx: 40, cy: 40, rx: 20, ry: 10, rotate: 0 });
  });
});

describe('drawing from point to point', () => {
  it('closes on its first point', () => {
    const hand = handAtBench().tool('polyline');
    hand.click(10, 10).move(50, 10).click(50, 10).click(50, 40).move(10.4, 10.2).click(10.4, 10.2);
    expect(last(hand)?.shape).toMatchObject({ d: 'M10 10 L50 10 L50 40 Z' });
  });

  it('ends open with Enter; Backspace takes a point back', () => {
    const hand = handAtBench().tool('polyline');
    hand.click(0, 0).click(10, 0).click(99, 99).key('Backspace').move(10, 20).click(10, 20).key('Enter');
    expect(last(hand)?.shape).toMatchObject({ d: 'M0 0 L10 0 L10 20' });
  });

  it('takes length and angle as typed', () => {
    const hand = handAtBench().tool('polyline').click(0, 0).move(5, 1).sizes(100, 30).key('Enter');
    expect(last(hand)?.shape).toMatchObject({ d: 'M0 0 L86.6025 50' });
  });
});

describe('selecting and moving', () => {
  it('a click takes what is there, a click on nothing lets go', () => {
    const hand = handAtBench().click(15, 50);
    expect(selected(hand)).toEqual(['part']);
    hand.click(5, 5);
    expect(selected(hand)).toEqual([]);
  });

  it('a drag moves what it took hold of, in one step of the whole way', () => {
    const hand = handAtBench().drag([15, 50], [25, 47]);
    expect(shapes(hand)[0]).toMatchObject({ x: 25, y: 12 });
    expect(labels(hand)).toEqual(['Move outline']);
  });

  it('Escape in the middle of a drag brings it back exactly', () => {
    const hand = handAtBench();
    const before = hand.editor.job();
    hand.press(15, 50).move(40, 60);
    expect(hand.editor.job()).not.toBe(before);
    hand.key('Escape').lift(40, 60);
    expect(hand.editor.job()).toBe(before);
  });

  it('with shift goes level or upright only', () => {
    const hand = handAtBench().press(15, 50).move(40, 52, { shift: true }).lift(40, 52, { shift: true });
    expect(shapes(hand)[0]).toMatchObject({ x: 40, y: 15 });
  });

  it('an outline drawn on the far face goes where the wood goes', () => {
    // Turned about x: up on face A is down on face B.
    const hand = handAtBench().drag([40, 50], [45, 60]);
    expect(selected(hand)).toEqual(['recess']);
    expect(shapes(hand)[1]).toMatchObject({ cx: 65, cy: 40 });
  });

  it('a box takes what lies wholly in it', () => {
    const hand = handAtBench().drag([1, 1], [199, 99]);
    expect(selected(hand)).toEqual(['part', 'recess']);
  });
});

describe('the section line', () => {
  it('is dragged by its end, and Escape puts it back', () => {
    const hand = handAtBench();
    hand.drag([200, 50], [180, 20]);
    expect(hand.editor.store.getState().session.section).toEqual({
      from: { x: 0, y: 50 },
      to: { x: 180, y: 20 },
    });
    hand.press(180, 20).move(100, 20).key('Escape');
    expect(hand.editor.store.getState().session.section.to).toEqual({ x: 180, y: 20 });
  });

  it('stays where it is in the wood when the leaf is turned', () => {
    const hand = handAtBench().drag([200, 50], [180, 20]);
    hand.editor.look({ face: 'B' });
    expect(hand.editor.store.getState().session.section.to).toEqual({ x: 180, y: 80 });
  });
});

describe('the comment tool', () => {
  it('says where, for readers too', () => {
    const hand = handAtBench({ readOnly: true }).tool('comment').click(12, 34);
    expect(hand.comments).toEqual([{ x: 12, y: 34 }]);
  });
});

describe('points for holes', () => {
  it('go into one outline, click after click', () => {
    const hand = handAtBench().tool('points').click(10, 10).click(20, 10);
    expect(last(hand)?.shape).toEqual({
      type: 'points',
      at: [
        [10, 10],
        [20, 10],
      ],
    });
  });
});
