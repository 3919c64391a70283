/**
 * Generated file, do not edit: change the budget or the model and generate again.
 *
 * GPS broadcast ephemeris (legacy navigation message), Earth-fixed position and clock.
 * Model gps-lnav: IS-GPS-200, Table 20-IV and 20.3.3.3.3; formula sha256 5f836c5a9091cf697931b1ab8c6fb4ce7d2fbf92e8c01aaf6eb3273e2c4ce794.
 * Domain flown. Choices: arithmetic f32, Kepler starter secondOrder, corrector newton, cap 1.
 * Error position_m: at most 242 (certified over the domain), 217 observed.
 * Beside each line: the range of its value over the domain, and its share of the certified error.
 *
 * Not certified for safety of life. The interface documents, local rules and licensed practice decide.
 */
const fround = Math.fround;

/** Words of the state array. */
export const stateWords = 20;

/**
 * Prepares the state of one satellite; call it once for each upload of elements.
 *
 * @param elements record of numbers: sqrtA, e, i0, Omega0, omega, M0, deltaN, IDOT, OmegaDot, Cuc, Cus, Crc, Crs, Cic, Cis, toe; ranges and units:
 *   sqrtA [5150, 5160] m^(1/2)
 *   e [0, 0.03] 1
 *   i0 [0.9, 1.02] rad
 *   Omega0 [-3.1415926536, 3.1415926536] rad
 *   omega [-3.1415926536, 3.1415926536] rad
 *   M0 [-3.1415926536, 3.1415926536] rad
 *   deltaN [-1.1703344634254336e-8, 1.1702987476520137e-8] rad/s
 *   IDOT [-2.925836158563584e-9, 2.925479000829385e-9] rad/s
 *   OmegaDot [-1e-8, -6e-9] rad/s
 *   Cuc [-0.00006103515625061035, 0.0000610332936054611] rad
 *   Cus [-0.00006103515625061035, 0.0000610332936054611] rad
 *   Crc [-1024.00000001024, 1023.9687500102397] m
 *   Crs [-1024.00000001024, 1023.9687500102397] m
 *   Cic [-0.00006103515625061035, 0.0000610332936054611] rad
 *   Cis [-0.00006103515625061035, 0.0000610332936054611] rad
 *   toe [0, 604784] s
 * @param {Float32Array} state stateWords words, written
 * @returns 0 good; 1 an element outside its range; 3 an element that is not a finite number.
 *   After any other status than 0 the state is void, and position returns 1.
 */
