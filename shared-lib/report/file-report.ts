/** An analysis in the contract's shape for one file. */

import type { Analysis } from "../analyze.ts";
import type { SpeciatedMoment } from "../flask/types.ts";
import type { AmountOf, FileReport } from "../model/contract.ts";
import { mixtureOf } from "../notes/media.ts";
import type { Charge, MediumPhrase, NoteReading } from "../notes/types.ts";

const AMOUNTS = new Set<string>(["mass", "volume", "amount", "equivalents", "concentration", "assay"]);

function chargesOf(analysis: Analysis): FileReport["charges"] {
  const resolved = new Map(analysis.charges.map((charge) => [charge.charge, charge]));
  return analysis.reading.charges.map((charge: Charge, index) => {
    const own = resolved.get(index);
    return {
      mention: charge.mention,
      amounts: charge.amounts
        .filter((amount) => AMOUNTS.has(amount.of))
        .map(({ start, end, value, unit, of }) => ({ start, end, value, unit, of: of as AmountOf })),
      ...(own?.total ? { total: own.total } : {}),
      ...(own?.form ? { suppliedForm: own.form.label } : {}),
      step: charge.step,
    };
  });
}

function mediumOf(medium: MediumPhrase, reading: NoteReading): FileReport["media"][number] {
  const temperature = reading.events.find((event) => event.kind === "temperature" && event.step === medium.step);
  const kelvin = medium.temperatureK ?? (temperature?.kind === "temperature" ? temperature.kelvin : undefined);
  return {
    start: medium.start,
    end: medium.end,
    step: medium.step,
    kind: medium.kind,
    components: mixtureOf(medium.parts).composition.components.map(({ solvent, moleFraction }) => ({
      name: solvent.key,
      moleFraction,
    })),
    ...(kelvin === undefined ? {} : { temperature: kelvin }),
    ...(medium.pH === undefined ? {} : { pH: medium.pH }),
  };
}

function momentOf(moment: SpeciatedMoment): FileReport["flask"][number] {
  const { contents, speciation } = moment;
  return {
    step: moment.step,
    offset: moment.offset,
    temperature: contents.temperatureK,
    ...(contents.pH === undefined ? {} : { pH: contents.pH }),
    volume: speciation.volumeL,
    components: contents.solvents.map(({ solvent, amount }) => {
      const activity = speciation.activities[solvent];
      return { name: solvent, amount, ...(activity === undefined ? {} : { activity }) };
    }),
    carbonyls: speciation.carbonyls.flatMap((carbonyl, i) => {
      const mention = moment.carbonylMentions[i];
      if (mention === undefined || carbonyl.outside !== undefined) return [];
      return [
        { mention, forms: carbonyl.forms.map(({ kind, fraction }) => ({ kind, fraction })), free: carbonyl.free },
      ];
    }),
  };
}

/** Report of one note. `path` is the file's path, or the record's id. */
export function toFileReport(path: string, analysis: Analysis): FileReport {
  const { reading } = analysis;
  return {
    path,
    mentions: reading.mentions.map(({ start, end, text, smiles, name, role, carbonyl }) => ({
      start,
      end,
      text,
      ...(smiles === undefined ? {} : { smiles }),
      name,
      role,
      carbonyl,
    })),
    charges: chargesOf(analysis),
    media: reading.media.map((medium) => mediumOf(medium, reading)),
    flask: analysis.moments.map(momentOf),
    findings: analysis.findings.map(({ code, severity, start, end, message, fixes }) => ({
      code,
      severity,
      start,
      end,
      message,
      fixes: fixes.map(({ title, edits }) => ({ title, edits })),
    })),
  };
}
