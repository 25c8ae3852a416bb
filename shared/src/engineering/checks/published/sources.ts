/** Published sources of the criteria, as they are printed. */
export const sources = {
  limitedAccess: 'K-State, Livestock Watering Handbook, "Limited Access" (undated)',
  georgeMurphy:
    'George & Murphy, K-State, "Construction of a Limited Access Ramp for Pond Watering of Cattle" (undated)',
  hardenedSurface: 'K-State, Livestock Watering Handbook, "Hardened Surface" (undated)',
  anr12: 'Ohio State University Extension, fact sheet ANR-12, 11 February 2003',
  kerr: 'Kerr Center (Oklahoma), pond watering points, 2011',
  noble: 'Noble Research Institute, "Pond Fencing"; earlier in The Cattleman, May 2013',
  alabama:
    'NRCS Alabama job sheet AL614, as quoted by Alabama Farm News, November 2014; NRCS Arkansas, heavy use area page',
  georgia: 'NRCS Georgia guide sheet GA-578GS1 (undated); heavy use areas sheet, Tennessee, November 2001',
  crossingSpec: 'NRCS state construction specification 578 (state not shown): 18 in',
  riprapSpec: 'general riprap specification of a state agency (copy without title page): 3 ft under water',
  standard362: 'practice standard 362, Diversion, text: 10-year, 24-hour storm on agricultural land',
  army: 'U.S. Army engineer course EN5465, lesson on ditches: at least 0.5 % for a clear channel',
  coloradoBerm: 'Colorado highway erosion control manual, berms and diversions (EC-8)',
  pennsylvania: 'Pennsylvania erosion control manual, berms that are mown',
  minnesota: 'Minnesota Stormwater Manual, maximum runoff velocity for a berm',
  virginiaRods: 'NRCS Virginia electric fence job sheet 382, June 2009',
  stormwater: '40 CFR 122.26(b)(15)(i)',
  district: 'district setting',
  districtSafety: 'district safety rule, no published authority',
  practice: 'common practice, no source',
  geometry: 'geometry',
  memory: 'from memory, verify',
} as const
