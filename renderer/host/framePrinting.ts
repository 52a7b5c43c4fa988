/** Lays a report out in a frame of its own, in which no script runs, and opens the browser's printing dialog for it. */
export async function printInFrame(page: Window, html: string): Promise<void> {
  const { document } = page;
  const frame = document.createElement('iframe');
  frame.title = 'Report to print';
  frame.setAttribute('sandbox', 'allow-same-origin allow-modals');
  frame.setAttribute('aria-hidden', 'true');
  frame.tabIndex = -1;
  // Out of sight, yet laid out: a frame that is not displayed prints nothing.
  frame.style.cssText = 'position:fixed;left:-10000px;top:0;width:210mm;height:297mm;border:0';
  const loaded = new Promise<void>((resolve) => {
    frame.addEventListener('load', () => resolve(), { once: true });
  });
  frame.srcdoc = html;
  document.body.append(frame);
  try {
    await loaded;
    const inside = frame.contentWindow;
    if (inside === null) throw new Error('The browser did not lay the report out.');
    await inside.document.fonts.ready;
    inside.focus();
    // Waits for the dialog to close, in every browser that shows one.
    inside.print();
  } finally {
    frame.remove();
  }
}
