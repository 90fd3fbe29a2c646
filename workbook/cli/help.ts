export const GENERAL_HELP = `Latentry: heat of phase change in workbook cells, and on the command line

  latentry calc FORMULA...   evaluate formulas
  latentry calc -            evaluate formulas from standard input, a line each
  latentry new -o FILE.xlsx  write the standard workbook
  latentry COMMAND --help    more on one command
  latentry --version         edition of the functions

Answers serve engineering calculation only. Where pressure, steam, cryogens, flammable vapour, relief or
refrigeration sizing, food or drug processes are at stake, local codes and licensed practice decide.
`;

export const CALC_HELP = `latentry calc FORMULA... [--units TEXT] [--book FILE.xlsx] [--json]
latentry calc -          [--units TEXT] [--book FILE.xlsx] [--json]

Evaluates each formula by itself; the leading = may be left out. With - formulas come from standard input, a line each.
Put formulas in single quotes, so that the shell leaves them alone:

  latentry calc 'LATENTRY.LATENT("water","vaporization",60)'
  latentry calc 'LATENTRY.LATENT("water","vaporization",{0;50;100})' --units "temperature=degC; heat=kJ/mol"
  latentry calc 'SUM(Data!B2:B9)' --book plant.xlsx

  --units TEXT       unit settings as "key=value; key=value": temperature, pressure, barometer, heat, heat_capacity,
                     amount, energy, flow, power, out_of_range, decimal
  --book FILE.xlsx   a workbook whose cells and names the formulas may use; it is calculated, not changed
  --json             one JSON line a formula; so it is, too, where the output is no terminal:
                     {"formula","value"}, {"formula","values":[[...]]} or {"formula","error","message"}

Exit: 0 all evaluated, 1 a formula gave an error, 2 called wrongly, 3 a defect of this program.
`;

export const NEW_HELP = `latentry new -o FILE.xlsx [--force]

Writes the standard workbook with all its formulas calculated: Cover, Units, Latent heat, ΔCp fit, Checks.

  -o, --output FILE.xlsx   where to write it
  --force                  write over a file that is there

Exit: 0 written, 1 written but a formula in it gave an error, 2 called wrongly or the file could not be written.
`;
