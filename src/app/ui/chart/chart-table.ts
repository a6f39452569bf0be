/** What a chart shows, as a table for keyboard, screen reader and download. */
export interface ChartTable {
  caption: string;
  columns: readonly ChartColumn[];
  rows: readonly (readonly string[])[];
}

export interface ChartColumn {
  label: string;
  isNumber?: boolean;
}
