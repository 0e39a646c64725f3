import { dayLength_minutes } from '#shared/drying/day-length-minutes';
import type { Formats } from '../../core/formats/formats';

/** How long is waited; of a wait of days nobody asks the minutes. */
export function waitingText(formats: Formats, minutes: number): string {
  const whole = minutes < dayLength_minutes ? minutes : Math.round(minutes / 60) * 60;
  return formats.figure('minutes', whole);
}
