/**
 * Generated file, do not edit: change the budget or the model and generate again.
 *
 * GPS broadcast ephemeris (legacy navigation message), Earth-fixed position and clock.
 * Model gps-lnav: IS-GPS-200, Table 20-IV and 20.3.3.3.3; formula sha256 5f836c5a9091cf697931b1ab8c6fb4ce7d2fbf92e8c01aaf6eb3273e2c4ce794.
 * Domain flown. Choices: arithmetic f64-setup-f32-tick, Kepler starter secondOrder, corrector newton, cap 1.
 * Error position_m: at most 38.8 (certified over the domain), 22.2 observed.
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
  if (!(sqrtA >= 5150 && sqrtA <= 5160)) return sqrtA - sqrtA === 0 ? 1 : 3;
  const e = elements.e;
  if (!(e >= 0 && e <= 0.03)) return e - e === 0 ? 1 : 3;
  const i0 = elements.i0;
  if (!(i0 >= 0.9 && i0 <= 1.02)) return i0 - i0 === 0 ? 1 : 3;
  const Omega0 = elements.Omega0;
  if (!(Omega0 >= -3.1415926536 && Omega0 <= 3.1415926536)) return Omega0 - Omega0 === 0 ? 1 : 3;
  const omega = elements.omega;
  if (!(omega >= -3.1415926536 && omega <= 3.1415926536)) return omega - omega === 0 ? 1 : 3;
  const M0 = elements.M0;
  if (!(M0 >= -3.1415926536 && M0 <= 3.1415926536)) return M0 - M0 === 0 ? 1 : 3;
  const deltaN = elements.deltaN;
  if (!(deltaN >= -1.1703344634254336e-8 && deltaN <= 1.1702987476520137e-8)) return deltaN - deltaN === 0 ? 1 : 3;
  const IDOT = elements.IDOT;
  if (!(IDOT >= -2.925836158563584e-9 && IDOT <= 2.925479000829385e-9)) return IDOT - IDOT === 0 ? 1 : 3;
  const OmegaDot = elements.OmegaDot;
  if (!(OmegaDot >= -1e-8 && OmegaDot <= -6e-9)) return OmegaDot - OmegaDot === 0 ? 1 : 3;
  const Cuc = elements.Cuc;
  if (!(Cuc >= -0.00006103515625061035 && Cuc <= 0.0000610332936054611)) return Cuc - Cuc === 0 ? 1 : 3;
  const Cus = elements.Cus;
  if (!(Cus >= -0.00006103515625061035 && Cus <= 0.0000610332936054611)) return Cus - Cus === 0 ? 1 : 3;
  const Crc = elements.Crc;
  if (!(Crc >= -1024.00000001024 && Crc <= 1023.9687500102397)) return Crc - Crc === 0 ? 1 : 3;
  const Crs = elements.Crs;
  if (!(Crs >= -1024.00000001024 && Crs <= 1023.9687500102397)) return Crs - Crs === 0 ? 1 : 3;
  const Cic = elements.Cic;
  if (!(Cic >= -0.00006103515625061035 && Cic <= 0.0000610332936054611)) return Cic - Cic === 0 ? 1 : 3;
  const Cis = elements.Cis;
  if (!(Cis >= -0.00006103515625061035 && Cis <= 0.0000610332936054611)) return Cis - Cis === 0 ? 1 : 3;
  const toe = elements.toe;
  if (!(toe >= 0 && toe <= 604784)) return toe - toe === 0 ? 1 : 3;
  const A = sqrtA * sqrtA; // [26520000, 26630000]
  const A32 = fround(A); // [26520000, 26630000], 2.4 %
  const e32 = fround(e); // [-9.314e-10, 0.03001]
  const v1 = M0 * 0.6366197723675814; // [-2.001, 2.001]
  const v2 = v1 + 0.5; // [-1.501, 2.501]
  const v3 = Math.floor(v2); // [-2, 2]
  const v4 = v3 * 0.5; // [-1.001, 1.001]
  const v5 = Math.floor(v4); // [-2, 1]
  const v6 = v5 + v5; // [-4.001, 2.001]
  const v7 = v3 - v6; // [-4.001, 6.001]
  const v8 = v3 * 1.5707963267948966; // [-3.142, 3.142]
  const v9 = M0 - v8; // [-6.284, 6.284]
  const v10 = v3 * 6.123233995736757e-17; // [-1.225e-16, 1.225e-16]
  const v11 = v9 - v10; // [-6.284, 6.284]
  const v12 = v3 * 8.4784276603689e-32; // [-1.696e-31, 1.696e-31]
  const v13 = v11 - v12; // [-6.284, 6.284]
  const v14 = v13 * v13; // [-3.553e-15, 39.48]
  const v15 = v14 * 4.779477332387385e-14; // [-3.718e-28, 1.887e-12]
  const v16 = -1.1470745597729725e-11 + v15; // [-1.148e-11, -9.583e-12]
  const v17 = v14 * v16; // [-4.529e-10, 6.661e-26]
  const v18 = 2.08767569878681e-9 + v17; // [1.634e-9, 2.088e-9]
  const v19 = v14 * v18; // [-1.404e-23, 8.242e-8]
  const v20 = -2.755731922398589e-7 + v19; // [-2.756e-7, -1.931e-7]
  const v21 = v14 * v20; // [-0.00001088, 1.827e-21]
  const v22 = 0.0000248015873015873 + v21; // [0.00001392, 0.00002481]
  const v23 = v14 * v22; // [-1.966e-19, 0.0009792]
  const v24 = -0.001388888888888889 + v23; // [-0.001389, -0.0004097]
  const v25 = v14 * v24; // [-0.05484, 8.404e-18]
  const v26 = 0.041666666666666664 + v25; // [-0.01317, 0.04167]
  const v27 = v14 * v26; // [-0.5198, 1.645]
  const v28 = -0.5 + v27; // [-1.02, 1.145]
  const v29 = v14 * v28; // [-40.26, 45.21]
  const v30 = 1 + v29; // [-39.26, 46.21]
  const v31 = v13 * v14; // [-248.1, 248.1]
  const v32 = v14 * 2.8114572543455206e-15; // [-1.63e-29, 1.11e-13]
  const v33 = -7.647163731819816e-13 + v32; // [-7.648e-13, -6.537e-13]
  const v34 = v14 * v33; // [-3.019e-11, 5.948e-27]
  const v35 = 1.6059043836821613e-10 + v34; // [1.304e-10, 1.606e-10]
  const v36 = v14 * v35; // [-9.842e-25, 6.34e-9]
  const v37 = -2.505210838544172e-8 + v36; // [-2.506e-8, -1.871e-8]
  const v38 = v14 * v37; // [-9.891e-7, 1.949e-22]
  const v39 = 0.0000027557319223985893 + v38; // [0.000001766, 0.000002756]
  const v40 = v14 * v39; // [-1.657e-20, 0.0001088]
  const v41 = -0.0001984126984126984 + v40; // [-0.0001985, -0.00008962]
  const v42 = v14 * v41; // [-0.007834, 1.573e-18]
  const v43 = 0.008333333333333333 + v42; // [0.0005003, 0.008334]
  const v44 = v14 * v43; // [-5.737e-17, 0.329]
  const v45 = -0.16666666666666666 + v44; // [-0.1667, 0.1624]
  const v46 = v31 * v45; // [-41.35, 41.35]
  const v47 = v13 + v46; // [-47.63, 47.63]
  const v48 = v7 < 0.5 ? v30 : v47; // [-47.63, 47.63]
  const v49 = v5 * 0.5; // [-1.001, 0.5001]
  const v50 = Math.floor(v49); // [-2, 0]
  const v51 = v50 + v50; // [-4.001, 4.441e-16]
  const v52 = v5 - v51; // [-2.001, 5.001]
  const v53 = v52 + v52; // [-4.001, 10.01]
  const v54 = 1 - v53; // [-9.001, 5.001]
  const v55 = -v54; // [-5.001, 9.001]
  const v56 = v7 < 0.5 ? v54 : v55; // [-9.001, 9.001]
  const v57 = v48 * v56; // [-1.001, 1.001]
  const v58 = fround(v57); // [-1.001, 1.001], 2.9 %
  const v59 = A * A; // [703400000000000, 709000000000000]
  const v60 = v59 * A; // [1.865e+22, 1.888e+22]
  const v61 = 398600500000000 / v60; // [2.111e-8, 2.137e-8]
  const n0 = Math.sqrt(v61); // [0.0001453, 0.0001462]
  const n = n0 + deltaN; // [0.0001453, 0.0001462]
  const n32 = fround(n); // [0.0001453, 0.0001462], 0.6 %
  const v62 = v7 < 0.5 ? v47 : v30; // [-47.63, 47.63]
  const v63 = v62 * v54; // [-1.001, 1.001]
  const v64 = fround(v63); // [-1.001, 1.001]
  const Crs32 = fround(Crs); // [-1025, 1024]
  const v65 = e * e; // [-5.422e-20, 0.0009001]
  const v66 = 1 - v65; // [0.999, 1.001]
  const v67 = Math.sqrt(v66); // [0.9995, 1.001]
  const v68 = fround(v67); // [0.9995, 1.001]
  const v69 = omega * 0.6366197723675814; // [-2.001, 2.001]
  const v70 = v69 + 0.5; // [-1.501, 2.501]
  const v71 = Math.floor(v70); // [-2, 2]
  const v72 = v71 * 0.5; // [-1.001, 1.001]
  const v73 = Math.floor(v72); // [-2, 1]
  const v74 = v73 + v73; // [-4.001, 2.001]
  const v75 = v71 - v74; // [-4.001, 6.001]
  const v76 = v71 * 1.5707963267948966; // [-3.142, 3.142]
  const v77 = omega - v76; // [-6.284, 6.284]
  const v78 = v71 * 6.123233995736757e-17; // [-1.225e-16, 1.225e-16]
  const v79 = v77 - v78; // [-6.284, 6.284]
  const v80 = v71 * 8.4784276603689e-32; // [-1.696e-31, 1.696e-31]
  const v81 = v79 - v80; // [-6.284, 6.284]
  const v82 = v81 * v81; // [-3.553e-15, 39.48]
  const v83 = v82 * 4.779477332387385e-14; // [-3.718e-28, 1.887e-12]
  const v84 = -1.1470745597729725e-11 + v83; // [-1.148e-11, -9.583e-12]
  const v85 = v82 * v84; // [-4.529e-10, 6.661e-26]
  const v86 = 2.08767569878681e-9 + v85; // [1.634e-9, 2.088e-9]
  const v87 = v82 * v86; // [-1.404e-23, 8.242e-8]
  const v88 = -2.755731922398589e-7 + v87; // [-2.756e-7, -1.931e-7]
  const v89 = v82 * v88; // [-0.00001088, 1.827e-21]
  const v90 = 0.0000248015873015873 + v89; // [0.00001392, 0.00002481]
  const v91 = v82 * v90; // [-1.966e-19, 0.0009792]
  const v92 = -0.001388888888888889 + v91; // [-0.001389, -0.0004097]
  const v93 = v82 * v92; // [-0.05484, 8.404e-18]
  const v94 = 0.041666666666666664 + v93; // [-0.01317, 0.04167]
  const v95 = v82 * v94; // [-0.5198, 1.645]
  const v96 = -0.5 + v95; // [-1.02, 1.145]
  const v97 = v82 * v96; // [-40.26, 45.21]
  const v98 = 1 + v97; // [-39.26, 46.21]
  const v99 = v81 * v82; // [-248.1, 248.1]
  const v100 = v82 * 2.8114572543455206e-15; // [-1.63e-29, 1.11e-13]
  const v101 = -7.647163731819816e-13 + v100; // [-7.648e-13, -6.537e-13]
  const v102 = v82 * v101; // [-3.019e-11, 5.948e-27]
  const v103 = 1.6059043836821613e-10 + v102; // [1.304e-10, 1.606e-10]
  const v104 = v82 * v103; // [-9.842e-25, 6.34e-9]
  const v105 = -2.505210838544172e-8 + v104; // [-2.506e-8, -1.871e-8]
  const v106 = v82 * v105; // [-9.891e-7, 1.949e-22]
  const v107 = 0.0000027557319223985893 + v106; // [0.000001766, 0.000002756]
  const v108 = v82 * v107; // [-1.657e-20, 0.0001088]
  const v109 = -0.0001984126984126984 + v108; // [-0.0001985, -0.00008962]
  const v110 = v82 * v109; // [-0.007834, 1.573e-18]
  const v111 = 0.008333333333333333 + v110; // [0.0005003, 0.008334]
  const v112 = v82 * v111; // [-5.737e-17, 0.329]
  const v113 = -0.16666666666666666 + v112; // [-0.1667, 0.1624]
  const v114 = v99 * v113; // [-41.35, 41.35]
  const v115 = v81 + v114; // [-47.63, 47.63]
  const v116 = v75 < 0.5 ? v98 : v115; // [-47.63, 47.63]
  const v117 = v73 * 0.5; // [-1.001, 0.5001]
  const v118 = Math.floor(v117); // [-2, 0]
  const v119 = v118 + v118; // [-4.001, 4.441e-16]
  const v120 = v73 - v119; // [-2.001, 5.001]
  const v121 = v120 + v120; // [-4.001, 10.01]
  const v122 = 1 - v121; // [-9.001, 5.001]
  const v123 = -v122; // [-5.001, 9.001]
  const v124 = v75 < 0.5 ? v122 : v123; // [-9.001, 9.001]
  const cosomega = v116 * v124; // [-1.001, 1.001]
  const cosomega32 = fround(cosomega); // [-1.001, 1.001], 2.8 %
  const v125 = v75 < 0.5 ? v115 : v98; // [-47.63, 47.63]
  const sinomega = v125 * v122; // [-1.001, 1.001]
  const sinomega32 = fround(sinomega); // [-1.001, 1.001]
  const Crc32 = fround(Crc); // [-1025, 1024]
  const Cus32 = fround(Cus); // [-0.00006104, 0.00006104]
  const Cuc32 = fround(Cuc); // [-0.00006104, 0.00006104]
  const v126 = 0.000072921151467 * toe; // [-3.553e-15, 44.11]
  const v127 = Omega0 - v126; // [-47.25, 3.142]
  const v128 = v127 * 0.6366197723675814; // [-30.08, 2.001]
  const v129 = v128 + 0.5; // [-29.58, 2.501]
  const v130 = Math.floor(v129); // [-30, 2]
  const v131 = v130 * 0.5; // [-15.01, 1.001]
  const v132 = Math.floor(v131); // [-16, 1]
  const v133 = v132 + v132; // [-32.01, 2.001]
  const v134 = v130 - v133; // [-32.01, 34.01]
  const v135 = v130 * 1.5707963267948912; // [-47.13, 3.142]
  const v136 = v127 - v135; // [-50.39, 50.27]
  const v137 = v130 * 5.390302858158081e-15; // [-1.618e-13, 1.079e-14]
  const v138 = v136 - v137; // [-50.39, 50.27]
  const v139 = v130 * 3.795010772721225e-29; // [-1.139e-27, 7.591e-29]
  const v140 = v138 - v139; // [-50.39, 50.27]
  const v141 = v140 * v140; // [-2.274e-13, 2539]
  const v142 = v141 * 4.779477332387385e-14; // [-2.38e-26, 1.214e-10]
  const v143 = -1.1470745597729725e-11 + v142; // [-1.148e-11, 1.099e-10]
  const v144 = v141 * v143; // [-2.912e-8, 2.789e-7]
  const v145 = 2.08767569878681e-9 + v144; // [-2.704e-8, 2.81e-7]
  const v146 = v141 * v145; // [-0.00006863, 0.0007134]
  const v147 = -2.755731922398589e-7 + v146; // [-0.00006891, 0.0007131]
  const v148 = v141 * v147; // [-0.175, 1.811]
  const v149 = 0.0000248015873015873 + v148; // [-0.1749, 1.811]
  const v150 = v141 * v149; // [-444, 4596]
  const v151 = -0.001388888888888889 + v150; // [-444, 4596]
  const v152 = v141 * v151; // [-1128000, 11670000]
  const v153 = 0.041666666666666664 + v152; // [-1128000, 11670000]
  const v154 = v141 * v153; // [-2862000000, 29620000000]
  const v155 = -0.5 + v154; // [-2862000000, 29620000000]
  const v156 = v141 * v155; // [-7264000000000, 75190000000000]
  const v157 = 1 + v156; // [-7264000000000, 75190000000000]
  const v158 = v140 * v141; // [-128000, 127700]
  const v159 = v141 * 2.8114572543455206e-15; // [-1.044e-27, 7.138e-12]
  const v160 = -7.647163731819816e-13 + v159; // [-7.648e-13, 6.373e-12]
  const v161 = v141 * v160; // [-1.942e-9, 1.618e-8]
  const v162 = 1.6059043836821613e-10 + v161; // [-1.781e-9, 1.634e-8]
  const v163 = v141 * v162; // [-0.000004521, 0.00004148]
  const v164 = -2.505210838544172e-8 + v163; // [-0.000004546, 0.00004146]
  const v165 = v141 * v164; // [-0.01154, 0.1053]
  const v166 = 0.0000027557319223985893 + v165; // [-0.01154, 0.1053]
  const v167 = v141 * v166; // [-29.29, 267.2]
  const v168 = -0.0001984126984126984 + v167; // [-29.29, 267.2]
  const v169 = v141 * v168; // [-74360, 678200]
  const v170 = 0.008333333333333333 + v169; // [-74360, 678200]
  const v171 = v141 * v170; // [-188800000, 1722000000]
  const v172 = -0.16666666666666666 + v171; // [-188800000, 1722000000]
  const v173 = v158 * v172; // [-220300000000000, 219700000000000]
  const v174 = v140 + v173; // [-220300000000000, 219700000000000]
  const v175 = v134 < 0.5 ? v157 : v174; // [-220300000000000, 219700000000000]
  const v176 = v132 * 0.5; // [-8.001, 0.5001]
  const v177 = Math.floor(v176); // [-9, 0]
  const v178 = v177 + v177; // [-18.01, 1.777e-15]
  const v179 = v132 - v178; // [-16.01, 19.01]
  const v180 = v179 + v179; // [-32.01, 38.01]
  const v181 = 1 - v180; // [-37.01, 33.01]
  const v182 = -v181; // [-33.01, 37.01]
  const v183 = v134 < 0.5 ? v181 : v182; // [-37.01, 37.01]
  const v184 = v175 * v183; // [-1.001, 1.001]
  const v185 = fround(v184); // [-1.001, 1.001], 2.1 %
  const v186 = OmegaDot - 0.000072921151467; // [-0.00007294, -0.00007292]
  const v187 = fround(v186); // [-0.00007294, -0.00007292], 0.2 %
  const v188 = v134 < 0.5 ? v174 : v157; // [-220300000000000, 219700000000000]
  const v189 = v188 * v181; // [-1.001, 1.001]
  const v190 = fround(v189); // [-1.001, 1.001]
  const v191 = i0 * i0; // [0.8099, 1.041]
  const v192 = v191 * -1.5619206968586225e-16; // [-1.626e-16, -1.265e-16]
  const v193 = 4.779477332387385e-14 + v192; // [4.763e-14, 4.767e-14]
  const v194 = v191 * v193; // [3.858e-14, 4.96e-14]
  const v195 = -1.1470745597729725e-11 + v194; // [-1.144e-11, -1.142e-11]
  const v196 = v191 * v195; // [-1.19e-11, -9.251e-12]
  const v197 = 2.08767569878681e-9 + v196; // [2.075e-9, 2.079e-9]
  const v198 = v191 * v197; // [1.681e-9, 2.163e-9]
  const v199 = -2.755731922398589e-7 + v198; // [-2.739e-7, -2.734e-7]
  const v200 = v191 * v199; // [-2.85e-7, -2.214e-7]
  const v201 = 0.0000248015873015873 + v200; // [0.00002451, 0.00002459]
  const v202 = v191 * v201; // [0.00001985, 0.00002558]
  const v203 = -0.001388888888888889 + v202; // [-0.00137, -0.001363]
  const v204 = v191 * v203; // [-0.001425, -0.001104]
  const v205 = 0.041666666666666664 + v204; // [0.04024, 0.04057]
  const v206 = v191 * v205; // [0.03259, 0.04221]
  const v207 = -0.5 + v206; // [-0.4675, -0.4577]
  const v208 = v191 * v207; // [-0.4863, -0.3708]
  const v209 = 1 + v208; // [0.5233, 0.6217]
  const v210 = fround(v209); // [0.5233, 0.6217], 1.2 %
  const IDOT32 = fround(IDOT); // [-2.926e-9, 2.926e-9]
  const Cis32 = fround(Cis); // [-0.00006104, 0.00006104]
  const Cic32 = fround(Cic); // [-0.00006104, 0.00006104]
  const v211 = i0 * v191; // [0.7289, 1.062]
  const v212 = v191 * -8.22063524662433e-18; // [-8.553e-18, -6.658e-18]
  const v213 = 2.8114572543455206e-15 + v212; // [2.802e-15, 2.805e-15]
  const v214 = v191 * v213; // [2.27e-15, 2.919e-15]
  const v215 = -7.647163731819816e-13 + v214; // [-7.625e-13, -7.617e-13]
  const v216 = v191 * v215; // [-7.933e-13, -6.17e-13]
  const v217 = 1.6059043836821613e-10 + v216; // [1.597e-10, 1.6e-10]
  const v218 = v191 * v217; // [1.294e-10, 1.665e-10]
  const v219 = -2.505210838544172e-8 + v218; // [-2.493e-8, -2.488e-8]
  const v220 = v191 * v219; // [-2.593e-8, -2.015e-8]
  const v221 = 0.0000027557319223985893 + v220; // [0.000002729, 0.000002736]
  const v222 = v191 * v221; // [0.000002211, 0.000002847]
  const v223 = -0.0001984126984126984 + v222; // [-0.0001963, -0.0001955]
  const v224 = v191 * v223; // [-0.0002042, -0.0001584]
  const v225 = 0.008333333333333333 + v224; // [0.008129, 0.008175]
  const v226 = v191 * v225; // [0.006584, 0.008506]
  const v227 = -0.16666666666666666 + v226; // [-0.1601, -0.1581]
  const v228 = v211 * v227; // [-0.1699, -0.1152]
  const v229 = i0 + v228; // [0.7833, 0.8522]
  const v230 = fround(v229); // [0.7833, 0.8522]
  state[0] = n32;
  state[1] = v58;
  state[2] = v64;
  state[3] = e32;
  state[4] = A32;
  state[5] = v68;
  state[6] = cosomega32;
  state[7] = sinomega32;
  state[8] = Crs32;
  state[9] = Crc32;
  state[10] = Cus32;
  state[11] = Cuc32;
  state[12] = v187;
  state[13] = v185;
  state[14] = v190;
  state[15] = IDOT32;
  state[16] = Cis32;
  state[17] = Cic32;
  state[18] = v210;
  state[19] = v230;
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
  const n32 = state[0];
  const v58 = state[1];
  const v64 = state[2];
  const e32 = state[3];
  const A32 = state[4];
  const v68 = state[5];
  const cosomega32 = state[6];
  const sinomega32 = state[7];
  const Crs32 = state[8];
  const Crc32 = state[9];
  const Cus32 = state[10];
  const Cuc32 = state[11];
  const v187 = state[12];
  const v185 = state[13];
  const v190 = state[14];
  const IDOT32 = state[15];
  const Cis32 = state[16];
  const Cic32 = state[17];
  const v210 = state[18];
  const v230 = state[19];
  if (!(n32 > 0)) return 1;
  const v231 = fround(n32 * t32); // [-1.053, 1.053], 1.4 %
  const v232 = fround(v231 * v231); // [-5.961e-8, 1.108]
  const v233 = fround(v232 * -2.755731998149713e-7); // [-3.053e-7, 3.064e-14]
  const v234 = fround(0.000024801587642286904 + v233); // [0.00002449, 0.00002481]
  const v235 = fround(v232 * v234); // [-2.388e-12, 0.00002748]
  const v236 = fround(-0.0013888889225199819 + v235); // [-0.001389, -0.001361]
  const v237 = fround(v232 * v236); // [-0.001539, 1.41e-10]
  const v238 = fround(0.0416666679084301 + v237); // [0.04012, 0.04167]
  const v239 = fround(v232 * v238); // [-4.347e-9, 0.04616]
  const v240 = fround(-0.5 + v239); // [-0.5001, -0.4538]
  const v241 = fround(v232 * v240); // [-0.5539, 5.961e-8]
  const v242 = fround(1 + v241); // [0.4954, 1.001], 8.8 %
  const v243 = fround(v58 * v242); // [-1.001, 1.001]
  const v244 = fround(v231 * v232); // [-1.166, 1.166]
  const v245 = fround(v232 * -2.5052107943679403e-8); // [-2.776e-8, 2.382e-15]
  const v246 = fround(0.0000027557318844628753 + v245); // [0.000002727, 0.000002756]
  const v247 = fround(v232 * v246); // [-2.78e-13, 0.000003053]
  const v248 = fround(-0.00019841270113829523 + v247); // [-0.0001985, -0.0001953]
  const v249 = fround(v232 * v248); // [-0.0002198, 1.911e-11]
  const v250 = fround(0.008333333767950535 + v249); // [0.008113, 0.008334]
  const v251 = fround(v232 * v250); // [-9.624e-10, 0.009231]
  const v252 = fround(-0.1666666716337204 + v251); // [-0.1667, -0.1574]
  const v253 = fround(v244 * v252); // [-0.1944, 0.1944]
  const v254 = fround(v231 + v253); // [-0.8687, 0.8687]
  const v255 = fround(v64 * v254); // [-0.8687, 0.8687]
  const cosM = fround(v243 - v255); // [-1.001, 1.001], 9.1 %
  const v256 = fround(v64 * v242); // [-1.001, 1.001]
  const v257 = fround(v58 * v254); // [-0.8687, 0.8687]
  const sinM = fround(v256 + v257); // [-1.001, 1.001]
  const v258 = fround(e32 * sinM); // [-0.03001, 0.03001]
  const v259 = fround(e32 * cosM); // [-0.03001, 0.03001]
  const v260 = fround(v258 * v259); // [-0.0009001, 0.0009001]
  const v261 = fround(v258 + v260); // [-0.03091, 0.03091]
  const v262 = fround(v261 * v261); // [-2.911e-11, 0.0009549]
  const v263 = fround(v262 * 0.0416666679084301); // [-3.032e-12, 0.00003979]
  const v264 = fround(-0.5 + v263); // [-0.5001, -0.4999]
  const v265 = fround(v262 * v264); // [-0.0004775, 2.911e-11]
  const v266 = fround(1 + v265); // [0.9995, 1.001]
  const v267 = fround(v258 * v266); // [-0.03001, 0.03001]
  const v268 = fround(v261 * v262); // [-0.00002951, 0.00002951]
  const v269 = fround(v268 * -0.1666666716337204); // [-0.000004918, 0.000004918]
  const v270 = fround(v261 + v269); // [-0.03091, 0.03091]
  const v271 = fround(v259 * v270); // [-0.0009272, 0.0009272]
  const v272 = fround(v267 + v271); // [-0.03093, 0.03093]
  const v273 = fround(v261 - v272); // [-0.06183, 0.06183]
  const v274 = fround(v259 * v266); // [-0.03001, 0.03001]
  const v275 = fround(v258 * v270); // [-0.0009272, 0.0009272]
  const v276 = fround(v274 - v275); // [-0.03093, 0.03093]
  const v277 = fround(1 - v276); // [0.969, 1.031]
  const v278 = fround(v273 / v277); // [-0.06381, 0.06381]
  const v279 = fround(v261 - v278); // [-0.03001, 0.03001]
  const v280 = fround(v279 * v279); // [-2.911e-11, 0.0009001]
  const v281 = fround(v280 * 0.0416666679084301); // [-3.032e-12, 0.00003751]
  const v282 = fround(-0.5 + v281); // [-0.5001, -0.4999]
  const v283 = fround(v280 * v282); // [-0.0004501, 2.911e-11]
  const v284 = fround(1 + v283); // [0.9995, 1.001], 1.9 %
  const v285 = fround(cosM * v284); // [-1.001, 1.001]
  const v286 = fround(v279 * v280); // [-0.00002701, 0.00002701]
  const v287 = fround(v286 * -0.1666666716337204); // [-0.000004501, 0.000004501]
  const v288 = fround(v279 + v287); // [-0.03, 0.03]
  const v289 = fround(sinM * v288); // [-0.03, 0.03]
  const cosE = fround(v285 - v289); // [-1.001, 1.001], 7.7 %
  const v290 = fround(e32 * cosE); // [-0.03001, 0.03001]
  const v291 = fround(1 - v290); // [0.9699, 1.031]
  const v292 = fround(A32 * v291); // [25720000, 27430000], 2.4 %
  const v293 = fround(sinM * v284); // [-1.001, 1.001]
  const v294 = fround(cosM * v288); // [-0.03, 0.03]
  const sinE = fround(v293 + v294); // [-1.001, 1.001]
  const v295 = fround(v68 * sinE); // [-1.001, 1.001]
  const v296 = fround(1 / v291); // [0.9708, 1.031], 3.8 %
  const sinnu = fround(v295 * v296); // [-1.031, 1.031]
  const v297 = fround(sinnu * cosomega32); // [-1.031, 1.031]
  const v298 = fround(cosE - e32); // [-1.031, 1.001], 3.8 %
  const cosnu = fround(v298 * v296); // [-1.001, 1.001], 3.8 %
  const v299 = fround(cosnu * sinomega32); // [-1.001, 1.001]
  const sinphi = fround(v297 + v299); // [-1.001, 1.001]
  const v300 = fround(sinphi + sinphi); // [-2.001, 2.001]
  const v301 = fround(cosnu * cosomega32); // [-1.001, 1.001]
  const v302 = fround(sinnu * sinomega32); // [-1.031, 1.031]
  const cosphi = fround(v301 - v302); // [-1.001, 1.001], 5.8 %
  const sin2phi = fround(v300 * cosphi); // [-2.001, 2.001]
  const v303 = fround(Crs32 * sin2phi); // [-2049, 2049]
  const v304 = fround(v300 * sinphi); // [-2.001, 2.001]
  const cos2phi = fround(1 - v304); // [-1.001, 3.001]
  const v305 = fround(Crc32 * cos2phi); // [-3073, 3072]
  const v306 = fround(v303 + v305); // [-5121, 5120]
  const r = fround(v292 + v306); // [25720000, 27430000], 2.4 %
  const v307 = fround(Cus32 * sin2phi); // [-0.0001221, 0.0001221]
  const v308 = fround(Cuc32 * cos2phi); // [-0.0001832, 0.0001832]
  const v309 = fround(v307 + v308); // [-0.0003052, 0.0003052]
  const v310 = fround(v309 * v309); // [-3.553e-15, 9.314e-8]
  const v311 = fround(v310 * -0.5); // [-4.657e-8, 3.553e-15]
  const v312 = fround(1 + v311); // [0.9999, 1.001], 0.3 %
  const v313 = fround(cosphi * v312); // [-1.001, 1.001]
  const v314 = fround(v309 * v310); // [-2.843e-11, 2.843e-11]
  const v315 = fround(v314 * -0.1666666716337204); // [-4.737e-12, 4.737e-12]
  const v316 = fround(v309 + v315); // [-0.0003052, 0.0003052]
  const v317 = fround(sinphi * v316); // [-0.0003052, 0.0003052]
  const cosu = fround(v313 - v317); // [-1.001, 1.001], 5.7 %
  const xOrbit = fround(r * cosu); // [-27430000, 27430000], 1.6 %
  const v318 = fround(v187 * t32); // [-0.5252, 0.5252], 0.6 %
  const v319 = fround(v318 * v318); // [-1.491e-8, 0.2758]
  const v320 = fround(v319 * 0.000024801587642286904); // [-5.97e-13, 0.000006839]
  const v321 = fround(-0.0013888889225199819 + v320); // [-0.001389, -0.001382]
  const v322 = fround(v319 * v321); // [-0.000383, 3.525e-11]
  const v323 = fround(0.0416666679084301 + v322); // [0.04128, 0.04167]
  const v324 = fround(v319 * v323); // [-1.087e-9, 0.01149]
  const v325 = fround(-0.5 + v324); // [-0.5001, -0.4885]
  const v326 = fround(v319 * v325); // [-0.1379, 1.491e-8]
  const v327 = fround(1 + v326); // [0.8652, 1.001], 3.0 %
  const v328 = fround(v185 * v327); // [-1.001, 1.001]
  const v329 = fround(v318 * v319); // [-0.1448, 0.1448]
  const v330 = fround(v319 * 0.0000027557318844628753); // [-6.949e-14, 7.599e-7]
  const v331 = fround(-0.00019841270113829523 + v330); // [-0.0001985, -0.0001976]
  const v332 = fround(v319 * v331); // [-0.00005471, 4.776e-12]
  const v333 = fround(0.008333333767950535 + v332); // [0.008278, 0.008334]
  const v334 = fround(v319 * v333); // [-2.406e-10, 0.002298]
  const v335 = fround(-0.1666666716337204 + v334); // [-0.1667, -0.1643]
  const v336 = fround(v329 * v335); // [-0.02414, 0.02414]
  const v337 = fround(v318 + v336); // [-0.5014, 0.5014]
  const v338 = fround(v190 * v337); // [-0.5014, 0.5014]
  const cosOmega = fround(v328 - v338); // [-1.001, 1.001], 6.7 %
  const v339 = fround(xOrbit * cosOmega); // [-27430000, 27430000]
  const v340 = fround(sinphi * v312); // [-1.001, 1.001]
  const v341 = fround(cosphi * v316); // [-0.0003052, 0.0003052]
  const sinu = fround(v340 + v341); // [-1.001, 1.001]
  const yOrbit = fround(r * sinu); // [-27430000, 27430000], 1.0 %
  const v342 = fround(IDOT32 * t32); // [-0.00002107, 0.00002107]
  const v343 = fround(Cis32 * sin2phi); // [-0.0001221, 0.0001221]
  const v344 = fround(v342 + v343); // [-0.0001432, 0.0001432]
  const v345 = fround(Cic32 * cos2phi); // [-0.0001832, 0.0001832]
  const v346 = fround(v344 + v345); // [-0.0003263, 0.0003263]
  const v347 = fround(v346 * v346); // [-3.553e-15, 1.065e-7]
  const v348 = fround(v347 * -0.5); // [-5.322e-8, 3.553e-15]
  const v349 = fround(1 + v348); // [0.9999, 1.001], 0.2 %
  const v350 = fround(v210 * v349); // [0.5233, 0.6217]
  const v351 = fround(v346 * v347); // [-3.473e-11, 3.473e-11]
  const v352 = fround(v351 * -0.1666666716337204); // [-5.788e-12, 5.788e-12]
  const v353 = fround(v346 + v352); // [-0.0003263, 0.0003263]
  const v354 = fround(v230 * v353); // [-0.000278, 0.000278]
  const cosi = fround(v350 - v354); // [0.523, 0.6219], 2.4 %
  const v355 = fround(yOrbit * cosi); // [-17060000, 17060000], 0.7 %
  const v356 = fround(v190 * v327); // [-1.001, 1.001]
  const v357 = fround(v185 * v337); // [-0.5014, 0.5014]
  const sinOmega = fround(v356 + v357); // [-1.001, 1.001]
  const v358 = fround(v355 * sinOmega); // [-17060000, 17060000]
  const v359 = fround(v339 - v358); // [-44490000, 44490000]
  const v360 = fround(xOrbit * sinOmega); // [-27430000, 27430000]
  const v361 = fround(v355 * cosOmega); // [-17060000, 17060000]
  const v362 = fround(v360 + v361); // [-44490000, 44490000]
  const v363 = fround(v230 * v349); // [0.7833, 0.8522]
  const v364 = fround(v210 * v353); // [-0.0002028, 0.0002028]
  const sini = fround(v363 + v364); // [0.7831, 0.8523]
  const v365 = fround(yOrbit * sini); // [-23380000, 23380000], 0.7 %
  out[0] = v359;
  out[1] = v362;
  out[2] = v365;
  return 0;
}
