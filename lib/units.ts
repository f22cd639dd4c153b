/** Inside the code: SI. On screen: the trade's units. These are the only crossings. */

/** 1 W/m² = 100 µW/cm². */
export const toMicrowattsPerCm2 = (wattsPerM2: number): number => wattsPerM2 * 100;

/** 10 J/m² = 1 mJ/cm². */
export const toMillijoulesPerCm2 = (joulesPerM2: number): number => joulesPerM2 / 10;
export const fromMillijoulesPerCm2 = (millijoulesPerCm2: number): number => millijoulesPerCm2 * 10;

export const toRadians = (degrees: number): number => (degrees * Math.PI) / 180;
export const toDegrees = (radians: number): number => (radians * 180) / Math.PI;

/** Brings a heading into 0 ≤ h < 360. */
export const normaliseDegrees = (degrees: number): number => ((degrees % 360) + 360) % 360;

/** 600 → `10:00`. Over an hour stays in minutes: `75:00`, as crews read it. */
export function formatDuration(seconds: number): string {
  const whole = Math.round(seconds);
  const minutes = Math.floor(whole / 60);
  return `${minutes}:${String(whole % 60).padStart(2, '0')}`;
}

/** Reads `10:00`, `90` (seconds) or `1:02:30`; `null` when it is none of these. */
export function parseDuration(text: string): number | null {
  const parts = text.trim().split(':');
  if (parts.length > 3 || !parts.every((part) => /^\d{1,5}$/.test(part))) return null;
  if (parts.slice(1).some((part) => Number(part) > 59)) return null;
  return parts.reduce((total, part) => total * 60 + Number(part), 0);
}

export const formatMetres = (metres: number): string => `${metres.toFixed(2)} m`;
