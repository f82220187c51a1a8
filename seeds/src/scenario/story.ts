import type { Airfoil, DesignContent, Draft, Requirement, Specification, Version } from '@tipward/contract';
import {
  addAirfoil,
  addComment,
  askForReview,
  createDesign,
  createProgramme,
  decideReview,
  openDraft,
  releaseVersion,
  removeMember,
  resolveComment,
  saveDraft,
  saveVersion,
  setMember,
} from '@tipward/contract';
import { DEFAULT_SETTINGS } from '@tipward/contract';
import { checkDraft, evaluateContent, sizeFromSpecification, toDraft } from '@tipward/design-model';
import { smFamily } from '../airfoils/family.ts';
import type { PersonAtWork } from '../person-at-work.ts';
import { BITTERN, BITTERN_REQUIREMENTS } from './bittern.ts';
import { CURLEW, CURLEW_CHORD_CAP_M, curlewRequirements } from './curlew.ts';
import type { DemoPerson } from './people.ts';
import { PEOPLE } from './people.ts';
import { capChord, easeMiddle, reviseTwist, thickenRoot, trimTip } from './steps.ts';

export interface Cast {
  readonly at: Readonly<Record<DemoPerson, PersonAtWork>>;
  readonly ids: Readonly<Record<DemoPerson, string>>;
}

const CURLEW_LIFT = 1;
const BITTERN_LIFT = 1.05;

/** Largest root flapwise moment of the first sizing: the solver's figure that the requirement is set from. */
function firstSizingMoment(airfoils: readonly Airfoil[]): number {
  const sized = sizeFromSpecification({
    specification: CURLEW,
    airfoils,
    tipSpeedRatio: CURLEW.designTipSpeedRatio,
    designLift: CURLEW_LIFT,
    maxChordM: null,
    stationCount: 18,
  });
  const content: DesignContent = {
    schema: 1,
    specificationIssue: 1,
    pitchDeg: sized.pitchDeg,
    designTipSpeedRatio: CURLEW.designTipSpeedRatio,
    settings: DEFAULT_SETTINGS,
    airfoils: airfoils.map(({ name, id, polarSetHash }) => ({ name, airfoilId: id, polarSetHash })),
    stations: sized.stations,
  };
  const { keyNumbers } = evaluateContent({
    content,
    contentHash: '',
    specification: CURLEW,
    specificationHash: '',
    requirements: [],
    airfoils,
  });
  if (keyNumbers.maxRootFlapMomentKNm === null) throw new Error('the first sizing has no root moment');
  return keyNumbers.maxRootFlapMomentKNm;
}

function contentOf(draft: Draft): DesignContent {
  const { content, faults } = checkDraft(draft.content);
  if (content === null) throw new Error(`the draft does not hold: ${JSON.stringify(faults)}`);
  return content;
}

/** Saves a changed draft as the next version. */
async function saveAs(
  person: PersonAtWork,
  draft: Draft,
  content: DesignContent,
  note: string,
): Promise<Version> {
  const saved = await person.call(saveDraft, {
    params: { draftId: draft.id },
    body: { content: toDraft(content) },
    ifMatch: `"${draft.revision}"`,
  });
  return person.call(saveVersion, {
    params: { draftId: saved.id },
    body: { note },
    ifMatch: `"${saved.revision}"`,
  });
}

async function nextVersion(
  person: PersonAtWork,
  from: Version,
  change: (content: DesignContent) => DesignContent,
  note: string,
): Promise<Version> {
  const draft = await person.call(openDraft, {
    params: { designId: from.designId },
    body: { fromVersionId: from.id },
  });
  return saveAs(person, draft, change(contentOf(draft)), note);
}

async function addMembers({ at, ids }: Cast, programmeId: string): Promise<void> {
  const members = [
    ['ines', 'aerodynamicist'],
    ['marek', 'aerodynamicist'],
    ['tove', 'lead'],
    ['priya', 'reader'],
  ] as const;
  for (const [who, role] of members)
    await at.wren.call(setMember, { params: { programmeId, personId: ids[who] }, body: { role } });
}

async function startProgramme(
  cast: Cast,
  name: string,
  summary: string,
  specification: Specification,
  requirements: Requirement[],
): Promise<string> {
  const programme = await cast.at.wren.call(createProgramme, {
    body: { name, summary, specification, requirements },
  });
  await addMembers(cast, programme.id);
  // The administrator set it up and steps back: leads and aerodynamicists do the work.
  await cast.at.wren.call(removeMember, { params: { programmeId: programme.id, personId: cast.ids.wren } });
  return programme.id;
}

function stationAt(version: Version, share: number, tipRadiusM: number): number {
  const radii = version.content.stations.map((station) => station.radiusM);
  return radii.reduce((best, r) =>
    Math.abs(r - share * tipRadiusM) < Math.abs(best - share * tipRadiusM) ? r : best,
  );
}

async function releaseV5(cast: Cast, v5: Version): Promise<void> {
  const { ines, tove } = cast.at;
  const review = await ines.call(askForReview, {
    params: { versionId: v5.id },
    body: { message: 'Ready for release to structures and tooling. Tip chord is the only change since v4.' },
  });
  const params = { reviewId: review.id };
  const comment = await tove.call(addComment, {
    params,
    body: {
      text: 'Is the trimmed tip still thick enough for the receptor of the lightning conductor?',
      stationRadiusM: stationAt(v5, 0.96, CURLEW.tipRadiusM),
    },
  });
  await ines.call(addComment, {
    params,
    body: { text: 'Yes: 18 % of 0.27 m leaves 48 mm; the receptor needs 30 mm.', replyTo: comment.id },
  });
  await tove.call(resolveComment, { params: { commentId: comment.id } });
  await tove.call(decideReview, {
    params,
    body: {
      outcome: 'approved',
      note: 'All requirements hold.',
      password: PEOPLE.tove.password,
      contentHash: review.contentHash,
      specificationHash: review.specificationHash,
    },
  });
  await tove.call(releaseVersion, {
    params: { versionId: v5.id },
    body: { effectivity: 'Turbines C48-001 onward', note: 'First release.', password: PEOPLE.tove.password },
  });
}

