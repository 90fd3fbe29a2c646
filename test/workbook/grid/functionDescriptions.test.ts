import { BooleanNumber } from '@univerjs/core';
import { FunctionType } from '@univerjs/engine-formula';
import { expect, it } from 'vitest';
import { functionDescriptions } from '../../../workbook/grid/functionDescriptions';

it('describes functions for the grid as functions.json does', () => {
  const list = {
    functions: [
      {
        id: 'LATENT',
        name: 'LATENT',
        description: 'Latent heat.',
        parameters: [
          { name: 'substance', description: 'Name.' },
          { name: 'temperature', optional: true },
          { name: 'settings', repeating: true },
        ],
      },
    ],
  };
  const parameter = (name: string, detail: string, required: boolean, repeats: boolean) => ({
    name,
    detail,
    example: '',
    require: required ? BooleanNumber.TRUE : BooleanNumber.FALSE,
    repeat: repeats ? BooleanNumber.TRUE : BooleanNumber.FALSE,
  });
  expect(functionDescriptions(list)).toEqual([
    {
      functionName: 'LATENTRY.LATENT',
      functionType: FunctionType.User,
      description: 'Latent heat.',
      abstract: 'Latent heat.',
      functionParameter: [
        parameter('substance', 'Name.', true, false),
        parameter('temperature', '', false, false),
        parameter('settings', '', false, true),
      ],
    },
  ]);
});
