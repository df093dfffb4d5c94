import { render, waitFor } from '@testing-library/react';
import { useWakeLock } from './useWakeLock';

function Lit() {
  useWakeLock();
  return null;
}

function offerWakeLock(request: () => Promise<{ release: () => Promise<void> }>) {
  Object.defineProperty(navigator, 'wakeLock', { configurable: true, value: { request } });
}

afterEach(() => Reflect.deleteProperty(navigator, 'wakeLock'));

describe('keeping the screen on', () => {
  it('asks at once, again when the page comes back to the front, and lets go on leaving', async () => {
    const events: string[] = [];
    const release = () => Promise.resolve(void events.push('let go'));
    offerWakeLock(() => {
      events.push('asked');
      return Promise.resolve({ release });
    });
    const { unmount } = render(<Lit />);
    await waitFor(() => expect(events).toEqual(['asked']));
    document.dispatchEvent(new Event('visibilitychange'));
    await waitFor(() => expect(events).toEqual(['asked', 'asked']));
    unmount();
    await waitFor(() => expect(events).toContain('let go'));
    document.dispatchEvent(new Event('visibilitychange'));
    expect(events.filter((event) => event === 'asked')).toHaveLength(2);
  });

  it('does without where the browser refuses', async () => {
    let asked = false;
    offerWakeLock(() => {
      asked = true;
      return Promise.reject(new DOMException('battery low', 'NotAllowedError'));
    });
    const { unmount } = render(<Lit />);
    await waitFor(() => expect(asked).toBe(true));
    unmount();
  });

  it('does without where the browser can’t', () => {
    expect(() => render(<Lit />).unmount()).not.toThrow();
  });
});
