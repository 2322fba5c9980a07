// What the demo holds: an invented workshop, its people, two builds, five studies, and what was said about them.

import type { Role, Study } from "@linkwright/contract";
import { frontAsWelded, frontRackTurnedRound } from "./deliveryVan.ts";
import { frontAsDrawn, frontCured, rearWithToeLink } from "./hillClimbSpecial.ts";

export const DEMO_WORKSHOP = "Quarrybank Suspension";
export const DEMO_PASSWORD = "layout dye and scriber";
/** argon2id of the password above: this package hashes none itself. */
export const DEMO_PASSWORD_HASH =
  "$argon2id$v=19$m=19456,t=2,p=1$c0aONzaYTscjDwf+3poUHw$H9nTkmxquF+JBc5hNdlOHpZxmWda33REN9WHLjjAIZc";

export interface DemoPerson {
  readonly name: string;
  readonly email: string;
  readonly role: Role;
}

export const DEMO_PEOPLE = [
  { name: "Ines Farrow", email: "owner@example.org", role: "owner" },
  { name: "Rufus Quill", email: "engineer@example.org", role: "engineer" },
  { name: "Dot Larkin", email: "fabricator@example.org", role: "fabricator" },
  { name: "Piers Mabbott", email: "reviewer@example.org", role: "reviewer" },
] as const satisfies readonly DemoPerson[];

export interface DemoComment {
  readonly by: Role;
  readonly text: string;
  /** A hardpoint's path; the whole study without it. */
  readonly hardpoint?: string;
  readonly isResolved?: boolean;
}

export interface DemoStudy {
  readonly name: string;
  readonly study: Study;
  readonly revisionNote: string;
  readonly comments: readonly DemoComment[];
}

export interface DemoBuild {
  readonly name: string;
  readonly summary: string;
  readonly studies: readonly DemoStudy[];
}

export const DEMO_BUILDS: readonly DemoBuild[] = [
  {
    name: "Hill-climb special",
    summary:
      "Light single-seater on a tubular frame, about 640 kg with its driver. Bought rack ahead of the front axle, our own arms and knuckles.",
    studies: [
      {
        name: "Front axle, as first drawn",
        study: frontAsDrawn,
        revisionNote: "As first drawn, with the rack where its bracket was easy to weld.",
        comments: [
          {
            by: "reviewer",
            hardpoint: "left.tieRod.inner",
            text: "The inner joint stands well above the outer one. Over the band each wheel toes out by more than 1.5° in bump: the rack has to come down.",
          },
          {
            by: "fabricator",
            hardpoint: "left.suspension.lowerArm.frontPivot",
            text: "I can move this bracket on the jig by up to 10 mm either way, but not the rear one: it sits on a tube joint.",
          },
        ],
      },
      {
        name: "Front axle, rack lowered",
        study: frontCured,
        revisionNote: "Rack 13.4 mm lower, outer tie-rod joint on a 15 mm spacer. Flat at both ride heights.",
        comments: [
          {
            by: "fabricator",
            hardpoint: "left.tieRod.outer",
            text: "Is there thread enough in the steering arm for a 15 mm spacer?",
            isResolved: true,
          },
          {
            by: "reviewer",
            text: "Within target at both ride heights. Nothing further from me on this one.",
          },
        ],
      },
      {
        name: "Rear axle, fixed toe link",
        study: rearWithToeLink,
        revisionNote: "Toe link behind the axle, on the frame.",
        comments: [
          {
            by: "engineer",
            hardpoint: "left.tieRod.inner",
            text: "At full droop the rear toes in past the target. Raising this joint a little should centre the curve on the band.",
          },
        ],
      },
    ],
  },
  {
    name: "Delivery van",
    summary:
      "1950s-style light van on our bolt-on front end, about 1480 kg. It carries goods, so it is checked unladen and laden.",
    studies: [
      {
        name: "Front axle, as welded",
        study: frontAsWelded,
        revisionNote: "Both sides as measured on the trolley after welding.",
        comments: [
          {
            by: "fabricator",
            hardpoint: "right.suspension.upperArm.frontPivot",
            text: "This bracket pulled up by 4 mm when it cooled. I can cut it off and do it again, or you can tell me what to shim.",
          },
        ],
      },
      {
        name: "Front axle, rack turned round",
        study: frontRackTurnedRound,
        revisionNote: "Tried with the rack we have on the shelf. It is made for arms behind the axle.",
        comments: [
          {
            by: "engineer",
            text: "Do not build this. The rack on the shelf is made for arms behind the axle: put ahead of it like this, the van turns right when the driver turns left.",
          },
        ],
      },
    ],
  },
];
