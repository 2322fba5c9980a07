// A picture that turns under a finger must not hold the page fast: where the page can scroll, upright strokes scroll it.

/** Whether anything around the element would scroll up or down. */
export function scrollsVertically(element: HTMLElement): boolean {
  for (let parent = element.parentElement; parent !== null; parent = parent.parentElement) {
    const isRoot = parent === document.documentElement || parent === document.body;
    const { overflowY } = getComputedStyle(parent);
    const mayScroll = isRoot ? overflowY !== "hidden" : overflowY === "auto" || overflowY === "scroll";
    if (mayScroll && parent.scrollHeight > parent.clientHeight + 1) return true;
  }
  return false;
}

/** Sideways strokes and two fingers always turn, shift and zoom the picture. Returns what ends the watching. */
export function keepScrollManners(element: HTMLElement): () => void {
  const settle = () => {
    element.style.touchAction = scrollsVertically(element) ? "pan-y" : "none";
  };
  settle();
  const observer = new ResizeObserver(settle);
  observer.observe(element);
  observer.observe(document.body);
  // A wheel turned over a picture that nobody has chosen means the page.
  const passWheel = (event: WheelEvent) => {
    const isChosen = document.activeElement === element || event.ctrlKey;
    if (!isChosen && scrollsVertically(element)) event.stopImmediatePropagation();
  };
  element.addEventListener("wheel", passWheel, { capture: true });
  return () => {
    observer.disconnect();
    element.removeEventListener("wheel", passWheel, { capture: true });
  };
}