async function tellCurlew(cast: Cast, programmeId: string, airfoils: readonly Airfoil[]): Promise<void> {
  const { ines, marek, tove } = cast.at;
  const airfoilIds = airfoils.map((foil) => foil.id);
  const started = await ines.call(createDesign, {
    params: { programmeId },
    body: {
      name: 'Curlew main blade',
      start: {
        kind: 'sized',
        airfoilIds,
        tipSpeedRatio: CURLEW.designTipSpeedRatio,
        designLift: CURLEW_LIFT,
        maxChordM: null,
        stationCount: 18,
      },
    },
  });
  const v1 = await ines.call(saveVersion, {
    params: { draftId: started.draft.id },
    body: { note: 'Sized from the specification, no cap on chord' },
    ifMatch: `"${started.draft.revision}"`,
  });
  const v2 = await nextVersion(
    ines,
    v1,
    (c) => capChord(c, CURLEW, airfoils, CURLEW_CHORD_CAP_M, CURLEW_LIFT),
    'Chord capped at 0.80 m for mould and van',
  );
  const v3 = await nextVersion(
    ines,
    v2,
    (c) => reviseTwist(c, CURLEW, airfoils),
    'Twist re-optimised under the cap',
  );
  const v4 = await nextVersion(
    marek,
    v3,
    (c) => thickenRoot(c, CURLEW.tipRadiusM),
    'Thicker root airfoils, asked for by structures',
  );
  const v5 = await nextVersion(
    ines,
    v4,
    (c) => trimTip(c, CURLEW.tipRadiusM, 0.09),
    'Tip chord trimmed to hold the root moment',
  );
  await releaseV5(cast, v5);
  const v6 = await nextVersion(
    ines,
    v5,
    (c) => easeMiddle(c, CURLEW.tipRadiusM, 0.6),
    'A little more twist at mid-span for stall margin when soiled',
  );
  const review = await ines.call(askForReview, {
    params: { versionId: v6.id },
    body: { message: 'Small gain in stall margin; please look at what it costs.' },
  });
  const params = { reviewId: review.id };
  await tove.call(addComment, {
    params,
    body: {
      text: 'Why stop the added twist here? The margin further out is the smaller one.',
      stationRadiusM: stationAt(v6, 0.75, CURLEW.tipRadiusM),
    },
  });
  await marek.call(addComment, {
    params,
    body: {
      text: 'Tooling would like the twist to stay straight between these two stations.',
      stationRadiusM: stationAt(v6, 0.45, CURLEW.tipRadiusM),
    },
  });
  const draft = await ines.call(openDraft, {
    params: { designId: v5.designId },
    body: { fromVersionId: v5.id },
  });
  await ines.call(saveDraft, {
    params: { draftId: draft.id },
    body: { content: toDraft(trimTip(contentOf(draft), CURLEW.tipRadiusM, 0.04)) },
    ifMatch: `"${draft.revision}"`,
  });
}

async function tellBittern(cast: Cast, programmeId: string, airfoils: readonly Airfoil[]): Promise<void> {
  const { marek } = cast.at;
  const started = await marek.call(createDesign, {
    params: { programmeId },
    body: {
      name: 'Bittern blade',
      start: {
        kind: 'sized',
        airfoilIds: airfoils.map((foil) => foil.id),
        tipSpeedRatio: BITTERN.designTipSpeedRatio,
        designLift: BITTERN_LIFT,
        maxChordM: null,
        stationCount: 24,
      },
    },
  });
  const v1 = await marek.call(saveVersion, {
    params: { draftId: started.draft.id },
    body: { note: 'Sized from the specification; chord above the road limit' },
    ifMatch: `"${started.draft.revision}"`,
  });
  await nextVersion(
    marek,
    v1,
    (c) => reviseTwist(capChord(c, BITTERN, airfoils, 4.2, BITTERN_LIFT), BITTERN, airfoils),
    'Chord under the road limit, twist for maximum power',
  );
}

/** Tells the whole demo, request by request. */
export async function tellStory(cast: Cast): Promise<void> {
  const { tove } = cast.at;
  // The library is filled by the lead; a lead needs a programme first, and the requirement needs the airfoils: by themselves.
  const bittern = await startProgramme(
    cast,
    'Bittern 3200',
    'Invented: 3.2 MW, 126 m rotor for class II sites.',
    BITTERN,
    BITTERN_REQUIREMENTS,
  );
  const airfoils: Airfoil[] = [];
  for (const body of smFamily()) airfoils.push(await tove.call(addAirfoil, { body }));
  const curlew = await startProgramme(
    cast,
    'Curlew 48',
    'Invented: 48 kW community turbine, 15.6 m rotor for class III sites.',
    CURLEW,
    curlewRequirements(firstSizingMoment(airfoils)),
  );
  await tellCurlew(cast, curlew, airfoils);
  await tellBittern(cast, bittern, airfoils);
}
