import { defaultTheme } from '@univerjs/themes';

/** The grid in the page's colours: kelp for what is chosen, slate for lines and letters. */
export const gridTheme: typeof defaultTheme = {
  ...defaultTheme,
  primary: {
    50: '#eef5f2',
    100: '#deebe6',
    200: '#cadfd7',
    300: '#b2d0c5',
    400: '#7da99a',
    500: '#457f6d',
    600: '#2a6a58',
    700: '#205546',
    800: '#183e33',
    900: '#133027',
  },
  gray: {
    50: '#f7f6f1',
    100: '#f1efe7',
    200: '#dcded7',
    300: '#b4bdb9',
    400: '#7c8b8c',
    500: '#4a5c61',
    600: '#33454a',
    700: '#273335',
    800: '#1d2729',
    900: '#161f21',
  },
};
