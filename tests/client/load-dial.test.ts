import { nextTick } from 'vue';
import { describe, expect, it, vi } from 'vitest';
import LoadDial from '../../src/components/load-dial/LoadDial.vue';
import {
  angleOf,
  capacityNear,
  DIAL,
  pointAt,
  ringsOf,
  stretchesOf,
} from '../../src/components/load-dial/dial-geometry.ts';
import { mountInApp } from '../support/client/mount.ts';

const curve = {
  angles: [-30, -15, 0, 15, 30],
  capacity: [null, 80, 100, 90, 60],
  governing: [-1, 1, 0, 0, 1],
};
const legend = [
  { id: 'weld-metal', code: 'WM', title: 'Weld metal', part: 'weld' },
  { id: 'bolt-shear', code: 'BS', title: 'Bolt shear', part: 'bolt' },
];

async function dialAt(angle: number) {
  const moved = vi.fn();
  const props = { modelValue: angle, minimum: -80, maximum: 80, curve, legend, 'onUpdate:modelValue': moved };
  await mountInApp(LoadDial, { props });
  const slider = document.querySelector<SVGElement>('[role="slider"]');
  if (!slider) throw new Error('There is no slider');
  const press = async (key: string, shiftKey = false) => {
    slider.dispatchEvent(new KeyboardEvent('keydown', { key, shiftKey, bubbles: true, cancelable: true }));
    await nextTick();
    return moved.mock.lastCall?.[0] as number;
  };
  return { slider, press };
}

describe('the load dial by keyboard', () => {
  it.each([
    ['ArrowUp', false, 31],
    ['ArrowLeft', false, 29],
    ['ArrowRight', true, 35],
    ['PageUp', false, 45],
    ['PageDown', false, 15],
    ['Home', false, -80],
    ['End', false, 80],
  ])('%s (with shift: %s) leads from 30 to %d degrees', async (key, shift, expected) => {
    const { press } = await dialAt(30);
    expect(await press(key, shift)).toBe(expected);
  });

  it('stops at the ends of what the kind covers', async () => {
    const { press } = await dialAt(79);
    expect(await press('PageUp')).toBe(80);
  });

  it('speaks its angle, capacity and governing limit state', async () => {
    const { slider } = await dialAt(15);
    expect(slider.getAttribute('aria-valuenow')).toBe('15');
    expect(slider.getAttribute('aria-valuetext')).toBe('15°, 90 kN, Weld metal');
  });

  it('says where there is no capacity', async () => {
    const { slider } = await dialAt(-30);
    expect(slider.getAttribute('aria-valuetext')).toBe('−30°, no capacity');
  });
});

describe('the geometry of the dial', () => {
  it('finds the angle of a point, and the point of an angle, up for positive', () => {
    for (const angle of [-75, -20, 0, 35, 80]) expect(angleOf(pointAt(angle, 90), -80, 80, 1)).toBe(angle);
    expect(pointAt(45, 100).y).toBeLessThan(DIAL.cy);
  });

  it('holds a point behind the face at the nearer end', () => {
    expect(angleOf({ x: 0, y: 0 }, -80, 80, 1)).toBe(80);
    expect(angleOf({ x: 0, y: 300 }, -80, 80, 1)).toBe(-80);
  });

  it('splits the curve where another limit state governs', () => {
    const parts = stretchesOf(curve).map(({ governing, from, to }) => [governing, from, to]);
    expect(parts).toEqual([
      [-1, -30, -30],
      [1, -15, -15],
      [0, 0, 15],
      [1, 30, 30],
    ]);
  });

  it('reads the lower neighbour between two points, and nothing beside a rejected one', () => {
    expect(capacityNear(curve, 20)).toBe(60);
    expect(capacityNear(curve, -20)).toBeNull();
    expect(capacityNear(curve, 0)).toBe(100);
    expect(capacityNear(curve, 31)).toBeNull();
  });

  it('draws rings at round capacities', () => {
    expect(ringsOf(425)).toEqual([200, 400]);
    expect(ringsOf(0)).toEqual([]);
  });
});
