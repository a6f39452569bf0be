import type { Verdict } from '@shared/judging/verdict';
import type { IconName } from './icons';

export interface ChipLook {
  word: string;
  icon: IconName;
  /** Class of the chip and stem of its colours in src/theme/_palette.scss. */
  status: 'lost' | 'gained' | 'held' | 'unsure' | 'over' | 'unjudged';
}

/** Word, glyph and colour of every verdict; charts use the same. */
export const CHIP_LOOKS: Record<Verdict | 'over' | 'unjudged', ChipLook> = {
  lost: { word: 'lost', icon: 'lost', status: 'lost' },
  gained: { word: 'gained', icon: 'gained', status: 'gained' },
  held: { word: 'held', icon: 'held', status: 'held' },
  cannotSay: { word: 'cannot say', icon: 'cannotSay', status: 'unsure' },
  over: { word: 'over limit', icon: 'over', status: 'over' },
  unjudged: { word: 'not judged', icon: 'clock', status: 'unjudged' },
};
