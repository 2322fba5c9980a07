/** Whether this browser gives a WebGL 2 context at all; the trial context is handed back at once. */
export function supportsWebGl(): boolean {
  try {
    const context = document.createElement("canvas").getContext("webgl2");
    context?.getExtension("WEBGL_lose_context")?.loseContext();
    return context !== null;
  } catch {
    return false;
  }
}
