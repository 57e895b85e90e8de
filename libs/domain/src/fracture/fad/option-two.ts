/**
 * Option 2 line: f = [E ε/(Lr σY) + Lr³ σY/(2 E ε)]^−½ with ε the true strain at the true stress Lr σY. With
 * the secant ratio x = E ε/σ this is (x + Lr²/(2x))^−½; a straight, elastic curve has x = 1.
 * @param lr load ratio, Lr [-]
 * @param secantRatio strain over elastic strain at the stress Lr σY, x = E ε/σ [-]
 * @returns height of the line, f [-]
 * @validity 0 ≤ Lr < Lr,max; x ≥ 1
 * @source BS 7910:2013 7.3.4, R6 (from memory)
 * @example optionTwoHeight(1, 2) // 0.6666666667
 */
export const optionTwoHeight = (lr: number, secantRatio: number): number =>
  1 / Math.sqrt(secantRatio + (lr * lr) / (2 * secantRatio));
