import type { BandJudgement } from '@shared/judging/band-judgement';
import { decideGate, type GateDecision, type RequiredSeries } from '@shared/judging/decide-gate';
import type { BuildGate } from './decide-build-gate';

interface Case {
  readonly group: string;
  readonly name: string;
  readonly decision: GateDecision;
}

/**
 * The gate as a JUnit report: one case for every band of every series, failed for a fault, skipped where nothing could be
 * said, and one case for the judgement itself.
 */
export function gateJunit(gate: BuildGate, title: string): string {
  const cases = [judgementCase(gate), ...bandCases(gate)];
  const failures = cases.filter(({ decision }) => decision.verdict === 'fail').length;
  const skipped = cases.filter(({ decision }) => decision.verdict === 'incomplete').length;
  const counts = `tests="${cases.length}" failures="${failures}" errors="0" skipped="${skipped}"`;
  const body = cases.map((one) => caseElement(title, one)).join('\n');
  return [
    '<?xml version="1.0" encoding="UTF-8"?>',
    `<testsuites ${counts}>`,
    `<testsuite name="${escapeXml(title)}" ${counts}>`,
    body,
    '</testsuite>',
    '</testsuites>',
    '',
  ].join('\n');
}

/** Without a judgement up to date no case below tells the whole story. */
function judgementCase({ isJudged }: BuildGate): Case {
  const text = 'the build is not judged, or has sweeps newer than its judgement';
  const decision: GateDecision = isJudged
    ? { verdict: 'pass', reasons: [] }
    : { verdict: 'incomplete', reasons: [{ code: 'notJudged', text }] };
  return { group: 'judgement', name: 'is up to date', decision };
}

function bandCases({ judgements, required, targetMarginDb }: BuildGate): Case[] {
  const wanted = required.flatMap(({ bands, ...series }) => bands.map((band) => ({ ...series, band })));
  const places = new Map([...wanted, ...judgements].map((place) => [placeKey(place), place]));
  return [...places.values()].map((place) => {
    const { stateName, line, detector, band } = place;
    return {
      group: stateName,
      name: `${line} ${detector} ${band}`,
      decision: decideGate({
        judgements: judgements.filter((one) => placeKey(one) === placeKey(place)),
        isJudged: true,
        targetMarginDb,
        required: [{ stateName, line, detector, bands: [band] }],
      }),
    };
  });
}

type Place = Pick<BandJudgement, 'band'> & Omit<RequiredSeries, 'bands'>;

function placeKey({ stateName, line, detector, band }: Place): string {
  return JSON.stringify([stateName, line, detector, band]);
}

function caseElement(title: string, { group, name, decision: { verdict, reasons } }: Case): string {
  const start = `<testcase classname="${escapeXml(`${title}.${group}`)}" name="${escapeXml(name)}"`;
  if (verdict === 'pass') return `${start}/>`;
  const message = escapeXml(reasons.map(({ text }) => text).join('; '));
  const outcome = verdict === 'fail' ? `<failure message="${message}"/>` : `<skipped message="${message}"/>`;
  return `${start}>${outcome}</testcase>`;
}

/** Text as the value of an XML attribute; characters XML 1.0 does not know are left out. */
function escapeXml(text: string): string {
  return text
    .replace(/[^\t\n\r\u0020-\ud7ff\ue000-\ufffd\u{10000}-\u{10ffff}]/gu, '')
    .replace(/&/g, '&amp;')
    .replace(/</g, '&lt;')
    .replace(/>/g, '&gt;')
    .replace(/"/g, '&quot;');
}
