import { describe, expect, test } from 'vitest';
import { chevronPaths, gripPath, handlePart, tagShape } from '$lib/charts/handle-shape';
import { PressDrag, type Press } from '$lib/charts/press-drag';

function recorder() {
  const log: string[] = [];
  const drag = new PressDrag({
    start: () => log.push('start'),
    move: (x) => log.push(`move ${x}`),
    end: () => log.push('end')
  });
  return { log, drag };
}

const at = (clientX: number, clientY = 0, pointerType = 'mouse', more: Partial<Press> = {}): Press => ({
  pointerId: 1,
  button: 0,
  pointerType,
  clientX,
  clientY,
  ...more
});

describe('mouse', () => {
  test('drags from the first press, and is one drag', () => {
    const { log, drag } = recorder();
    expect(drag.down(at(10))).toBe(true);
    drag.move(at(11));
    drag.move(at(30, 90));
    drag.up(at(30));
    drag.move(at(50));
    expect(log).toEqual(['start', 'move 10', 'move 11', 'move 30', 'end']);
  });

  test('moves nothing by hovering, nor with another button', () => {
    const { log, drag } = recorder();
    drag.move(at(10));
    expect(drag.down(at(10, 0, 'mouse', { button: 2 }))).toBe(false);
    drag.move(at(20));
    expect(log).toEqual([]);
  });
});

describe('finger', () => {
  test('a swipe up or down changes nothing', () => {
    const { log, drag } = recorder();
    drag.down(at(10, 0, 'touch'));
    drag.move(at(12, 20, 'touch'));
    drag.cancel(at(12, 20, 'touch'));
    expect(log).toEqual([]);
  });

  test('nor does one that the browser leaves to us', () => {
    const { log, drag } = recorder();
    drag.down(at(10, 0, 'touch'));
    drag.move(at(11, 30, 'touch'));
    drag.up(at(11, 60, 'touch'));
    expect(log).toEqual([]);
  });

  test('nor does a slanting one that is more up than across', () => {
    const { log, drag } = recorder();
    drag.down(at(10, 0, 'touch'));
    drag.move(at(16, 12, 'touch'));
    drag.up(at(20, 24, 'touch'));
    expect(log).toEqual([]);
  });

  test('a move sideways drags', () => {
    const { log, drag } = recorder();
    drag.down(at(10, 0, 'touch'));
    drag.move(at(12, 0, 'touch'));
    drag.move(at(20, 3, 'touch'));
    drag.up(at(20, 3, 'touch'));
    expect(log).toEqual(['start', 'move 20', 'end']);
  });

  test('a tap counts when it is lifted', () => {
    const { log, drag } = recorder();
    drag.down(at(10, 0, 'touch'));
    expect(log).toEqual([]);
    drag.up(at(11, 1, 'touch'));
    expect(log).toEqual(['start', 'move 10', 'end']);
  });

  test('a second finger is not taken', () => {
    const { log, drag } = recorder();
    drag.down(at(10, 0, 'touch'));
    drag.move(at(30, 0, 'touch'));
    expect(drag.down(at(90, 0, 'touch', { pointerId: 2 }))).toBe(false);
    drag.move(at(95, 0, 'touch', { pointerId: 2 }));
    drag.up(at(95, 0, 'touch', { pointerId: 2 }));
    expect(log).toEqual(['start', 'move 30']);
  });
});

test('a drag that the browser takes away is over, once', () => {
  const { log, drag } = recorder();
  drag.down(at(10));
  drag.cancel();
  drag.cancel();
  drag.up(at(20));
  expect(log).toEqual(['start', 'move 10', 'end']);
});

test('a press with a tap of its own waits even for a mouse', () => {
  const { log, drag } = recorder();
  drag.down(at(10), () => log.push('tap'));
  drag.up(at(11));
  drag.down(at(10), () => log.push('tap'));
  drag.move(at(18));
  drag.up(at(18));
  expect(log).toEqual(['tap', 'start', 'move 18', 'end']);
});

describe('the handle', () => {
  test('stays within the drawing and still points at the cursor', () => {
    const shape = tagShape('85 L net', 795, 800, true);
    expect(shape.middle + shape.width / 2).toBe(800);
    expect(gripPath(shape, 795)).toContain('L795,24');
    expect(gripPath(shape, 795)).not.toContain('L802');
  });

  test('shows a chevron only where there is room for it', () => {
    expect(chevronPaths(tagShape('85 L net', 400, 800, true), 800)).toHaveLength(2);
    expect(chevronPaths(tagShape('85 L net', 799, 800, true), 800)).toHaveLength(1);
  });

  test('is grip, chevrons and nothing else', () => {
    const shape = { middle: 400, width: 80 };
    expect(handlePart(shape, 400, 45)).toBe('grip');
    expect(handlePart(shape, 340, 45)).toBe('less');
    expect(handlePart(shape, 460, 45)).toBe('more');
    expect(handlePart(shape, 500, 45)).toBeNull();
    expect(handlePart(shape, 400, 10)).toBeNull();
  });
});
