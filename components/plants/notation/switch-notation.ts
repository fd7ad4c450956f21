import type { PlantForm } from '../plant-form';
import { fieldsIn, isBlankIn, type Notation, notationWords, textIn } from './notation';
import { readNotation } from './read-notation';
import { sameResponse } from './same-response';
import { type WorkedOut, writePlant } from './write-plant';

export interface Switched {
  form: PlantForm;
  /** Why nothing was written in the notation that is now shown; null where it says what the one before said. */
  reason: string | null;
}

const LONGEST_FORMULA = 500;

/** Whether what stands in two notations is known to say the same plant: the one was written from the other, and neither was touched. */
export function sayTheSame(form: PlantForm, one: Notation, other: Notation): boolean {
  const holds = (notation: Notation) => form.agreed[notation] === textIn(form, notation);
  const sharesDeadTime = one !== 'formula' && other !== 'formula';
  return holds(one) && holds(other) && (sharesDeadTime || form.agreed.deadTime === form.deadTime);
}

/** Why a plant as it was written down says something else than it should; null where it does not. */
function unfaithful(plant: WorkedOut, written: PlantForm, notation: Notation): string | null {
  if (notation === 'formula')
    return written.formula.length > LONGEST_FORMULA ? `As a formula it is longer than ${LONGEST_FORMULA} characters.` : null;
  const { plant: again } = readNotation(written, notation);
  if (again && again.kind !== 'formula' && sameResponse(plant, again)) return null;
  return `As ${notationWords[notation]}, rounding in the last digit alone would make it another plant.`;
}

/**
 * Shows another notation, and writes the plant down in it where it does not stand there already.
 * What was typed there before is laid aside, never lost.
 *
 * @param plant what the present notation says; null where it cannot be read
 */
export function switchNotation(form: PlantForm, to: Notation, plant: WorkedOut | null): Switched {
  const from = form.notation;
  const shown = { ...form, notation: to };
  if (to === from || isBlankIn(form, from) || sayTheSame(form, from, to)) return { form: shown, reason: null };
  if (plant === null) return { form: shown, reason: `What stands under ${notationWords[from]} cannot be read yet.` };
  const next = { ...shown, ...writePlant(plant, to) };
  const reason = unfaithful(plant, next, to);
  if (reason !== null) return { form: shown, reason };
  const others = form.agreed[from] === textIn(form, from) && holdsDeadTime(form, from) ? form.agreed : {};
  const agreed = { ...others, [from]: textIn(form, from), [to]: textIn(next, to), deadTime: next.deadTime };
  const written = { ...form.written, [to]: textIn(next, to) };
  const typedBefore = !isBlankIn(form, to) && form.written[to] !== textIn(form, to);
  const replaced = typedBefore ? { ...form.replaced, [to]: fieldsIn(form, to) } : form.replaced;
  return { form: { ...next, agreed, written, replaced }, reason: null };
}

const holdsDeadTime = (form: PlantForm, from: Notation): boolean => from === 'formula' || form.agreed.deadTime === form.deadTime;

/** Brings back what was typed in the notation that is shown, before another was written over it. What stands there now is laid aside. */
export function bringBack(form: PlantForm): PlantForm {
  const { notation, replaced } = form;
  const typed = replaced[notation];
  return typed ? { ...form, ...typed, replaced: { ...replaced, [notation]: fieldsIn(form, notation) } } : form;
}
