import type { InspectionRecord } from './inspection.repository';

interface Missing {
  readonly field: string;
  readonly message: string;
}

/** What a report still lacks before it can be handed over; a nil result needs its coverage as well. */
export function missingForSubmission(inspection: InspectionRecord, findings: number): Missing[] {
  const missing: Missing[] = [];
  const need = (ok: boolean, field: string, message: string) => {
    if (!ok) missing.push({ field, message });
  };
  need(inspection.inspectedOn !== null, 'inspectedOn', 'The day of the examination.');
  need(inspection.procedureNo !== '', 'procedureNo', 'The procedure and its revision.');
  need(inspection.inspectorName !== '', 'inspectorName', 'The inspector’s name.');
  need(
    inspection.coveragePercent !== null,
    'coveragePercent',
    'How much of the required volume was covered.',
  );
  need(
    inspection.coveragePercent === null ||
      inspection.coveragePercent >= 100 ||
      inspection.limitations !== '',
    'limitations',
    'What was not covered, where and why: coverage is below 100 %.',
  );
  need(
    inspection.heightErrorMm !== null && inspection.lengthErrorMm !== null,
    'heightErrorMm',
    'The sizing error of the technique in height and length.',
  );
  need(
    inspection.sizingErrorSource !== '',
    'sizingErrorSource',
    'Where the sizing error comes from (qualification, trial, assumed).',
  );
  need(inspection.result !== null, 'result', 'Whether indications were recorded, or none (nil).');
  need(
    inspection.result !== 'nil' || findings === 0,
    'result',
    `The result is nil, but ${findings} findings are recorded.`,
  );
  need(
    inspection.result !== 'indications recorded' || findings > 0,
    'result',
    'Indications were recorded, but no finding is here yet: import the file or enter them.',
  );
  return missing;
}
