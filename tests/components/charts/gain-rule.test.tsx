import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { EdgeRuler, GainRule } from '@/components/charts';

const rule = (rest: Partial<Parameters<typeof GainRule>[0]> = {}) => {
  const onChange = vi.fn();
  render(<GainRule name="Kp" unit="kN·m/(m/s)" value={1.05} kept={1} span={3.2} width={366} onChange={onChange} {...rest} />);
  return { onChange, slider: screen.getByRole('slider', { name: 'Kp' }) };
};

function pointer(target: Element, type: string, clientX: number, pointerId = 1) {
  const event = new MouseEvent(type, { bubbles: true, clientX });
  Object.defineProperty(event, 'pointerId', { value: pointerId });
  fireEvent(target, event);
}

afterEach(cleanup);

describe('a gain rule', () => {
  it('is a slider with its value in words', () => {
    const { slider } = rule();
    expect(slider.getAttribute('aria-valuenow')).toBe('1.05');
    expect(slider.getAttribute('aria-valuetext')).toBe('1.05 kN·m/(m/s)');
  });

  it.each([
    [{ key: 'ArrowRight' }, 1.0605],
    [{ key: 'ArrowLeft', shiftKey: true }, 0.945],
    [{ key: 'ArrowUp', altKey: true }, 1.051],
  ])('answers the key %o', (key, value) => {
    const { onChange, slider } = rule();
    fireEvent.keyDown(slider, key);
    expect(onChange.mock.calls[0][0]).toBeCloseTo(value, 2);
    expect(onChange.mock.calls[0][1]).toBe('end');
  });

  it('tells every move of a drag and its end once', () => {
    const { onChange, slider } = rule();
    pointer(slider, 'pointerdown', 200);
    pointer(slider, 'pointermove', 180);
    pointer(slider, 'pointermove', 150);
    pointer(slider, 'pointerup', 150);
    expect(onChange.mock.calls.map(([, phase]) => phase)).toEqual(['move', 'move', 'end']);
    const [first, second, last] = onChange.mock.calls.map(([value]) => Number(value));
    expect(first).toBeGreaterThan(1.05);
    expect(second).toBeGreaterThan(first);
    expect(last).toBe(second);
  });

  it('does not take a tap for a drag', () => {
    const { onChange, slider } = rule();
    pointer(slider, 'pointerdown', 200);
    pointer(slider, 'pointermove', 201);
    pointer(slider, 'pointerup', 201);
    expect(onChange).not.toHaveBeenCalled();
  });

  it('moves a tenth with two fingers', () => {
    const far = (fingers: number) => {
      const { onChange, slider } = rule();
      for (let id = 1; id <= fingers; id++) pointer(slider, 'pointerdown', 200, id);
      pointer(slider, 'pointermove', 200);
      pointer(slider, 'pointermove', 100);
      cleanup();
      return Number(onChange.mock.calls.at(-1)?.[0]) - 1.05;
    };
    const ratio = Math.log1p(far(2) / 1.05) / Math.log1p(far(1) / 1.05);
    expect(ratio).toBeCloseTo(0.1, 2);
  });

  it('lies still when it is disabled', () => {
    const { onChange, slider } = rule({ disabled: true });
    fireEvent.keyDown(slider, { key: 'ArrowRight' });
    expect(onChange).not.toHaveBeenCalled();
  });
});

describe('an edge ruler', () => {
  it('says in words what it shows', () => {
    render(
      <EdgeRuler
        uses={[-2, 0.4]}
        worst={0.4}
        hasTarget
        label="Ms 1.63, target 1.60, limit 1.70"
        names={{ limit: 'limit 1.70' }}
        width={366}
      />,
    );
    expect(screen.getByRole('img', { name: 'Ms 1.63, target 1.60, limit 1.70' })).toBeTruthy();
    expect(screen.getByText('limit 1.70')).toBeTruthy();
  });
});
