import { ANSI_C29_2_UNITS } from './ansi-c29-2';
import { C37_30_ALTITUDE, C37_32_BUS_CLEARANCES } from './c37';
import { EN_50341_1_ALTITUDE, EN_50341_1_CLEARANCES, EN_50341_1_GAP_FACTORS } from './en-50341-1';
import { IEC_60071_1_TABLE_A1, IEC_60071_1_TABLE_A2, IEC_60071_1_TABLE_A3 } from './iec-60071-1-clearances';
import { IEC_60071_1_RANGE_I, IEC_60071_1_RANGE_II } from './iec-60071-1-levels';
import { IEC_60305_UNITS } from './iec-60305';
import { IEC_60433_CLASSES } from './iec-60433';
import { IEC_61466_1_CLASSES } from './iec-61466-1';
import { IEC_61936_1_CLEARANCES } from './iec-61936-1';
import { IEC_TS_60815_USCD } from './iec-ts-60815';
import { PROFILE_LIMITS } from './iec-ts-60815-profile';
import { INSULATOR_STRENGTH } from './insulator-strength';
import { NATIONAL_ALTITUDE_RULES } from './national-altitude-rules';
import { RUS_CONTAMINATION, RUS_SUSPENSION_LEVELS, RUS_SWING_CLEARANCES } from './rus-1724e-200';
import { SAFETY_DISTANCES } from './safety-distances';
import { STRING_FLASHOVER_254X146 } from './string-flashover';
import { TRADE_DISC_COUNTS } from './trade-disc-counts';

export * from './ansi-c29-2';
export * from './c37';
export * from './en-50341-1';
export * from './iec-60071-1-clearances';
export * from './iec-60071-1-levels';
export * from './iec-60305';
export * from './iec-60433';
export * from './iec-61466-1';
export * from './iec-61936-1';
export * from './iec-ts-60815';
export * from './iec-ts-60815-profile';
export * from './insulator-strength';
export * from './look-up';
export * from './national-altitude-rules';
export * from './rus-1724e-200';
export * from './safety-distances';
export * from './string-flashover';
export * from './table';
export * from './trade-disc-counts';

/** Every table the engine holds, in the order the tables screen shows them. */
export const ALL_TABLES = [
  IEC_60071_1_RANGE_I,
  IEC_60071_1_RANGE_II,
  IEC_60071_1_TABLE_A1,
  IEC_60071_1_TABLE_A2,
  IEC_60071_1_TABLE_A3,
  IEC_TS_60815_USCD,
  PROFILE_LIMITS,
  IEC_60305_UNITS,
  ANSI_C29_2_UNITS,
  IEC_60433_CLASSES,
  IEC_61466_1_CLASSES,
  INSULATOR_STRENGTH,
  STRING_FLASHOVER_254X146,
  EN_50341_1_CLEARANCES,
  EN_50341_1_ALTITUDE,
  EN_50341_1_GAP_FACTORS,
  IEC_61936_1_CLEARANCES,
  SAFETY_DISTANCES,
  NATIONAL_ALTITUDE_RULES,
  C37_30_ALTITUDE,
  C37_32_BUS_CLEARANCES,
  RUS_SUSPENSION_LEVELS,
  RUS_CONTAMINATION,
  RUS_SWING_CLEARANCES,
  TRADE_DISC_COUNTS,
] as const;
