import { GAS_CONSTANT_L_BAR } from '../../data/constants.ts';
import { inputError } from '../../errors.ts';
import { toBase } from './convert.ts';
import { makeUnit, type Unit } from './unit.ts';

/** Litres in each volume to which a trade puts a reference temperature and pressure. */
const LITRES: Readonly<Record<string, number>> = { Nm3: 1000, Sm3: 1000, scf: 28.316846592 };

const GAS_VOLUME = /^(Nm3|Sm3|scf) ?(?:\(([^(),]*),([^(),]*)\))?$/;

/**
 * A volume of gas at its reference, as the amount of ideal gas in it: p V/(R T).
 *
 * `Nm3(0 degC, 1.01325 bar)`; null where the text is no gas volume. References differ between
 * trades and countries (0, 15, 20 and 60 degF; 1 atm and 1 bar), so none is taken for granted.
 * Errors: unit-reference, where none is stated or it is not a temperature and a pressure.
 */
export function gasVolume(text: string, readUnit: (text: string) => Unit): Unit | null {
  const found = GAS_VOLUME.exec(text);
  if (!found) return null;
  const volume = found[1]!;
  const temperatureK = measured(found[2], 'temperature', readUnit);
  const pressureBar = measured(found[3], 'pressure', readUnit);
  if (!temperatureK || !pressureBar) throw inputError('unit-reference', { unit: text, volume });
  return makeUnit({
    text: `${volume}(${found[2]!.trim()}, ${found[3]!.trim()})`,
    quantity: 'gas volume',
    numerator: pressureBar * LITRES[volume]!,
    denominator: GAS_CONSTANT_L_BAR * temperatureK,
  });
}

/** The reference in base units; null unless it is a value above 0 of the wanted quantity. */
function measured(
  text: string | undefined,
  quantity: string,
  readUnit: (text: string) => Unit,
): number | null {
  const found = /^(-?\d{1,9}(?:\.\d{1,9})?) ?(.+)$/.exec(text?.trim() ?? '');
  if (!found) return null;
  const unit = readUnit(found[2]!);
  const value = toBase(Number(found[1]), unit);
  return unit.quantity === quantity && value > 0 ? value : null;
}
