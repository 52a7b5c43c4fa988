/** Whether this machine gives a WebGL 2 context. Tried once on a canvas of its own, which is let go again. */
export function webglThere(): boolean {
  const canvas = document.createElement('canvas');
  try {
    const context = canvas.getContext('webgl2');
    if (context === null) return false;
    context.getExtension('WEBGL_lose_context')?.loseContext();
    return true;
  } catch {
    // Some machines throw where the standard asks for null.
    return false;
  }
}
