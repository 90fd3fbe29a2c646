import { createDarkTheme, createLightTheme, type BrandVariants, type Theme } from '@fluentui/react-components';

/** Colours of the plot, beside the tokens of the component library. */
export interface PaneTheme extends Theme {
  readonly plotPoint: string;
  readonly plotLine: string;
  readonly plotBand: string;
  readonly plotAxis: string;
  readonly warmAccent: string;
  readonly paper: string;
}

/** Kelp, from deep water to the surface. */
const kelp: BrandVariants = {
  10: '#08130f',
  20: '#0e211b',
  30: '#133027',
  40: '#183e33',
  50: '#1c4a3d',
  60: '#205546',
  70: '#245f4e',
  80: '#2a6a58',
  90: '#457f6d',
  100: '#619483',
  110: '#7da99a',
  120: '#98bdb0',
  130: '#b2d0c5',
  140: '#cadfd7',
  150: '#deebe6',
  160: '#eef5f2',
};

const type = {
  fontFamilyBase: "Seravek, 'Gill Sans Nova', Ubuntu, Calibri, 'DejaVu Sans', source-sans-pro, sans-serif",
  fontFamilyNumeric: "Seravek, 'Gill Sans Nova', Ubuntu, Calibri, 'DejaVu Sans', source-sans-pro, sans-serif",
  borderRadiusMedium: '3px',
};

/** Serif of the headings; the component library has no token for it. */
export const headingFamily = "Charter, 'Bitstream Charter', 'Sitka Text', Cambria, 'DejaVu Serif', serif";

export const lightTheme: PaneTheme = {
  ...createLightTheme(kelp),
  ...type,
  colorNeutralForeground1: '#1c2b2f',
  colorNeutralForeground2: '#33454a',
  colorNeutralForeground2Hover: '#1c2b2f',
  colorNeutralForeground3: '#4a5c61',
  colorNeutralForeground4: '#54666b',
  colorNeutralBackground1: '#ffffff',
  colorNeutralBackground2: '#f1efe7',
  colorNeutralStroke1: '#b4bdb9',
  colorNeutralStroke2: '#d5d8d1',
  colorNeutralStrokeAccessible: '#5b6c6f',
  plotPoint: '#205546',
  plotLine: '#b25a14',
  plotBand: '#b25a1433',
  plotAxis: '#33454a',
  warmAccent: '#9a4a0c',
  paper: '#fbf9f3',
};

export const darkTheme: PaneTheme = {
  ...createDarkTheme(kelp),
  ...type,
  colorNeutralForeground1: '#e9eeeb',
  colorNeutralForeground2: '#c9d3cf',
  colorNeutralForeground3: '#b0bdb8',
  colorNeutralForeground4: '#a3b0ab',
  colorNeutralBackground1: '#1d2729',
  colorNeutralBackground2: '#273335',
  colorNeutralStroke1: '#56666a',
  colorNeutralStroke2: '#3b494c',
  colorNeutralStrokeAccessible: '#95a5a6',
  colorBrandForeground1: kelp[120],
  colorCompoundBrandForeground1: kelp[120],
  colorCompoundBrandStroke: kelp[110],
  colorBrandBackground: kelp[80],
  plotPoint: '#98bdb0',
  plotLine: '#f0a35e',
  plotBand: '#f0a35e40',
  plotAxis: '#c9d3cf',
  warmAccent: '#f0a35e',
  paper: '#161f21',
};

/** The system's own colours, where the person has chosen a contrast theme. */
function systemColour(token: string, value: string): string {
  if (!token.startsWith('color') || value === 'transparent') return value;
  if (/Disabled/.test(token)) return 'GrayText';
  if (/OnBrand/.test(token)) return 'HighlightText';
  if (/Brand.*Background|BrandBackground/.test(token) && !/Background2|Inverted/.test(token)) return 'Highlight';
  if (/Background/.test(token)) return 'Canvas';
  return /Link/.test(token) ? 'LinkText' : 'CanvasText';
}

export const contrastTheme: PaneTheme = {
  ...lightTheme,
  ...Object.fromEntries(
    Object.entries(lightTheme).map(([token, value]) => [
      token,
      typeof value === 'string' ? systemColour(token, value) : value,
    ]),
  ),
  plotPoint: 'CanvasText',
  plotLine: 'Highlight',
  plotBand: 'GrayText',
  plotAxis: 'CanvasText',
  warmAccent: 'CanvasText',
  paper: 'Canvas',
};
