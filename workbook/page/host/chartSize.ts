export const CHART_WIDTH_PX = 480;
export const CHART_HEIGHT_PX = 320;
