import { type Injector, LocaleType, LogLevel, type PluginCtor, Univer, mergeLocales } from '@univerjs/core';
import { FUniver } from '@univerjs/core/facade';
import { CalculationMode, UniverSheetsCorePreset } from '@univerjs/preset-sheets-core';
import coreWords from '@univerjs/preset-sheets-core/locales/en-US';
import { UniverSheetsDataValidationPreset } from '@univerjs/preset-sheets-data-validation';
import listWords from '@univerjs/preset-sheets-data-validation/locales/en-US';
import { UniverSheetsDrawingPreset } from '@univerjs/preset-sheets-drawing';
import drawingWords from '@univerjs/preset-sheets-drawing/locales/en-US';
import { type CallListeners, functionClasses } from '../../grid/adapter';
import type { CellFunction } from '../../grid/customFunctions';
import { functionDescriptions } from '../../grid/functionDescriptions';
import type { FunctionList } from '../../grid/functionList';
import { mendEngine } from '../../grid/mendEngine';
import { gridTheme } from './gridTheme';
import '@univerjs/preset-sheets-core/lib/index.css';
import '@univerjs/preset-sheets-data-validation/lib/index.css';
import '@univerjs/preset-sheets-drawing/lib/index.css';

/** The library, started. */
export interface Started {
  readonly api: FUniver;
  readonly injector: Injector;
}

type Registered = PluginCtor | readonly [PluginCtor, unknown];

/** Starts the grid library in an element, with the cell functions of the bundle. */
export function startUniver(
  container: HTMLElement,
  list: FunctionList,
  mappings: ReadonlyMap<string, CellFunction>,
  listeners: CallListeners,
): Started {
  const univer = new Univer({
    theme: gridTheme,
    locale: LocaleType.EN_US,
    locales: { [LocaleType.EN_US]: mergeLocales(coreWords, listWords, drawingWords) },
    logLevel: LogLevel.WARN,
  });
  const core = UniverSheetsCorePreset({
    container,
    header: true,
    toolbar: false,
    formulaBar: true,
    footer: { menus: false, zoomSlider: false },
    disableAutoFocus: true,
    disableTextFormatAlert: true,
    disableTextFormatMark: true,
    sheets: { disableForceStringAlert: true, disableForceStringMark: true, protectedRangeShadow: false },
    formula: {
      function: functionClasses(list, mappings, listeners),
      description: functionDescriptions(list),
      initialFormulaComputing: CalculationMode.WHEN_EMPTY,
    },
  });
  const presets = [
    core,
    UniverSheetsDrawingPreset(),
    UniverSheetsDataValidationPreset({ showEditOnDropdown: false, showSearchOnDropdown: false }),
  ];
  for (const plugin of presets.flatMap((preset) => preset.plugins as readonly Registered[])) {
    if (Array.isArray(plugin)) univer.registerPlugin(plugin[0] as PluginCtor, plugin[1] as never);
    else univer.registerPlugin(plugin as PluginCtor);
  }
  const injector = univer.__getInjector();
  mendEngine(injector);
  return { api: FUniver.newAPI(univer), injector };
}
