/**
 * Generated file, do not edit: change the budget or the model and generate again.
 *
 * GPS broadcast ephemeris (legacy navigation message), Earth-fixed position and clock.
 * Model gps-lnav: IS-GPS-200, Table 20-IV and 20.3.3.3.3; formula sha256 5f836c5a9091cf697931b1ab8c6fb4ce7d2fbf92e8c01aaf6eb3273e2c4ce794.
 * Domain flown. Choices: arithmetic f32, Kepler starter secondOrder, corrector newton, cap 1.
 * Error position_m: at most 248 (certified over the domain), 212 observed.
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
  const A = fround(sqrtA32 * sqrtA32);
  const v1 = fround(M032 * 0.6366197466850281);
  const v2 = fround(v1 + 0.5);
  const v3 = Math.floor(v2);
  const v4 = fround(v3 * 0.5);
  const v5 = Math.floor(v4);
  const v6 = fround(v5 + v5);
  const v7 = fround(v3 - v6);
  const v8 = fround(v3 * 1.570796012878418);
  const v9 = fround(M032 - v8);
  const v10 = fround(v3 * 3.139164164167596e-7);
  const v11 = fround(v9 - v10);
  const v12 = fround(v3 * 6.223371969669989e-14);
  const v13 = fround(v11 - v12);
  const v14 = fround(v13 * v13);
  const v15 = fround(v14 * -2.755731998149713e-7);
  const v16 = fround(0.000024801587642286904 + v15);
  const v17 = fround(v14 * v16);
  const v18 = fround(-0.0013888889225199819 + v17);
  const v19 = fround(v14 * v18);
  const v20 = fround(0.0416666679084301 + v19);
  const v21 = fround(v14 * v20);
  const v22 = fround(-0.5 + v21);
  const v23 = fround(v14 * v22);
  const v24 = fround(1 + v23);
  const v25 = fround(v13 * v14);
  const v26 = fround(v14 * 0.0000027557318844628753);
  const v27 = fround(-0.00019841270113829523 + v26);
  const v28 = fround(v14 * v27);
  const v29 = fround(0.008333333767950535 + v28);
  const v30 = fround(v14 * v29);
  const v31 = fround(-0.1666666716337204 + v30);
  const v32 = fround(v25 * v31);
  const v33 = fround(v13 + v32);
  const v34 = v7 < 0.5 ? v24 : v33;
  const v35 = fround(v5 * 0.5);
  const v36 = Math.floor(v35);
  const v37 = fround(v36 + v36);
  const v38 = fround(v5 - v37);
  const v39 = fround(v38 + v38);
  const v40 = fround(1 - v39);
  const v41 = -v40;
  const v42 = v7 < 0.5 ? v40 : v41;
  const v43 = fround(v34 * v42);
  const v44 = fround(A * A);
  const v45 = fround(v44 * A);
  const v46 = fround(398600513257472 / v45);
  const n0 = fround(Math.sqrt(v46));
  const n = fround(n0 + deltaN32);
  const v47 = v7 < 0.5 ? v33 : v24;
  const v48 = fround(v47 * v40);
  const v49 = fround(e32 * e32);
  const v50 = fround(1 - v49);
  const v51 = fround(Math.sqrt(v50));
  const v52 = fround(omega32 * 0.6366197466850281);
  const v53 = fround(v52 + 0.5);
  const v54 = Math.floor(v53);
  const v55 = fround(v54 * 0.5);
  const v56 = Math.floor(v55);
  const v57 = fround(v56 + v56);
  const v58 = fround(v54 - v57);
  const v59 = fround(v54 * 1.570796012878418);
  const v60 = fround(omega32 - v59);
  const v61 = fround(v54 * 3.139164164167596e-7);
  const v62 = fround(v60 - v61);
  const v63 = fround(v54 * 6.223371969669989e-14);
  const v64 = fround(v62 - v63);
  const v65 = fround(v64 * v64);
  const v66 = fround(v65 * -2.755731998149713e-7);
  const v67 = fround(0.000024801587642286904 + v66);
  const v68 = fround(v65 * v67);
  const v69 = fround(-0.0013888889225199819 + v68);
  const v70 = fround(v65 * v69);
  const v71 = fround(0.0416666679084301 + v70);
  const v72 = fround(v65 * v71);
  const v73 = fround(-0.5 + v72);
  const v74 = fround(v65 * v73);
  const v75 = fround(1 + v74);
  const v76 = fround(v64 * v65);
  const v77 = fround(v65 * 0.0000027557318844628753);
  const v78 = fround(-0.00019841270113829523 + v77);
  const v79 = fround(v65 * v78);
  const v80 = fround(0.008333333767950535 + v79);
  const v81 = fround(v65 * v80);
  const v82 = fround(-0.1666666716337204 + v81);
  const v83 = fround(v76 * v82);
  const v84 = fround(v64 + v83);
  const v85 = v58 < 0.5 ? v75 : v84;
  const v86 = fround(v56 * 0.5);
  const v87 = Math.floor(v86);
  const v88 = fround(v87 + v87);
  const v89 = fround(v56 - v88);
  const v90 = fround(v89 + v89);
  const v91 = fround(1 - v90);
  const v92 = -v91;
  const v93 = v58 < 0.5 ? v91 : v92;
  const cosomega = fround(v85 * v93);
  const v94 = v58 < 0.5 ? v84 : v75;
  const sinomega = fround(v94 * v91);
  const v95 = fround(0.00007292115333257243 * toe32);
  const v96 = fround(Omega032 - v95);
  const v97 = fround(v96 * 0.6366197466850281);
  const v98 = fround(v97 + 0.5);
  const v99 = Math.floor(v98);
  const v100 = fround(v99 * 0.5);
  const v101 = Math.floor(v100);
  const v102 = fround(v101 + v101);
  const v103 = fround(v99 - v102);
  const v104 = fround(v99 * 1.5707931518554688);
  const v105 = fround(v96 - v104);
  const v106 = fround(v99 * 0.0000031749368645250797);
  const v107 = fround(v105 - v106);
  const v108 = fround(v99 * 2.5633440682570896e-12);
  const v109 = fround(v107 - v108);
  const v110 = fround(v109 * v109);
  const v111 = fround(v110 * -2.755731998149713e-7);
  const v112 = fround(0.000024801587642286904 + v111);
  const v113 = fround(v110 * v112);
  const v114 = fround(-0.0013888889225199819 + v113);
  const v115 = fround(v110 * v114);
  const v116 = fround(0.0416666679084301 + v115);
  const v117 = fround(v110 * v116);
  const v118 = fround(-0.5 + v117);
  const v119 = fround(v110 * v118);
  const v120 = fround(1 + v119);
  const v121 = fround(v109 * v110);
  const v122 = fround(v110 * 0.0000027557318844628753);
  const v123 = fround(-0.00019841270113829523 + v122);
  const v124 = fround(v110 * v123);
  const v125 = fround(0.008333333767950535 + v124);
  const v126 = fround(v110 * v125);
  const v127 = fround(-0.1666666716337204 + v126);
  const v128 = fround(v121 * v127);
  const v129 = fround(v109 + v128);
  const v130 = v103 < 0.5 ? v120 : v129;
  const v131 = fround(v101 * 0.5);
  const v132 = Math.floor(v131);
  const v133 = fround(v132 + v132);
  const v134 = fround(v101 - v133);
  const v135 = fround(v134 + v134);
  const v136 = fround(1 - v135);
  const v137 = -v136;
  const v138 = v103 < 0.5 ? v136 : v137;
  const v139 = fround(v130 * v138);
  const v140 = fround(OmegaDot32 - 0.00007292115333257243);
  const v141 = v103 < 0.5 ? v129 : v120;
  const v142 = fround(v141 * v136);
  const v143 = fround(i032 * i032);
  const v144 = fround(v143 * -2.755731998149713e-7);
  const v145 = fround(0.000024801587642286904 + v144);
  const v146 = fround(v143 * v145);
  const v147 = fround(-0.0013888889225199819 + v146);
  const v148 = fround(v143 * v147);
  const v149 = fround(0.0416666679084301 + v148);
  const v150 = fround(v143 * v149);
  const v151 = fround(-0.5 + v150);
  const v152 = fround(v143 * v151);
  const v153 = fround(1 + v152);
  const v154 = fround(i032 * v143);
  const v155 = fround(v143 * -2.5052107943679403e-8);
  const v156 = fround(0.0000027557318844628753 + v155);
  const v157 = fround(v143 * v156);
  const v158 = fround(-0.00019841270113829523 + v157);
  const v159 = fround(v143 * v158);
  const v160 = fround(0.008333333767950535 + v159);
  const v161 = fround(v143 * v160);
  const v162 = fround(-0.1666666716337204 + v161);
  const v163 = fround(v154 * v162);
  const v164 = fround(i032 + v163);
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
  const v165 = fround(n * t32);
  const v166 = fround(v165 * v165);
  const v167 = fround(v166 * -2.755731998149713e-7);
  const v168 = fround(0.000024801587642286904 + v167);
  const v169 = fround(v166 * v168);
  const v170 = fround(-0.0013888889225199819 + v169);
  const v171 = fround(v166 * v170);
  const v172 = fround(0.0416666679084301 + v171);
  const v173 = fround(v166 * v172);
  const v174 = fround(-0.5 + v173);
  const v175 = fround(v166 * v174);
  const v176 = fround(1 + v175);
  const v177 = fround(v43 * v176);
  const v178 = fround(v165 * v166);
  const v179 = fround(v166 * -2.5052107943679403e-8);
  const v180 = fround(0.0000027557318844628753 + v179);
  const v181 = fround(v166 * v180);
  const v182 = fround(-0.00019841270113829523 + v181);
  const v183 = fround(v166 * v182);
  const v184 = fround(0.008333333767950535 + v183);
  const v185 = fround(v166 * v184);
  const v186 = fround(-0.1666666716337204 + v185);
  const v187 = fround(v178 * v186);
  const v188 = fround(v165 + v187);
  const v189 = fround(v48 * v188);
  const cosM = fround(v177 - v189);
  const v190 = fround(v48 * v176);
  const v191 = fround(v43 * v188);
  const sinM = fround(v190 + v191);
  const v192 = fround(e32 * sinM);
  const v193 = fround(e32 * cosM);
  const v194 = fround(v192 * v193);
  const v195 = fround(v192 + v194);
  const v196 = fround(v195 * v195);
  const v197 = fround(v196 * 0.0416666679084301);
  const v198 = fround(-0.5 + v197);
  const v199 = fround(v196 * v198);
  const v200 = fround(1 + v199);
  const v201 = fround(v192 * v200);
  const v202 = fround(v195 * v196);
  const v203 = fround(v202 * -0.1666666716337204);
  const v204 = fround(v195 + v203);
  const v205 = fround(v193 * v204);
  const v206 = fround(v201 + v205);
  const v207 = fround(v195 - v206);
  const v208 = fround(v193 * v200);
  const v209 = fround(v192 * v204);
  const v210 = fround(v208 - v209);
  const v211 = fround(1 - v210);
  const v212 = fround(v207 / v211);
  const v213 = fround(v195 - v212);
  const v214 = fround(v213 * v213);
  const v215 = fround(v214 * 0.0416666679084301);
  const v216 = fround(-0.5 + v215);
  const v217 = fround(v214 * v216);
  const v218 = fround(1 + v217);
  const v219 = fround(cosM * v218);
  const v220 = fround(v213 * v214);
  const v221 = fround(v220 * -0.1666666716337204);
  const v222 = fround(v213 + v221);
  const v223 = fround(sinM * v222);
  const cosE = fround(v219 - v223);
  const v224 = fround(e32 * cosE);
  const v225 = fround(1 - v224);
  const v226 = fround(A * v225);
  const v227 = fround(sinM * v218);
  const v228 = fround(cosM * v222);
  const sinE = fround(v227 + v228);
  const v229 = fround(v51 * sinE);
  const v230 = fround(1 / v225);
  const sinnu = fround(v229 * v230);
  const v231 = fround(sinnu * cosomega);
  const v232 = fround(cosE - e32);
  const cosnu = fround(v232 * v230);
  const v233 = fround(cosnu * sinomega);
  const sinphi = fround(v231 + v233);
  const v234 = fround(sinphi + sinphi);
  const v235 = fround(cosnu * cosomega);
  const v236 = fround(sinnu * sinomega);
  const cosphi = fround(v235 - v236);
  const sin2phi = fround(v234 * cosphi);
  const v237 = fround(Crs32 * sin2phi);
  const v238 = fround(v234 * sinphi);
  const cos2phi = fround(1 - v238);
  const v239 = fround(Crc32 * cos2phi);
  const v240 = fround(v237 + v239);
  const r = fround(v226 + v240);
  const v241 = fround(Cus32 * sin2phi);
  const v242 = fround(Cuc32 * cos2phi);
  const v243 = fround(v241 + v242);
  const v244 = fround(v243 * v243);
  const v245 = fround(v244 * -0.5);
  const v246 = fround(1 + v245);
  const v247 = fround(cosphi * v246);
  const v248 = fround(v243 * v244);
  const v249 = fround(v248 * -0.1666666716337204);
  const v250 = fround(v243 + v249);
  const v251 = fround(sinphi * v250);
  const cosu = fround(v247 - v251);
  const xOrbit = fround(r * cosu);
  const v252 = fround(v140 * t32);
  const v253 = fround(v252 * v252);
  const v254 = fround(v253 * 0.000024801587642286904);
  const v255 = fround(-0.0013888889225199819 + v254);
  const v256 = fround(v253 * v255);
  const v257 = fround(0.0416666679084301 + v256);
  const v258 = fround(v253 * v257);
  const v259 = fround(-0.5 + v258);
  const v260 = fround(v253 * v259);
  const v261 = fround(1 + v260);
  const v262 = fround(v139 * v261);
  const v263 = fround(v252 * v253);
  const v264 = fround(v253 * 0.0000027557318844628753);
  const v265 = fround(-0.00019841270113829523 + v264);
  const v266 = fround(v253 * v265);
  const v267 = fround(0.008333333767950535 + v266);
  const v268 = fround(v253 * v267);
  const v269 = fround(-0.1666666716337204 + v268);
  const v270 = fround(v263 * v269);
  const v271 = fround(v252 + v270);
  const v272 = fround(v142 * v271);
  const cosOmega = fround(v262 - v272);
  const v273 = fround(xOrbit * cosOmega);
  const v274 = fround(sinphi * v246);
  const v275 = fround(cosphi * v250);
  const sinu = fround(v274 + v275);
  const yOrbit = fround(r * sinu);
  const v276 = fround(IDOT32 * t32);
  const v277 = fround(Cis32 * sin2phi);
  const v278 = fround(v276 + v277);
  const v279 = fround(Cic32 * cos2phi);
  const v280 = fround(v278 + v279);
  const v281 = fround(v280 * v280);
  const v282 = fround(v281 * -0.5);
  const v283 = fround(1 + v282);
  const v284 = fround(v153 * v283);
  const v285 = fround(v280 * v281);
  const v286 = fround(v285 * -0.1666666716337204);
  const v287 = fround(v280 + v286);
  const v288 = fround(v164 * v287);
  const cosi = fround(v284 - v288);
  const v289 = fround(yOrbit * cosi);
  const v290 = fround(v142 * v261);
  const v291 = fround(v139 * v271);
  const sinOmega = fround(v290 + v291);
  const v292 = fround(v289 * sinOmega);
  const v293 = fround(v273 - v292);
  const v294 = fround(xOrbit * sinOmega);
  const v295 = fround(v289 * cosOmega);
  const v296 = fround(v294 + v295);
  const v297 = fround(v164 * v283);
  const v298 = fround(v153 * v287);
  const sini = fround(v297 + v298);
  const v299 = fround(yOrbit * sini);
  out[0] = v293;
  out[1] = v296;
  out[2] = v299;
  return 0;
}
