/** Longest LaTeX source of one formula. */
const FORMULA_LIMIT = 2000;

const list = (names: string) => names.trim().split(/\s+/);

/**
 * The LaTeX a question may use: structure, symbols and spacing of school mathematics and science.
 * Whatever can define commands, load things, link or set raw sizes stays out.
 */
const ALLOWED = new Set([
  ...list('frac dfrac tfrac cfrac sqrt binom dbinom tbinom overline underline overbrace underbrace overset underset'),
  ...list('stackrel hat widehat tilde widetilde bar vec overrightarrow overleftarrow dot ddot acute grave not boxed'),
  ...list('cancel bcancel xcancel sout phantom hphantom vphantom mathstrut substack smash'),
  ...list('left right middle big Big bigg Bigg bigl bigr Bigl Bigr biggl biggr Biggl Biggr bigm Bigm'),
  ...list('lfloor rfloor lceil rceil langle rangle lvert rvert lVert rVert lbrace rbrace lbrack rbrack vert Vert'),
  ...list('begin end hline quad qquad thinspace medspace thickspace enspace limits nolimits displaystyle textstyle'),
  ...list(
    'scriptstyle scriptscriptstyle text textbf textit textrm textsf texttt textnormal mathrm mathbf mathit mathsf',
  ),
  ...list('mathtt mathbb mathcal mathfrak mathscr boldsymbol bm pmb operatorname'),
  ...list('alpha beta gamma delta epsilon varepsilon zeta eta theta vartheta iota kappa lambda mu nu xi pi varpi rho'),
  ...list('varrho sigma varsigma tau upsilon phi varphi chi psi omega Gamma Delta Theta Lambda Xi Pi Sigma Upsilon'),
  ...list('Phi Psi Omega'),
  ...list('times div pm mp cdot ast star circ bullet oplus otimes cup cap setminus land lor lnot neg wedge vee'),
  ...list('le leq ge geq lt gt ne neq approx equiv sim simeq cong propto ll gg subset supset subseteq supseteq in ni'),
  ...list('notin parallel perp mid nmid prec succ'),
  ...list(
    'to gets rightarrow leftarrow leftrightarrow Rightarrow Leftarrow Leftrightarrow longrightarrow longleftarrow',
  ),
  ...list('Longrightarrow implies iff mapsto uparrow downarrow rightleftharpoons leftrightharpoons xrightarrow'),
  ...list('xleftarrow xrightleftharpoons rightharpoonup'),
  ...list('sum prod int iint oint lim sin cos tan cosec csc sec cot arcsin arccos arctan sinh cosh tanh log ln lg exp'),
  ...list('max min gcd det deg dim arg mod bmod pmod'),
  ...list('infty partial nabla angle measuredangle triangle square therefore because forall exists nexists emptyset'),
  ...list('varnothing prime degree hbar ell Re Im aleph ldots cdots vdots ddots dots dotsc pounds euro checkmark'),
  ...list('ce pu'),
]);

const ENVIRONMENTS = new Set(
  list(
    'matrix pmatrix bmatrix Bmatrix vmatrix Vmatrix array aligned alignedat gathered cases rcases split smallmatrix align align* gather',
  ),
);

/** Why a formula is not drawn, in words, or null where it may be. */
export function refuseFormula(source: string): string | null {
  if (source.length > FORMULA_LIMIT) return `A formula may be ${FORMULA_LIMIT} characters long.`;
  for (const [, name] of source.matchAll(/\\([a-zA-Z]+)/g)) {
    if (name && !ALLOWED.has(name)) return `\\${name} is not a command that Plait knows.`;
  }
  for (const [, name] of source.matchAll(/\\begin\s*\{([^}]*)\}/g)) {
    if (name !== undefined && !ENVIRONMENTS.has(name)) return `The environment ${name} is not one that Plait knows.`;
  }
  return null;
}
