import type { ElementKind, RacewayType, TradeSize } from '../../run/run-document';

/** What `Fix.values` holds for each kind, so that the words can rely on it. Angles in degrees, lengths and stations in inches. */
export type FixValues = {
  'change-angle': {
    elementId: string;
    piece: ElementKind;
    /** As the list numbers the piece. */
    number: number;
    angle: number;
    /** Total of the section it would give, and what is left of its limit. */
    degrees: number;
    limit: number;
    remaining: number;
  };
  'add-pull-point': {
    sectionId: string;
    /** Stations between which both sides pass. */
    from: number;
    to: number;
    /** Where the command puts it. */
    station: number;
    /** False: no lengths were given, stations are equal steps. */
    lengths: boolean;
    /** Numbers of the pieces it would stand between; null at an end of the run. */
    afterNumber: number | null;
    beforeNumber: number | null;
    /** Section totals it would give. */
    degreesBefore: number;
    degreesAfter: number;
    limit: number;
  };
  'make-accessible': {
    elementId: string;
    number: number | null;
    name: string | null;
    degreesBefore: number;
    degreesAfter: number;
    limit: number;
    /** Always true: only if the cover can be reached. */
    onlyIfReachable: true;
  };
  'break-pull': {
    /** The box the pull goes through now. */
    elementId: string;
    /** Likely pull of both parts, lbf; null where one has no answer. */
    first: number | null;
    second: number | null;
  };
  'larger-raceway': {
    type: RacewayType;
    tradeSize: TradeSize;
    fromType: RacewayType;
    fromTradeSize: TradeSize;
    /** Fill it would give; null without conductors. */
    percent: number | null;
    limitPercent: number | null;
    jamRatio: number | null;
    clearance: number | null;
  };
  'longer-leg': {
    /** The piece the leg leads to. */
    elementId: string;
    number: number | null;
    /** What is added, rounded up to 1/16 in, and the leg it makes, to the corner. */
    added: number;
    length: number;
  };
  'larger-radius': {
    elementId: string | null;
    number: number | null;
    /** The radius it would have, in; null where the table's is taken back and none is known. */
    radius: number | null;
    /** True: the given radius is removed and the table's or the bender's rules again. */
    tables: boolean;
  };
};
