import { dewPoint } from '@/api/engine/limits/psychrometrics';

/** Dew point [°C] of air [°C] at a relative humidity [%]; null where nothing sensible was typed yet. */
export function dewPointOf(air: number | undefined, humidity: number | undefined): number | null {
  if (air === undefined || humidity === undefined) return null;
  if (!(air >= -60 && air <= 80) || !(humidity > 0 && humidity <= 100)) return null;
  return dewPoint(air, humidity);
}
