/**
 * Runs in a worker of the page: makes it as much slower as the page's own thread is made, which is all that the browser's throttle
 * reaches. A reply is held back until so many times the time has passed that the work for it took.
 */
(rate) => {
  const { onmessage, postMessage } = self;
  let begun = 0;
  self.onmessage = (event) => {
    begun = performance.now();
    onmessage.call(self, event);
  };
  self.postMessage = (reply) => {
    const end = begun + rate * (performance.now() - begun);
    while (performance.now() < end);
    postMessage.call(self, reply);
  };
};
