import {
  CellStyleModule,
  ColumnApiModule,
  EventApiModule,
  InfiniteRowModelModule,
  ModuleRegistry,
  RowApiModule,
  RowStyleModule,
  ScrollApiModule,
} from "ag-grid-community";

/** Only what lists need; a page with more registers its own beside it. */
export function registerListModules(): void {
  ModuleRegistry.registerModules([
    CellStyleModule,
    ColumnApiModule,
    EventApiModule,
    InfiniteRowModelModule,
    RowApiModule,
    RowStyleModule,
    ScrollApiModule,
  ]);
}
