import { analyseLoop, withResponses } from '@/analysis';
import { caseLoop, headline, judgeCases, marksAlong, needsResponses, reachOf, roomAlong, roomWay, type WayName } from '@/analysis/project';
import type { Analysis, CaseResult, Conditions, DesignContent, FrequencyResponse, FrozenCase, Headline, RoomWay } from '@/contract';
import { contentWith, type Settings } from '../draft/settings';
import type { Gain } from '../draft/gain';
import { markWalk, type MarkSide } from '../over/mark-walk';

export interface CasesQuestion {
  readonly design: DesignContent;
  readonly conditions: Conditions;
  /** Those of the conditions' cases that are looked at. */
  readonly cases: readonly FrozenCase[];
  /** live: coarse, the numbers alone; full: what is kept, and a coarse curve of every case. */
  readonly detail: 'live' | 'full';
}

/** A design over all of its cases. */
export interface CasesAnswer {
  /** In the order of the cases, without curves. */
  readonly results: readonly CaseResult[];
  readonly headline: Headline;
  /** Of each case over frequency, as far as it is drawn thin; none in a coarse answer. */
  readonly curves: readonly FrequencyResponse[];
}

function analyseCase(one: FrozenCase, { design, conditions, detail }: CasesQuestion): Analysis {
  const loop = caseLoop(one, design);
  const analysis = analyseLoop(loop, { detail, responses: false, curves: false });
  return needsResponses(conditions.limits) ? withResponses(analysis, loop, 'live') : analysis;
}

const none = { magnitude: [], phaseDegrees: [] };

/** What is drawn of a case that is not the shown one; what is not drawn need not be sent to the page. */
function thinCurve(one: FrozenCase, design: DesignContent): FrequencyResponse {
  const { frequencyResponse } = analyseLoop(caseLoop(one, design), { detail: 'live', responses: false });
  if (!frequencyResponse) throw new Error('An analysis with curves has a frequency response.');
  return { ...frequencyResponse, plant: none, controller: none, loadSensitivity: [], noiseSensitivity: [] };
}

/** These cases analysed as far as the limits ask for, and judged as the server would. */
export function judge(question: CasesQuestion): CasesAnswer {
  const { design, conditions, cases } = question;
  const analyses = cases.map((one) => analyseCase(one, question));
  const { results } = judgeCases(design, { ...conditions, cases: [...cases] }, analyses);
  const curves = question.detail === 'full' ? cases.map((one) => thinCurve(one, design)) : [];
  return { results, headline: headline(results, conditions), curves };
}

export interface WayQuestion {
  readonly way: WayName;
  readonly design: DesignContent;
  readonly conditions: Conditions;
  /** Of the cases of the conditions, in their order. */
  readonly results: readonly CaseResult[];
}

/** How far the loop may change in one way before the first limit breaks in any case. */
export function lookAlong({ way, design, conditions: { cases, limits }, results }: WayQuestion): RoomWay {
  const reach = reachOf(way, results);
  return roomWay(way, results, [roomAlong(way, { design, cases, limits, results }, { reach })]);
}

export interface MarksQuestion {
  readonly opened: DesignContent | null;
  readonly settings: Settings;
  readonly gain: Gain;
  readonly side: MarkSide;
  /** The likeliest to break first. */
  readonly cases: readonly FrozenCase[];
  readonly limits: Conditions['limits'];
}

/** What a gain breaks first when it is turned one way, and where the first case is no longer stable. */
export function marks({ opened, settings, gain, side, cases, limits }: MarksQuestion) {
  const walk = markWalk(settings, gain, side);
  if (walk === null) return { limit: null, instability: null };
  const designAt = (place: number) => contentWith(opened, { ...settings, [gain]: walk.valueAt(place) });
  const { limit, instability } = marksAlong({ designAt, from: walk.from, to: walk.to, cases, limits, detail: 'live' });
  const valued = <M extends { holds: number; breaks: number }>(mark: M | null) =>
    mark && { ...mark, holds: walk.valueAt(mark.holds), breaks: walk.valueAt(mark.breaks) };
  return { limit: valued(limit), instability: valued(instability) };
}
