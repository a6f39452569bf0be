/** More traces than this in one overlay are refused: nobody tells them apart. */
export const OVERLAY_MOST_TRACES = 40;
