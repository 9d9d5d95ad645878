import { themeQuartz } from "ag-grid-community";

/** Colours of the grid; values are those of `tokens.css`, which the grid cannot read while it measures itself. */
type GridColours = {
  scheme: "light" | "dark";
  paper: string;
  sheet: string;
  ink: string;
  ink2: string;
  rule: string;
  rule2: string;
  petrol: string;
  petrolWash: string;
  bad: string;
};

const LIGHT: GridColours = {
  scheme: "light",
  paper: "#F8F4EA",
  sheet: "#FFFDF7",
  ink: "#1B2322",
  ink2: "#46504E",
  rule: "#D8D0BD",
  rule2: "#8A8473",
  petrol: "#0B5064",
  petrolWash: "#DBE8E9",
  bad: "#8A0F45",
};

const DARK: GridColours = {
  scheme: "dark",
  paper: "#161A1A",
  sheet: "#1D2222",
  ink: "#F2EDE0",
  ink2: "#C6C5BA",
  rule: "#3A413F",
  rule2: "#7C857F",
  petrol: "#79C6DA",
  petrolWash: "#153942",
  bad: "#F97C96",
};

function line(width: number, color: string) {
  return { style: "solid", width, color } as const;
}

function colours(c: GridColours) {
  return {
    browserColorScheme: c.scheme,
    backgroundColor: c.paper,
    dataBackgroundColor: c.paper,
    headerBackgroundColor: c.paper,
    chromeBackgroundColor: c.paper,
    oddRowBackgroundColor: c.paper,
    foregroundColor: c.ink,
    textColor: c.ink,
    cellTextColor: c.ink,
    headerTextColor: c.ink2,
    subtleTextColor: c.ink2,
    accentColor: c.petrol,
    borderColor: c.rule,
    rowHoverColor: c.sheet,
    selectedRowBackgroundColor: c.petrolWash,
    invalidColor: c.bad,
    pinnedRowBackgroundColor: c.paper,
    tooltipBackgroundColor: c.ink,
    tooltipTextColor: c.paper,
    inputBackgroundColor: c.sheet,
    checkboxCheckedBackgroundColor: c.petrol,
    checkboxUncheckedBorderColor: c.ink,
    rowBorder: line(1, c.rule),
    headerRowBorder: line(1.5, c.ink),
    pinnedRowBorder: line(1.5, c.ink),
    cellEditingBorder: line(2, c.petrol),
    inputFocusBorder: line(2, c.petrol),
    focusShadow: `0 0 0 3px ${c.petrol}`,
    headerColumnResizeHandleColor: c.rule2,
  } as const;
}

/** The grid in our look: ruled, no boxes, numbers as in tables. The mode is read from `data-ag-theme-mode` on html. */
export const gridTheme = themeQuartz
  .withParams({
    fontFamily: '"Source Sans 3", system-ui, sans-serif',
    fontSize: 16,
    cellFontSize: 16,
    headerFontSize: 15,
    headerFontWeight: 600,
    rowHeight: 37,
    headerHeight: 40,
    spacing: 8,
    cellHorizontalPadding: 10,
    iconSize: 16,
    borderRadius: 3,
    wrapperBorder: false,
    wrapperBorderRadius: 0,
    columnBorder: false,
    headerColumnBorder: false,
    pinnedColumnBorder: false,
    pinnedRowFontWeight: 600,
    cellEditingShadow: "none",
    popupShadow: "none",
    dropdownShadow: "none",
    inputFocusShadow: "none",
    inputHeight: 36,
    checkboxBorderRadius: 2,
    checkboxBorderWidth: 2,
  })
  .withParams(colours(LIGHT), "light")
  .withParams(colours(DARK), "dark");
