/**
 * Runs in a worker of the page: makes it as much slower as the page's own thread is made, which is all that the browser's throttle
 * reaches. A reply and whatever comes after it are held back until so many times the time has passed that the work took. It waits
 * without working: the machine's other core belongs to the page.
 */
export default (rate) => {
  const { onmessage, postMessage } = self;
  const asked = [];
  let busy = false;
  const answer = (event) => {
    busy = true;
    const replies = [];
    self.postMessage = (reply) => replies.push(reply);
    const begun = performance.now();
    onmessage.call(self, event);
    const spent = performance.now() - begun;
    setTimeout(
      () => {
        for (const reply of replies) postMessage.call(self, reply);
        const next = asked.shift();
        if (next) answer(next);
        else busy = false;
      },
      (rate - 1) * spent,
    );
  };
  self.onmessage = (event) => {
    if (busy) asked.push(event);
    else answer(event);
  };
};
