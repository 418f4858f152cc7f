// These functions run in the page: each is sent there alone and must not use anything around it.

/** Where the page, its scrolling part or an open sheet can be moved sideways. */
export function sidewaysFaults() {
  const scrollers = [document.documentElement, document.body];
  for (const content of document.querySelectorAll('.ion-page:not(.ion-page-hidden) ion-content')) {
    const inner = content.shadowRoot?.querySelector('.inner-scroll');
    if (inner) scrollers.push(inner);
  }
  scrollers.push(...document.querySelectorAll('dialog[open], .hm-sheet-content'));
  const faults = scrollers
    .filter((element) => element.clientWidth > 0 && element.scrollWidth > element.clientWidth + 1)
    .map((element) => `scrolls sideways: ${element.className || element.tagName} ${element.scrollWidth}`);
  const isClipped = (element) => {
    for (let above = element.parentElement; above; above = above.parentElement)
      if (getComputedStyle(above).overflowX !== 'visible') return true;
    return false;
  };
  for (const element of document.querySelectorAll('button, a, input, select, h1, h2, p')) {
    const { right, width, height } = element.getBoundingClientRect();
    if (width * height === 0 || right <= window.innerWidth + 1 || isClipped(element)) continue;
    faults.push(`cut off at the right: ${element.tagName} "${element.textContent.trim().slice(0, 30)}"`);
  }
  return faults.slice(0, 5);
}

/** Text that is drawn smaller than 12 px, drawings included. */
export function smallTextFaults() {
  const smallest = 12;
  const seen = new Set();
  const walker = document.createTreeWalker(document.body, NodeFilter.SHOW_TEXT);
  while (walker.nextNode()) {
    const element = walker.currentNode.parentElement;
    if (!element || walker.currentNode.textContent.trim() === '' || element.closest('.only-heard')) continue;
    const { width, height } = element.getBoundingClientRect();
    if (width * height === 0) continue;
    const drawn = typeof element.getScreenCTM === 'function' ? (element.getScreenCTM()?.a ?? 1) : 1;
    const size = Number.parseFloat(getComputedStyle(element).fontSize) * drawn;
    if (size < smallest - 0.01)
      seen.add(`${size.toFixed(1)} px: "${walker.currentNode.textContent.trim().slice(0, 30)}"`);
  }
  return [...seen].slice(0, 5).map((what) => `small text, ${what}`);
}
