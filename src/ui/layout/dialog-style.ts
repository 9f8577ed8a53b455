/** What all dialogs share. */
export const overlayStyle = "fixed inset-0 z-40 bg-veil";
export const dialogStyle =
  "fixed top-1/2 left-1/2 z-50 max-h-[calc(100dvh-2rem)] w-[min(30rem,calc(100vw-2rem))] -translate-x-1/2 -translate-y-1/2 overflow-y-auto rounded-dialog border border-hair bg-sheet p-5 shadow-float";
