import { toMPaSqrtM, toMPaSqrtMm } from '../../units/convert';

/** Upper-shelf cap of the curves [MPa·√m]: 200 ksi·√in (ASME XI, from memory). */
export const SHELF_CAP_MPA_SQRT_M = toMPaSqrtM(toMPaSqrtMm(200, 'ksi·√in'));

// a difference of temperature: no offset of scales
const degreesFahrenheit = (difference: number): number => 1.8 * difference;
const fromKsi = (k: number): number => toMPaSqrtM(toMPaSqrtMm(k, 'ksi·√in'));
const capped = (k: number): number => Math.min(k, SHELF_CAP_MPA_SQRT_M);

/**
 * Lower bound of static initiation toughness of ferritic vessel steel: 33.2 + 20.734 exp(0.02 ΔT) in
 * ksi·√in and °F, at most 200 ksi·√in.
 * @param aboveReference temperature above RTNDT, ΔT [°C]
 * @returns lower bound, KIc [MPa·√m]
 * @validity ferritic vessel steel with a known RTNDT
 * @source ASME XI A-4200 (from memory; value at RTNDT seen in a script that quotes it)
 * @example initiationCurveMPaSqrtM(0) // 59.265025
 */
export const initiationCurveMPaSqrtM = (aboveReference: number): number =>
  capped(fromKsi(33.2 + 20.734 * Math.exp(0.02 * degreesFahrenheit(aboveReference))));

/**
 * The same curve as printed for SI units: 36.5 + 22.783 exp(0.036 ΔT); within 0.2 % of the other.
 * @param aboveReference temperature above RTNDT, ΔT [°C]
 * @returns lower bound, KIc [MPa·√m]
 * @validity ferritic vessel steel with a known RTNDT
 * @source ASME XI, SI edition (from memory)
 * @example initiationCurveMetricMPaSqrtM(0) // 59.283
 */
export const initiationCurveMetricMPaSqrtM = (aboveReference: number): number =>
  capped(36.5 + 22.783 * Math.exp(0.036 * aboveReference));

/**
 * Lower bound of crack-arrest toughness: 26.8 + 12.445 exp(0.0145 ΔT) in ksi·√in and °F, at most
 * 200 ksi·√in.
 * @param aboveReference temperature above RTNDT, ΔT [°C]
 * @returns lower bound, KIa [MPa·√m]
 * @validity ferritic vessel steel with a known RTNDT
 * @source ASME XI A-4200 (from memory)
 * @example arrestCurveMPaSqrtM(0) // 43.1241
 */
export const arrestCurveMPaSqrtM = (aboveReference: number): number =>
  capped(fromKsi(26.8 + 12.445 * Math.exp(0.0145 * degreesFahrenheit(aboveReference))));

/**
 * Lower bound of toughness of carbon and low-alloy steel above the temperature of an exemption curve:
 * 33.2 + 2.806 exp[0.02 (ΔT + 100)] in ksi·√in and °F, at most 200 ksi·√in.
 * @param aboveReference temperature above the reference temperature of the exemption curve, ΔT [°C]
 * @returns lower bound of toughness [MPa·√m]
 * @validity carbon and low-alloy steel; no hydrogen in the steel
 * @source API 579-1 Annex 9F (from memory); the same curve as ASME XI, written from 100 °F lower
 * @example exemptionCurveMPaSqrtM(0) // 59.2647
 */
export const exemptionCurveMPaSqrtM = (aboveReference: number): number =>
  capped(fromKsi(33.2 + 2.806 * Math.exp(0.02 * (degreesFahrenheit(aboveReference) + 100))));
