import { boolean, doublePrecision, jsonb, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import type { Provenance } from '../units/provenance';
import { createdAt, key, updatedAt, version, within } from './columns';
import { sites } from './sites';

/** Origin of one property of a record, by property name. */
export type Origins = Readonly<Record<string, { provenance: Provenance; note: string }>>;

export const materials = pgTable(
  'materials',
  {
    id: key(),
    siteId: uuid('site_id')
      .notNull()
      .references(() => sites.id),
    name: text('name').notNull(),
    specification: text('specification').notNull().default(''),
    heatNo: text('heat_no').notNull().default(''),
    yieldMpa: doublePrecision('yield_mpa').notNull(),
    tensileMpa: doublePrecision('tensile_mpa').notNull(),
    youngsModulusMpa: doublePrecision('youngs_modulus_mpa').notNull(),
    poissonsRatio: doublePrecision('poissons_ratio').notNull(),
    toughnessMpaSqrtM: doublePrecision('toughness_mpa_sqrt_m').notNull(),
    /** Temperature the toughness was found at. */
    toughnessTemperatureC: doublePrecision('toughness_temperature_c').notNull(),
    yieldPlateau: boolean('yield_plateau').notNull().default(false),
    origins: jsonb('origins').$type<Origins>().notNull(),
    version: version(),
    createdAt: createdAt(),
    updatedAt: updatedAt(),
  },
  (t) => [
    unique('materials_name').on(t.siteId, t.name),
    within('materials_yield', t.yieldMpa, 50, 1500),
    within('materials_tensile', t.tensileMpa, 100, 2000),
    within('materials_modulus', t.youngsModulusMpa, 50_000, 250_000),
    within('materials_poisson', t.poissonsRatio, 0.1, 0.49),
    within('materials_toughness', t.toughnessMpaSqrtM, 5, 600),
    within('materials_toughness_temperature', t.toughnessTemperatureC, -273, 900),
  ],
);

export const growthLaws = pgTable(
  'growth_laws',
  {
    id: key(),
    siteId: uuid('site_id')
      .notNull()
      .references(() => sites.id),
    key: text('key').notNull(),
    title: text('title').notNull(),
    environment: text('environment').notNull(),
    /** da/dN [mm/cycle] = coefficient · ΔK^exponent, ΔK in MPa·√mm, in order of ΔK. */
    stages: jsonb('stages').$type<readonly { coefficient: number; exponent: number }[]>().notNull(),
    thresholdMpaSqrtMm: doublePrecision('threshold_mpa_sqrt_mm').notNull(),
    source: text('source').notNull(),
    version: version(),
    createdAt: createdAt(),
    updatedAt: updatedAt(),
  },
  (t) => [
    unique('growth_laws_key').on(t.siteId, t.key),
    within('growth_laws_threshold', t.thresholdMpaSqrtMm, 0, 1000),
  ],
);
