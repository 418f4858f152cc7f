/** What became of a file that was handed out. */
export type ShareOutcome = 'shared' | 'downloaded' | 'cancelled';

/**
 * Hands a file to the device's share sheet where it takes files (phones), else downloads it. Must be called from a
 * tap. `cancelled`: the person closed the share sheet; nothing was downloaded.
 */
export async function shareFile(file: File): Promise<ShareOutcome> {
  const isPhone = window.matchMedia('(pointer: coarse)').matches;
  if (!isPhone || typeof navigator.canShare !== 'function' || !navigator.canShare({ files: [file] })) {
    downloadFile(file);
    return 'downloaded';
  }
  try {
    await navigator.share({ files: [file], title: file.name });
    return 'shared';
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') return 'cancelled';
    downloadFile(file);
    return 'downloaded';
  }
}

/** Puts a file among the downloads. */
export function downloadFile(file: File): void {
  const url = URL.createObjectURL(file);
  const link = document.createElement('a');
  link.href = url;
  link.download = file.name;
  document.body.append(link);
  link.click();
  link.remove();
  // some browsers read the address after the click has returned
  setTimeout(() => URL.revokeObjectURL(url), 60_000);
}
