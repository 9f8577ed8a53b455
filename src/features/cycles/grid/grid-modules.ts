import {
  CellStyleModule,
  ClientSideRowModelModule,
  CustomEditorModule,
  ModuleRegistry,
  PinnedRowModule,
  RenderApiModule,
  RowStyleModule,
  ScrollApiModule,
  TextEditorModule,
  ValidationModule,
} from "ag-grid-community";

const used = [
  ClientSideRowModelModule,
  PinnedRowModule,
  CustomEditorModule,
  TextEditorModule,
  CellStyleModule,
  RowStyleModule,
  RenderApiModule,
  ScrollApiModule,
];

ModuleRegistry.registerModules(process.env.NODE_ENV === "development" ? [...used, ValidationModule] : used);