export function setup(elements, state) {
  state[0] = 0;
  const sqrtA = elements.sqrtA;
  const sqrtA32 = fround(sqrtA);
  if (!(sqrtA32 >= 5150 && sqrtA32 <= 5160)) return fround(sqrtA32 - sqrtA32) === 0 ? 1 : 3;
  const e = elements.e;
  const e32 = fround(e);
  if (!(e32 >= 0 && e32 <= 0.029999999329447746)) return fround(e32 - e32) === 0 ? 1 : 3;
  const i0 = elements.i0;
  const i032 = fround(i0);
  if (!(i032 >= 0.8999999761581421 && i032 <= 1.0199999809265137)) return fround(i032 - i032) === 0 ? 1 : 3;
  const Omega0 = elements.Omega0;
  const Omega032 = fround(Omega0);
  if (!(Omega032 >= -3.1415927410125732 && Omega032 <= 3.1415927410125732)) return fround(Omega032 - Omega032) === 0 ? 1 : 3;
  const omega = elements.omega;
  const omega32 = fround(omega);
  if (!(omega32 >= -3.1415927410125732 && omega32 <= 3.1415927410125732)) return fround(omega32 - omega32) === 0 ? 1 : 3;
  const M0 = elements.M0;
  const M032 = fround(M0);
  if (!(M032 >= -3.1415927410125732 && M032 <= 3.1415927410125732)) return fround(M032 - M032) === 0 ? 1 : 3;
  const deltaN = elements.deltaN;
  const deltaN32 = fround(deltaN);
  if (!(deltaN32 >= -1.1703344959812512e-8 && deltaN32 <= 1.1702987912087792e-8)) return fround(deltaN32 - deltaN32) === 0 ? 1 : 3;
  const IDOT = elements.IDOT;
  const IDOT32 = fround(IDOT);
  if (!(IDOT32 >= -2.925836239953128e-9 && IDOT32 <= 2.9254789701838035e-9)) return fround(IDOT32 - IDOT32) === 0 ? 1 : 3;
  const OmegaDot = elements.OmegaDot;
  const OmegaDot32 = fround(OmegaDot);
  if (!(OmegaDot32 >= -9.99999993922529e-9 && OmegaDot32 <= -6.000000052353016e-9)) return fround(OmegaDot32 - OmegaDot32) === 0 ? 1 : 3;
  const Cuc = elements.Cuc;
  const Cuc32 = fround(Cuc);
  if (!(Cuc32 >= -0.00006103515625 && Cuc32 <= 0.00006103329360485077)) return fround(Cuc32 - Cuc32) === 0 ? 1 : 3;
  const Cus = elements.Cus;
  const Cus32 = fround(Cus);
  if (!(Cus32 >= -0.00006103515625 && Cus32 <= 0.00006103329360485077)) return fround(Cus32 - Cus32) === 0 ? 1 : 3;
  const Crc = elements.Crc;
  const Crc32 = fround(Crc);
  if (!(Crc32 >= -1024 && Crc32 <= 1023.96875)) return fround(Crc32 - Crc32) === 0 ? 1 : 3;
  const Crs = elements.Crs;
  const Crs32 = fround(Crs);
  if (!(Crs32 >= -1024 && Crs32 <= 1023.96875)) return fround(Crs32 - Crs32) === 0 ? 1 : 3;
  const Cic = elements.Cic;
  const Cic32 = fround(Cic);
  if (!(Cic32 >= -0.00006103515625 && Cic32 <= 0.00006103329360485077)) return fround(Cic32 - Cic32) === 0 ? 1 : 3;
  const Cis = elements.Cis;
  const Cis32 = fround(Cis);
  if (!(Cis32 >= -0.00006103515625 && Cis32 <= 0.00006103329360485077)) return fround(Cis32 - Cis32) === 0 ? 1 : 3;
  const toe = elements.toe;
  const toe32 = fround(toe);
  if (!(toe32 >= 0 && toe32 <= 604784)) return fround(toe32 - toe32) === 0 ? 1 : 3;
  const A = fround(sqrtA32 * sqrtA32); // [26520000, 26630000], 0.5 %
  const v1 = fround(M032 * 0.6366197466850281); // [-2.001, 2.001]
  const v2 = fround(v1 + 0.5); // [-1.501, 2.501]
  const v3 = Math.floor(v2); // [-2, 2]
  const v4 = fround(v3 * 0.5); // [-1.001, 1.001]
  const v5 = Math.floor(v4); // [-2, 1]
  const v6 = fround(v5 + v5); // [-4.001, 2.001]
  const v7 = fround(v3 - v6); // [-4.001, 6.001]
  const v8 = fround(v3 * 1.570796012878418); // [-3.142, 3.142]
  const v9 = fround(M032 - v8); // [-6.284, 6.284]
  const v10 = fround(v3 * 3.139164164167596e-7); // [-6.279e-7, 6.279e-7]
  const v11 = fround(v9 - v10); // [-6.284, 6.284]
  const v12 = fround(v3 * 6.223371969669989e-14); // [-1.245e-13, 1.245e-13]
  const v13 = fround(v11 - v12); // [-6.284, 6.284]
  const v14 = fround(v13 * v13); // [-0.000001908, 39.48]
  const v15 = fround(v14 * -2.755731998149713e-7); // [-0.00001088, 9.804e-13]
  const v16 = fround(0.000024801587642286904 + v15); // [0.00001392, 0.00002481]
  const v17 = fround(v14 * v16); // [-1.056e-10, 0.0009792]
  const v18 = fround(-0.0013888889225199819 + v17); // [-0.001389, -0.0004097]
  const v19 = fround(v14 * v18); // [-0.05484, 4.512e-9]
  const v20 = fround(0.0416666679084301 + v19); // [-0.01317, 0.04167]
  const v21 = fround(v14 * v20); // [-0.5198, 1.645]
  const v22 = fround(-0.5 + v21); // [-1.02, 1.145]
  const v23 = fround(v14 * v22); // [-40.26, 45.21]
  const v24 = fround(1 + v23); // [-39.26, 46.21]
  const v25 = fround(v13 * v14); // [-248.1, 248.1]
  const v26 = fround(v14 * 0.0000027557318844628753); // [-8.895e-12, 0.0001088]
  const v27 = fround(-0.00019841270113829523 + v26); // [-0.0001985, -0.00008962]
  const v28 = fround(v14 * v27); // [-0.007834, 8.442e-10]
  const v29 = fround(0.008333333767950535 + v28); // [0.0005003, 0.008334]
  const v30 = fround(v14 * v29); // [-3.08e-8, 0.329]
  const v31 = fround(-0.1666666716337204 + v30); // [-0.1667, 0.1624]
  const v32 = fround(v25 * v31); // [-41.35, 41.35]
  const v33 = fround(v13 + v32); // [-47.63, 47.63]
  const v34 = v7 < 0.5 ? v24 : v33; // [-47.63, 47.63]
  const v35 = fround(v5 * 0.5); // [-1.001, 0.5001]
  const v36 = Math.floor(v35); // [-2, 0]
  const v37 = fround(v36 + v36); // [-4.001, 1.193e-7]
  const v38 = fround(v5 - v37); // [-2.001, 5.001]
  const v39 = fround(v38 + v38); // [-4.001, 10.01]
  const v40 = fround(1 - v39); // [-9.001, 5.001]
  const v41 = -v40; // [-5.001, 9.001]
  const v42 = v7 < 0.5 ? v40 : v41; // [-9.001, 9.001]
  const v43 = fround(v34 * v42); // [-1.001, 1.001], 0.3 %
  const v44 = fround(A * A); // [703400000000000, 709000000000000], 0.2 %
  const v45 = fround(v44 * A); // [1.865e+22, 1.888e+22], 0.1 %
  const v46 = fround(398600513257472 / v45); // [2.111e-8, 2.137e-8], 0.2 %
  const n0 = fround(Math.sqrt(v46)); // [0.0001453, 0.0001462], 0.4 %
  const n = fround(n0 + deltaN32); // [0.0001453, 0.0001462], 0.4 %
  const v47 = v7 < 0.5 ? v33 : v24; // [-47.63, 47.63]
  const v48 = fround(v47 * v40); // [-1.001, 1.001]
  const v49 = fround(e32 * e32); // [-2.911e-11, 0.0009001]
  const v50 = fround(1 - v49); // [0.999, 1.001], 0.1 %
  const v51 = fround(Math.sqrt(v50)); // [0.9995, 1.001], 0.1 %
  const v52 = fround(omega32 * 0.6366197466850281); // [-2.001, 2.001]
  const v53 = fround(v52 + 0.5); // [-1.501, 2.501]
  const v54 = Math.floor(v53); // [-2, 2]
  const v55 = fround(v54 * 0.5); // [-1.001, 1.001]
  const v56 = Math.floor(v55); // [-2, 1]
  const v57 = fround(v56 + v56); // [-4.001, 2.001]
  const v58 = fround(v54 - v57); // [-4.001, 6.001]
  const v59 = fround(v54 * 1.570796012878418); // [-3.142, 3.142]
  const v60 = fround(omega32 - v59); // [-6.284, 6.284]
  const v61 = fround(v54 * 3.139164164167596e-7); // [-6.279e-7, 6.279e-7]
  const v62 = fround(v60 - v61); // [-6.284, 6.284]
  const v63 = fround(v54 * 6.223371969669989e-14); // [-1.245e-13, 1.245e-13]
  const v64 = fround(v62 - v63); // [-6.284, 6.284]
  const v65 = fround(v64 * v64); // [-0.000001908, 39.48]
  const v66 = fround(v65 * -2.755731998149713e-7); // [-0.00001088, 9.804e-13]
  const v67 = fround(0.000024801587642286904 + v66); // [0.00001392, 0.00002481]
  const v68 = fround(v65 * v67); // [-1.056e-10, 0.0009792]
  const v69 = fround(-0.0013888889225199819 + v68); // [-0.001389, -0.0004097]
  const v70 = fround(v65 * v69); // [-0.05484, 4.512e-9]
  const v71 = fround(0.0416666679084301 + v70); // [-0.01317, 0.04167]
  const v72 = fround(v65 * v71); // [-0.5198, 1.645]
  const v73 = fround(-0.5 + v72); // [-1.02, 1.145]
  const v74 = fround(v65 * v73); // [-40.26, 45.21]
  const v75 = fround(1 + v74); // [-39.26, 46.21]
  const v76 = fround(v64 * v65); // [-248.1, 248.1]
  const v77 = fround(v65 * 0.0000027557318844628753); // [-8.895e-12, 0.0001088]
  const v78 = fround(-0.00019841270113829523 + v77); // [-0.0001985, -0.00008962]
  const v79 = fround(v65 * v78); // [-0.007834, 8.442e-10]
  const v80 = fround(0.008333333767950535 + v79); // [0.0005003, 0.008334]
  const v81 = fround(v65 * v80); // [-3.08e-8, 0.329]
  const v82 = fround(-0.1666666716337204 + v81); // [-0.1667, 0.1624]
  const v83 = fround(v76 * v82); // [-41.35, 41.35]
  const v84 = fround(v64 + v83); // [-47.63, 47.63]
  const v85 = v58 < 0.5 ? v75 : v84; // [-47.63, 47.63]
  const v86 = fround(v56 * 0.5); // [-1.001, 0.5001]
  const v87 = Math.floor(v86); // [-2, 0]
  const v88 = fround(v87 + v87); // [-4.001, 1.193e-7]
  const v89 = fround(v56 - v88); // [-2.001, 5.001]
  const v90 = fround(v89 + v89); // [-4.001, 10.01]
  const v91 = fround(1 - v90); // [-9.001, 5.001]
  const v92 = -v91; // [-5.001, 9.001]
  const v93 = v58 < 0.5 ? v91 : v92; // [-9.001, 9.001]
  const cosomega = fround(v85 * v93); // [-1.001, 1.001], 1.0 %
  const v94 = v58 < 0.5 ? v84 : v75; // [-47.63, 47.63]
  const sinomega = fround(v94 * v91); // [-1.001, 1.001]
  const v95 = fround(0.00007292115333257243 * toe32); // [-0.000004187, 44.11], 20.9 %
  const v96 = fround(Omega032 - v95); // [-47.25, 3.142], 20.9 %
  const v97 = fround(v96 * 0.6366197466850281); // [-30.08, 2.001]
  const v98 = fround(v97 + 0.5); // [-29.58, 2.501]
  const v99 = Math.floor(v98); // [-30, 2]
  const v100 = fround(v99 * 0.5); // [-15.01, 1.001]
  const v101 = Math.floor(v100); // [-16, 1]
  const v102 = fround(v101 + v101); // [-32.01, 2.001]
  const v103 = fround(v99 - v102); // [-32.01, 34.01]
  const v104 = fround(v99 * 1.5707931518554688); // [-47.13, 3.142]
  const v105 = fround(v96 - v104); // [-50.39, 50.27]
  const v106 = fround(v99 * 0.0000031749368645250797); // [-0.00009525, 0.00000635]
  const v107 = fround(v105 - v106); // [-50.39, 50.27]
  const v108 = fround(v99 * 2.5633440682570896e-12); // [-7.691e-11, 5.127e-12]
  const v109 = fround(v107 - v108); // [-50.39, 50.27]
  const v110 = fround(v109 * v109); // [-0.0001221, 2539]
  const v111 = fround(v110 * -2.755731998149713e-7); // [-0.0006996, 6.275e-11]
  const v112 = fround(0.000024801587642286904 + v111); // [-0.0006748, 0.00002481]
  const v113 = fround(v110 * v112); // [-1.713, 0.06297]
  const v114 = fround(-0.0013888889225199819 + v113); // [-1.715, 0.06158]
  const v115 = fround(v110 * v114); // [-4353, 156.4]
  const v116 = fround(0.0416666679084301 + v115); // [-4353, 156.4]
  const v117 = fround(v110 * v116); // [-11050000, 397000]
  const v118 = fround(-0.5 + v117); // [-11050000, 397000]
  const v119 = fround(v110 * v118); // [-28050000000, 1008000000]
  const v120 = fround(1 + v119); // [-28050000000, 1008000000]
  const v121 = fround(v109 * v110); // [-128000, 127700]
  const v122 = fround(v110 * 0.0000027557318844628753); // [-5.693e-10, 0.006996]
  const v123 = fround(-0.00019841270113829523 + v122); // [-0.0001985, 0.006798]
  const v124 = fround(v110 * v123); // [-0.5037, 17.26]
  const v125 = fround(0.008333333767950535 + v124); // [-0.4954, 17.27]
  const v126 = fround(v110 * v125); // [-1258, 43830]
  const v127 = fround(-0.1666666716337204 + v126); // [-1258, 43830]
  const v128 = fround(v121 * v127); // [-5606000000, 5593000000]
  const v129 = fround(v109 + v128); // [-5606000000, 5593000000]
  const v130 = v103 < 0.5 ? v120 : v129; // [-28050000000, 5593000000]
  const v131 = fround(v101 * 0.5); // [-8.001, 0.5001]
  const v132 = Math.floor(v131); // [-9, 0]
  const v133 = fround(v132 + v132); // [-18.01, 9.537e-7]
  const v134 = fround(v101 - v133); // [-16.01, 19.01]
  const v135 = fround(v134 + v134); // [-32.01, 38.01]
  const v136 = fround(1 - v135); // [-37.01, 33.01]
  const v137 = -v136; // [-33.01, 37.01]
  const v138 = v103 < 0.5 ? v136 : v137; // [-37.01, 37.01]
  const v139 = fround(v130 * v138); // [-1.001, 1.001], 1.4 %
  const v140 = fround(OmegaDot32 - 0.00007292115333257243); // [-0.00007294, -0.00007292], 0.3 %
  const v141 = v103 < 0.5 ? v129 : v120; // [-28050000000, 5593000000]
  const v142 = fround(v141 * v136); // [-1.001, 1.001]
  const v143 = fround(i032 * i032); // [0.8099, 1.041]
  const v144 = fround(v143 * -2.755731998149713e-7); // [-2.868e-7, -2.232e-7]
  const v145 = fround(0.000024801587642286904 + v144); // [0.00002451, 0.00002458]
  const v146 = fround(v143 * v145); // [0.00001985, 0.00002558]
  const v147 = fround(-0.0013888889225199819 + v146); // [-0.00137, -0.001363]
  const v148 = fround(v143 * v147); // [-0.001425, -0.001104]
  const v149 = fround(0.0416666679084301 + v148); // [0.04024, 0.04057]
  const v150 = fround(v143 * v149); // [0.03259, 0.04221]
  const v151 = fround(-0.5 + v150); // [-0.4675, -0.4577]
  const v152 = fround(v143 * v151); // [-0.4863, -0.3708]
  const v153 = fround(1 + v152); // [0.5233, 0.6217]
  const v154 = fround(i032 * v143); // [0.7289, 1.062]
  const v155 = fround(v143 * -2.5052107943679403e-8); // [-2.607e-8, -2.029e-8]
  const v156 = fround(0.0000027557318844628753 + v155); // [0.000002729, 0.000002736]
  const v157 = fround(v143 * v156); // [0.000002211, 0.000002846]
  const v158 = fround(-0.00019841270113829523 + v157); // [-0.0001963, -0.0001955]
  const v159 = fround(v143 * v158); // [-0.0002042, -0.0001584]
  const v160 = fround(0.008333333767950535 + v159); // [0.008129, 0.008175]
  const v161 = fround(v143 * v160); // [0.006584, 0.008506]
  const v162 = fround(-0.1666666716337204 + v161); // [-0.1601, -0.1581]
  const v163 = fround(v154 * v162); // [-0.1699, -0.1152]
  const v164 = fround(i032 + v163); // [0.7833, 0.8522]
  state[0] = n;
  state[1] = v43;
  state[2] = v48;
  state[3] = e32;
  state[4] = A;
  state[5] = v51;
  state[6] = cosomega;
  state[7] = sinomega;
  state[8] = Crs32;
  state[9] = Crc32;
  state[10] = Cus32;
  state[11] = Cuc32;
  state[12] = v140;
  state[13] = v139;
  state[14] = v142;
  state[15] = IDOT32;
  state[16] = Cis32;
  state[17] = Cic32;
  state[18] = v153;
  state[19] = v164;
  return 0;
}

