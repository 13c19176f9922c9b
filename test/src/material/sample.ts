/** An invented metal record in which everything is right. */
export const SAMPLE = Object.freeze({
  id: 'alloy',
  kind: 'metal',
  name: 'Alloy',
  family: 'aluminium',
  density: '2700 kg/m³',
  youngsModulus: '70 GPa',
  shearModulus: '26 GPa',
  poissonRatio: 0.33,
  tensileYield: '260 MPa',
  tensileUltimate: '310 MPa',
  shearUltimate: '200 MPa',
  wallMin: '0.6 mm',
  wallTolerance: 0.1,
  source: 'invented',
});

/** The sample with some keys set anew. */
export function sampleWith(change: Readonly<Record<string, unknown>>): Record<string, unknown> {
  return { ...SAMPLE, ...change };
}

/** The sample without some keys. */
export function sampleWithout(...keys: readonly string[]): Record<string, unknown> {
  return Object.fromEntries(Object.entries(SAMPLE).filter(([key]) => !keys.includes(key)));
}

/** The messages of a refusal; empty where there was none. */
export function messagesOf(
  result: { readonly ok: boolean } & { readonly problems?: readonly { readonly message: string }[] },
): readonly string[] {
  return result.problems?.map(({ message }) => message) ?? [];
}
