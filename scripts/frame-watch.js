/**
 * Runs in the page, before its own scripts. A gain input is noted when it happens; the paint that answers it is the end of the first
 * frame in, or after, which the curves of a chart changed. Inputs that came meanwhile count from the oldest.
 */
(() => {
  const charts = {};
  const waiting = new Map();
  let changed = new Set();
  const kindOf = (picture) => {
    const label = picture.getAttribute('aria-label') ?? '';
    if (label.startsWith('Loop gain')) return 'frequency';
    return /^(Nyquist|Nichols)/.test(label) ? 'plane' : 'time';
  };
  const onInput = ({ timeStamp }) => {
    for (const kind of ['frequency', 'plane', 'time']) if (!waiting.has(kind)) waiting.set(kind, timeStamp);
  };
  addEventListener('pointermove', (event) => event.buttons > 0 && onInput(event), true);
  addEventListener('keydown', onInput, true);

  const onMutations = (records) => {
    for (const { target } of records) {
      const picture = target instanceof Element ? target.closest('[role=img]') : null;
      if (picture !== null) changed.add(kindOf(picture));
    }
  };
  new MutationObserver(onMutations).observe(document, { subtree: true, attributes: true, attributeFilter: ['d'] });

  const afterPaint = new MessageChannel();
  afterPaint.port1.onmessage = () => {
    const now = performance.now();
    for (const kind of changed) {
      const since = waiting.get(kind);
      if (since === undefined) continue;
      waiting.delete(kind);
      (charts[kind] ??= []).push(now - since);
    }
    changed = new Set();
  };
  const onFrame = () => {
    afterPaint.port2.postMessage(null);
    requestAnimationFrame(onFrame);
  };
  requestAnimationFrame(onFrame);

  const frameWatch = {
    clear: () => {
      for (const kind of Object.keys(charts)) charts[kind] = [];
      waiting.clear();
    },
    times: () => charts,
  };
  Object.assign(window, { frameWatch });
})();