/**
 * Predicts at one epoch, in the same operations for every input.
 *
 * @param t time since the reference epoch of the elements, s, in [-7200, 7200]
 * @param {Float32Array} state the words that setup wrote
 * @param out array of numbers, written only with status 0:
 *   out[0] position x, m
 *   out[1] position y, m
 *   out[2] position z, m
 * @returns 0 good; 1 a state that setup did not fill; 2 t outside its span; 3 t not a finite number.
 */
export function position(t, state, out) {
  const t32 = fround(t);
  if (!(t32 >= -7200 && t32 <= 7200)) return fround(t32 - t32) === 0 ? 2 : 3;
  const n = state[0];
  const v43 = state[1];
  const v48 = state[2];
  const e32 = state[3];
  const A = state[4];
  const v51 = state[5];
  const cosomega = state[6];
  const sinomega = state[7];
  const Crs32 = state[8];
  const Crc32 = state[9];
  const Cus32 = state[10];
  const Cuc32 = state[11];
  const v140 = state[12];
  const v139 = state[13];
  const v142 = state[14];
  const IDOT32 = state[15];
  const Cis32 = state[16];
  const Cic32 = state[17];
  const v153 = state[18];
  const v164 = state[19];
  if (!(n > 0)) return 1;
  const v165 = fround(n * t32); // [-1.053, 1.053], 0.5 %
  const v166 = fround(v165 * v165); // [-5.961e-8, 1.108]
  const v167 = fround(v166 * -2.755731998149713e-7); // [-3.053e-7, 3.064e-14]
  const v168 = fround(0.000024801587642286904 + v167); // [0.00002449, 0.00002481]
  const v169 = fround(v166 * v168); // [-2.388e-12, 0.00002748]
  const v170 = fround(-0.0013888889225199819 + v169); // [-0.001389, -0.001361]
  const v171 = fround(v166 * v170); // [-0.001539, 1.41e-10]
  const v172 = fround(0.0416666679084301 + v171); // [0.04012, 0.04167]
  const v173 = fround(v166 * v172); // [-4.347e-9, 0.04616]
  const v174 = fround(-0.5 + v173); // [-0.5001, -0.4538]
  const v175 = fround(v166 * v174); // [-0.5539, 5.961e-8]
  const v176 = fround(1 + v175); // [0.4954, 1.001], 1.0 %
  const v177 = fround(v43 * v176); // [-1.001, 1.001]
  const v178 = fround(v165 * v166); // [-1.166, 1.166]
  const v179 = fround(v166 * -2.5052107943679403e-8); // [-2.776e-8, 2.382e-15]
  const v180 = fround(0.0000027557318844628753 + v179); // [0.000002727, 0.000002756]
  const v181 = fround(v166 * v180); // [-2.78e-13, 0.000003053]
  const v182 = fround(-0.00019841270113829523 + v181); // [-0.0001985, -0.0001953]
  const v183 = fround(v166 * v182); // [-0.0002198, 1.911e-11]
  const v184 = fround(0.008333333767950535 + v183); // [0.008113, 0.008334]
  const v185 = fround(v166 * v184); // [-9.624e-10, 0.009231]
  const v186 = fround(-0.1666666716337204 + v185); // [-0.1667, -0.1574]
  const v187 = fround(v178 * v186); // [-0.1944, 0.1944]
  const v188 = fround(v165 + v187); // [-0.8687, 0.8687]
  const v189 = fround(v48 * v188); // [-0.8687, 0.8687]
  const cosM = fround(v177 - v189); // [-1.001, 1.001], 0.8 %
  const v190 = fround(v48 * v176); // [-1.001, 1.001]
  const v191 = fround(v43 * v188); // [-0.8687, 0.8687]
  const sinM = fround(v190 + v191); // [-1.001, 1.001]
  const v192 = fround(e32 * sinM); // [-0.03001, 0.03001]
  const v193 = fround(e32 * cosM); // [-0.03001, 0.03001]
  const v194 = fround(v192 * v193); // [-0.0009001, 0.0009001]
  const v195 = fround(v192 + v194); // [-0.03091, 0.03091]
  const v196 = fround(v195 * v195); // [-2.911e-11, 0.0009549]
  const v197 = fround(v196 * 0.0416666679084301); // [-3.032e-12, 0.00003979]
  const v198 = fround(-0.5 + v197); // [-0.5001, -0.4999]
  const v199 = fround(v196 * v198); // [-0.0004775, 2.911e-11]
  const v200 = fround(1 + v199); // [0.9995, 1.001]
  const v201 = fround(v192 * v200); // [-0.03001, 0.03001]
  const v202 = fround(v195 * v196); // [-0.00002951, 0.00002951]
  const v203 = fround(v202 * -0.1666666716337204); // [-0.000004918, 0.000004918]
  const v204 = fround(v195 + v203); // [-0.03091, 0.03091]
  const v205 = fround(v193 * v204); // [-0.0009272, 0.0009272]
  const v206 = fround(v201 + v205); // [-0.03093, 0.03093]
  const v207 = fround(v195 - v206); // [-0.06183, 0.06183]
  const v208 = fround(v193 * v200); // [-0.03001, 0.03001]
  const v209 = fround(v192 * v204); // [-0.0009272, 0.0009272]
  const v210 = fround(v208 - v209); // [-0.03093, 0.03093]
  const v211 = fround(1 - v210); // [0.969, 1.031]
  const v212 = fround(v207 / v211); // [-0.06381, 0.06381]
  const v213 = fround(v195 - v212); // [-0.03001, 0.03001]
  const v214 = fround(v213 * v213); // [-2.911e-11, 0.0009001]
  const v215 = fround(v214 * 0.0416666679084301); // [-3.032e-12, 0.00003751]
  const v216 = fround(-0.5 + v215); // [-0.5001, -0.4999]
  const v217 = fround(v214 * v216); // [-0.0004501, 2.911e-11]
  const v218 = fround(1 + v217); // [0.9995, 1.001]
  const v219 = fround(cosM * v218); // [-1.001, 1.001]
  const v220 = fround(v213 * v214); // [-0.00002701, 0.00002701]
  const v221 = fround(v220 * -0.1666666716337204); // [-0.000004501, 0.000004501]
  const v222 = fround(v213 + v221); // [-0.03, 0.03]
  const v223 = fround(sinM * v222); // [-0.03, 0.03]
  const cosE = fround(v219 - v223); // [-1.001, 1.001], 0.7 %
  const v224 = fround(e32 * cosE); // [-0.03001, 0.03001]
  const v225 = fround(1 - v224); // [0.9699, 1.031]
  const v226 = fround(A * v225); // [25720000, 27430000]
  const v227 = fround(sinM * v218); // [-1.001, 1.001]
  const v228 = fround(cosM * v222); // [-0.03, 0.03]
  const sinE = fround(v227 + v228); // [-1.001, 1.001]
  const v229 = fround(v51 * sinE); // [-1.001, 1.001], 0.2 %
  const v230 = fround(1 / v225); // [0.9708, 1.031], 0.1 %
  const sinnu = fround(v229 * v230); // [-1.031, 1.031], 0.2 %
  const v231 = fround(sinnu * cosomega); // [-1.031, 1.031]
  const v232 = fround(cosE - e32); // [-1.031, 1.001], 0.2 %
  const cosnu = fround(v232 * v230); // [-1.001, 1.001], 0.2 %
  const v233 = fround(cosnu * sinomega); // [-1.001, 1.001]
  const sinphi = fround(v231 + v233); // [-1.001, 1.001]
  const v234 = fround(sinphi + sinphi); // [-2.001, 2.001]
  const v235 = fround(cosnu * cosomega); // [-1.001, 1.001]
  const v236 = fround(sinnu * sinomega); // [-1.031, 1.031]
  const cosphi = fround(v235 - v236); // [-1.001, 1.001], 0.6 %
  const sin2phi = fround(v234 * cosphi); // [-2.001, 2.001]
  const v237 = fround(Crs32 * sin2phi); // [-2049, 2049]
  const v238 = fround(v234 * sinphi); // [-2.001, 2.001]
  const cos2phi = fround(1 - v238); // [-1.001, 3.001]
  const v239 = fround(Crc32 * cos2phi); // [-3073, 3072]
  const v240 = fround(v237 + v239); // [-5121, 5120]
  const r = fround(v226 + v240); // [25720000, 27430000]
  const v241 = fround(Cus32 * sin2phi); // [-0.0001221, 0.0001221]
  const v242 = fround(Cuc32 * cos2phi); // [-0.0001832, 0.0001832]
  const v243 = fround(v241 + v242); // [-0.0003052, 0.0003052]
  const v244 = fround(v243 * v243); // [-3.553e-15, 9.314e-8]
  const v245 = fround(v244 * -0.5); // [-4.657e-8, 3.553e-15]
  const v246 = fround(1 + v245); // [0.9999, 1.001]
  const v247 = fround(cosphi * v246); // [-1.001, 1.001]
  const v248 = fround(v243 * v244); // [-2.843e-11, 2.843e-11]
  const v249 = fround(v248 * -0.1666666716337204); // [-4.737e-12, 4.737e-12]
  const v250 = fround(v243 + v249); // [-0.0003052, 0.0003052]
  const v251 = fround(sinphi * v250); // [-0.0003052, 0.0003052]
  const cosu = fround(v247 - v251); // [-1.001, 1.001], 0.2 %
  const xOrbit = fround(r * cosu); // [-27430000, 27430000]
  const v252 = fround(v140 * t32); // [-0.5252, 0.5252], 0.3 %
  const v253 = fround(v252 * v252); // [-1.491e-8, 0.2758]
  const v254 = fround(v253 * 0.000024801587642286904); // [-5.97e-13, 0.000006839]
  const v255 = fround(-0.0013888889225199819 + v254); // [-0.001389, -0.001382]
  const v256 = fround(v253 * v255); // [-0.000383, 3.525e-11]
  const v257 = fround(0.0416666679084301 + v256); // [0.04128, 0.04167]
  const v258 = fround(v253 * v257); // [-1.087e-9, 0.01149]
  const v259 = fround(-0.5 + v258); // [-0.5001, -0.4885]
  const v260 = fround(v253 * v259); // [-0.1379, 1.491e-8]
  const v261 = fround(1 + v260); // [0.8652, 1.001], 0.6 %
  const v262 = fround(v139 * v261); // [-1.001, 1.001]
  const v263 = fround(v252 * v253); // [-0.1448, 0.1448]
  const v264 = fround(v253 * 0.0000027557318844628753); // [-6.949e-14, 7.599e-7]
  const v265 = fround(-0.00019841270113829523 + v264); // [-0.0001985, -0.0001976]
  const v266 = fround(v253 * v265); // [-0.00005471, 4.776e-12]
  const v267 = fround(0.008333333767950535 + v266); // [0.008278, 0.008334]
  const v268 = fround(v253 * v267); // [-2.406e-10, 0.002298]
  const v269 = fround(-0.1666666716337204 + v268); // [-0.1667, -0.1643]
  const v270 = fround(v263 * v269); // [-0.02414, 0.02414]
  const v271 = fround(v252 + v270); // [-0.5014, 0.5014]
  const v272 = fround(v142 * v271); // [-0.5014, 0.5014]
  const cosOmega = fround(v262 - v272); // [-1.001, 1.001], 1.5 %
  const v273 = fround(xOrbit * cosOmega); // [-27430000, 27430000]
  const v274 = fround(sinphi * v246); // [-1.001, 1.001]
  const v275 = fround(cosphi * v250); // [-0.0003052, 0.0003052]
  const sinu = fround(v274 + v275); // [-1.001, 1.001]
  const yOrbit = fround(r * sinu); // [-27430000, 27430000]
  const v276 = fround(IDOT32 * t32); // [-0.00002107, 0.00002107]
  const v277 = fround(Cis32 * sin2phi); // [-0.0001221, 0.0001221]
  const v278 = fround(v276 + v277); // [-0.0001432, 0.0001432]
  const v279 = fround(Cic32 * cos2phi); // [-0.0001832, 0.0001832]
  const v280 = fround(v278 + v279); // [-0.0003263, 0.0003263]
  const v281 = fround(v280 * v280); // [-3.553e-15, 1.065e-7]
  const v282 = fround(v281 * -0.5); // [-5.322e-8, 3.553e-15]
  const v283 = fround(1 + v282); // [0.9999, 1.001]
  const v284 = fround(v153 * v283); // [0.5233, 0.6217]
  const v285 = fround(v280 * v281); // [-3.473e-11, 3.473e-11]
  const v286 = fround(v285 * -0.1666666716337204); // [-5.788e-12, 5.788e-12]
  const v287 = fround(v280 + v286); // [-0.0003263, 0.0003263]
  const v288 = fround(v164 * v287); // [-0.000278, 0.000278]
  const cosi = fround(v284 - v288); // [0.523, 0.6219]
  const v289 = fround(yOrbit * cosi); // [-17060000, 17060000]
  const v290 = fround(v142 * v261); // [-1.001, 1.001]
  const v291 = fround(v139 * v271); // [-0.5014, 0.5014]
  const sinOmega = fround(v290 + v291); // [-1.001, 1.001]
  const v292 = fround(v289 * sinOmega); // [-17060000, 17060000]
  const v293 = fround(v273 - v292); // [-44490000, 44490000]
  const v294 = fround(xOrbit * sinOmega); // [-27430000, 27430000]
  const v295 = fround(v289 * cosOmega); // [-17060000, 17060000]
  const v296 = fround(v294 + v295); // [-44490000, 44490000]
  const v297 = fround(v164 * v283); // [0.7833, 0.8522]
  const v298 = fround(v153 * v287); // [-0.0002028, 0.0002028]
  const sini = fround(v297 + v298); // [0.7831, 0.8523]
  const v299 = fround(yOrbit * sini); // [-23380000, 23380000]
  out[0] = v293;
  out[1] = v296;
  out[2] = v299;
  return 0;
}
