import { themeQuartz } from 'ag-grid-community';
import { FONT_FAMILY } from '../theme';

/** The look of every grid: rules between rows, no frame, the page's colours in both themes. */
export const gridTheme = themeQuartz.withParams({
  accentColor: 'var(--damson)',
  backgroundColor: 'var(--sheet)',
  foregroundColor: 'var(--ink)',
  textColor: 'var(--ink)',
  chromeBackgroundColor: 'var(--paper)',
  headerBackgroundColor: 'var(--paper)',
  headerTextColor: 'var(--muted)',
  headerFontWeight: 400,
  headerFontSize: 13,
  headerHeight: 36,
  headerRowBorder: { color: 'var(--ink)', width: 1 },
  headerColumnResizeHandleColor: 'transparent',
  borderColor: 'var(--rule)',
  borderRadius: 4,
  wrapperBorder: false,
  wrapperBorderRadius: 0,
  columnBorder: false,
  rowBorder: { color: 'var(--rule)', width: 1 },
  rowHeight: 32,
  rowHoverColor: 'var(--hover)',
  selectedRowBackgroundColor: 'var(--damson-wash)',
  cellHorizontalPadding: 10,
  fontFamily: FONT_FAMILY,
  fontSize: 15,
  browserColorScheme: 'inherit',
});
