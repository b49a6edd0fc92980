import type { FaultTimes } from "@/lib/core/recurrence/fault-times";

/** NIST/SEMATECH e-Handbook of Statistical Methods, 8.2.2.3 (used again in 8.2.3.4 and 8.4.5.2): ten repairs, watched to 1500 h. */
export const NIST_TEN: FaultTimes = { times: [5, 40, 43, 175, 389, 712, 747, 795, 1299, 1478], end: 1500, ended: "time" };

/** MIL-HDBK-189, Reliability Growth Management, 13 February 1981, appendix C: 27 failures, watched to 300 h. */
export const MIL_27: FaultTimes = {
  times: [
    2.6, 16.5, 16.5, 17.0, 21.4, 29.1, 33.3, 56.5, 63.1, 70.6, 73.0, 77.7, 93.9, 95.5, 98.1, 101.1, 132.0, 142.2, 147.7, 149.0, 167.2,
    190.7, 193.0, 198.7, 251.9, 282.5, 286.1,
  ],
  end: 300,
  ended: "time",
};

/** 23 failures, watched to 500 h: the growth example that the printed coefficients for n = 23 go with (Crow). */
export const CROW_23: FaultTimes = {
  times: [
    0.2, 4.2, 4.5, 5.0, 5.4, 6.1, 7.9, 14.8, 19.2, 48.6, 85.8, 108.9, 127.2, 129.8, 150.1, 159.7, 227.4, 244.7, 262.7, 315.3, 329.6, 404.3,
    486.2,
  ],
  end: 500,
  ended: "time",
};

/**
 * Main propulsion diesel No. 4 of USS Halfbeak: hours at 71 unscheduled maintenance actions, ended at the last.
 * Ascher & Feingold, Repairable Systems Reliability, 1984; Meeker & Escobar, Statistical Methods for Reliability Data, 1998, ch. 16.
 */
export const HALFBEAK: FaultTimes = {
  times: [
    1382, 2990, 4124, 6827, 7472, 7567, 8845, 9450, 9794, 10848, 11993, 12300, 15413, 16497, 17352, 17632, 18122, 19067, 19172, 19299,
    19360, 19686, 19940, 19944, 20121, 20132, 20431, 20525, 21057, 21061, 21309, 21310, 21378, 21391, 21456, 21461, 21603, 21658, 21688,
    21750, 21815, 21820, 21822, 21888, 21930, 21943, 21946, 22181, 22311, 22634, 22635, 22669, 22691, 22846, 22947, 23149, 23305, 23491,
    23526, 23774, 23791, 23822, 24006, 24286, 25000, 25010, 25048, 25268, 25400, 25500, 25518,
  ],
  end: 25518,
  ended: "failure",
};
