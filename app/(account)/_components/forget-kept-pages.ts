// Lets the service worker forget the night sheets that it keeps for when there is no network.

export function forgetKeptPages(): void {
  // Absent on plain http and in old browsers; then nothing was kept.
  navigator.serviceWorker?.controller?.postMessage('forget')
}
