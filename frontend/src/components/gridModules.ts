import {
  CellStyleModule,
  ClientSideRowModelModule,
  ColumnApiModule,
  LocaleModule,
  CustomEditorModule,
  ModuleRegistry,
  PinnedRowModule,
  RowApiModule,
  RowSelectionModule,
  RowStyleModule,
  ScrollApiModule,
  SelectEditorModule,
  TextEditorModule,
} from 'ag-grid-community';

/** The parts of the grid that the pages use; every page with a grid imports this file. */
ModuleRegistry.registerModules([
  CellStyleModule,
  ClientSideRowModelModule,
  ColumnApiModule,
  LocaleModule,
  CustomEditorModule,
  PinnedRowModule,
  RowApiModule,
  RowSelectionModule,
  RowStyleModule,
  ScrollApiModule,
  SelectEditorModule,
  TextEditorModule,
]);
