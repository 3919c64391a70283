/**
 * Generated file, do not edit: change the budget or the model and generate again.
 *
 * GPS broadcast ephemeris (legacy navigation message), Earth-fixed position and clock.
 * Model gps-lnav: IS-GPS-200, Table 20-IV and 20.3.3.3.3; formula sha256 5f836c5a9091cf697931b1ab8c6fb4ce7d2fbf92e8c01aaf6eb3273e2c4ce794.
 * Domain flown. Choices: arithmetic f32, Kepler starter secondOrder, corrector newton, cap 1.
 * Error position_m: 201 observed, not yet certified.
 *
 * Not certified for safety of life. The interface documents, local rules and licensed practice decide.
 */
const fround = Math.fround;

/** Words of the state array. */
export const stateWords = 21;

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
  const v94 = fround(v51 * cosomega);
  const v95 = v58 < 0.5 ? v84 : v75;
  const sinomega = fround(v95 * v91);
  const v96 = fround(v51 * sinomega);
  const v97 = fround(0.00007292115333257243 * toe32);
  const v98 = fround(Omega032 - v97);
  const v99 = fround(v98 * 0.6366197466850281);
  const v100 = fround(v99 + 0.5);
  const v101 = Math.floor(v100);
  const v102 = fround(v101 * 0.5);
  const v103 = Math.floor(v102);
  const v104 = fround(v103 + v103);
  const v105 = fround(v101 - v104);
  const v106 = fround(v101 * 1.5707931518554688);
  const v107 = fround(v98 - v106);
  const v108 = fround(v101 * 0.0000031749368645250797);
  const v109 = fround(v107 - v108);
  const v110 = fround(v101 * 2.5633440682570896e-12);
  const v111 = fround(v109 - v110);
  const v112 = fround(v111 * v111);
  const v113 = fround(v112 * -2.755731998149713e-7);
  const v114 = fround(0.000024801587642286904 + v113);
  const v115 = fround(v112 * v114);
  const v116 = fround(-0.0013888889225199819 + v115);
  const v117 = fround(v112 * v116);
  const v118 = fround(0.0416666679084301 + v117);
  const v119 = fround(v112 * v118);
  const v120 = fround(-0.5 + v119);
  const v121 = fround(v112 * v120);
  const v122 = fround(1 + v121);
  const v123 = fround(v111 * v112);
  const v124 = fround(v112 * 0.0000027557318844628753);
  const v125 = fround(-0.00019841270113829523 + v124);
  const v126 = fround(v112 * v125);
  const v127 = fround(0.008333333767950535 + v126);
  const v128 = fround(v112 * v127);
  const v129 = fround(-0.1666666716337204 + v128);
  const v130 = fround(v123 * v129);
  const v131 = fround(v111 + v130);
  const v132 = v105 < 0.5 ? v122 : v131;
  const v133 = fround(v103 * 0.5);
  const v134 = Math.floor(v133);
  const v135 = fround(v134 + v134);
  const v136 = fround(v103 - v135);
  const v137 = fround(v136 + v136);
  const v138 = fround(1 - v137);
  const v139 = -v138;
  const v140 = v105 < 0.5 ? v138 : v139;
  const v141 = fround(v132 * v140);
  const v142 = fround(OmegaDot32 - 0.00007292115333257243);
  const v143 = v105 < 0.5 ? v131 : v122;
  const v144 = fround(v143 * v138);
  const v145 = fround(i032 * i032);
  const v146 = fround(v145 * -2.755731998149713e-7);
  const v147 = fround(0.000024801587642286904 + v146);
  const v148 = fround(v145 * v147);
  const v149 = fround(-0.0013888889225199819 + v148);
  const v150 = fround(v145 * v149);
  const v151 = fround(0.0416666679084301 + v150);
  const v152 = fround(v145 * v151);
  const v153 = fround(-0.5 + v152);
  const v154 = fround(v145 * v153);
  const v155 = fround(1 + v154);
  const v156 = fround(i032 * v145);
  const v157 = fround(v145 * -2.5052107943679403e-8);
  const v158 = fround(0.0000027557318844628753 + v157);
  const v159 = fround(v145 * v158);
  const v160 = fround(-0.00019841270113829523 + v159);
  const v161 = fround(v145 * v160);
  const v162 = fround(0.008333333767950535 + v161);
  const v163 = fround(v145 * v162);
  const v164 = fround(-0.1666666716337204 + v163);
  const v165 = fround(v156 * v164);
  const v166 = fround(i032 + v165);
  state[0] = n;
  state[1] = v43;
  state[2] = v48;
  state[3] = e32;
  state[4] = A;
  state[5] = v94;
  state[6] = sinomega;
  state[7] = cosomega;
  state[8] = v96;
  state[9] = Crs32;
  state[10] = Crc32;
  state[11] = Cus32;
  state[12] = Cuc32;
  state[13] = v142;
  state[14] = v141;
  state[15] = v144;
  state[16] = IDOT32;
  state[17] = Cis32;
  state[18] = Cic32;
  state[19] = v155;
  state[20] = v166;
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
  const v94 = state[5];
  const sinomega = state[6];
  const cosomega = state[7];
  const v96 = state[8];
  const Crs32 = state[9];
  const Crc32 = state[10];
  const Cus32 = state[11];
  const Cuc32 = state[12];
  const v142 = state[13];
  const v141 = state[14];
  const v144 = state[15];
  const IDOT32 = state[16];
  const Cis32 = state[17];
  const Cic32 = state[18];
  const v155 = state[19];
  const v166 = state[20];
  if (!(n > 0)) return 1;
  const v167 = fround(n * t32);
  const v168 = fround(v167 * v167);
  const v169 = fround(v168 * -2.755731998149713e-7);
  const v170 = fround(0.000024801587642286904 + v169);
  const v171 = fround(v168 * v170);
  const v172 = fround(-0.0013888889225199819 + v171);
  const v173 = fround(v168 * v172);
  const v174 = fround(0.0416666679084301 + v173);
  const v175 = fround(v168 * v174);
  const v176 = fround(-0.5 + v175);
  const v177 = fround(v168 * v176);
  const v178 = fround(1 + v177);
  const v179 = fround(v43 * v178);
  const v180 = fround(v167 * v168);
  const v181 = fround(v168 * -2.5052107943679403e-8);
  const v182 = fround(0.0000027557318844628753 + v181);
  const v183 = fround(v168 * v182);
  const v184 = fround(-0.00019841270113829523 + v183);
  const v185 = fround(v168 * v184);
  const v186 = fround(0.008333333767950535 + v185);
  const v187 = fround(v168 * v186);
  const v188 = fround(-0.1666666716337204 + v187);
  const v189 = fround(v180 * v188);
  const v190 = fround(v167 + v189);
  const v191 = fround(v48 * v190);
  const cosM = fround(v179 - v191);
  const v192 = fround(v48 * v178);
  const v193 = fround(v43 * v190);
  const sinM = fround(v192 + v193);
  const v194 = fround(e32 * sinM);
  const v195 = fround(e32 * cosM);
  const v196 = fround(v194 * v195);
  const v197 = fround(v194 + v196);
  const v198 = fround(v197 * v197);
  const v199 = fround(v198 * 0.0416666679084301);
  const v200 = fround(-0.5 + v199);
  const v201 = fround(v198 * v200);
  const v202 = fround(1 + v201);
  const v203 = fround(v194 * v202);
  const v204 = fround(v197 * v198);
  const v205 = fround(v204 * -0.1666666716337204);
  const v206 = fround(v197 + v205);
  const v207 = fround(v195 * v206);
  const v208 = fround(v203 + v207);
  const v209 = fround(v197 - v208);
  const v210 = fround(v195 * v202);
  const v211 = fround(v194 * v206);
  const v212 = fround(v210 - v211);
  const v213 = fround(1 - v212);
  const v214 = fround(v209 / v213);
  const v215 = fround(v197 - v214);
  const v216 = fround(v215 * v215);
  const v217 = fround(v216 * 0.0416666679084301);
  const v218 = fround(-0.5 + v217);
  const v219 = fround(v216 * v218);
  const v220 = fround(1 + v219);
  const v221 = fround(cosM * v220);
  const v222 = fround(v215 * v216);
  const v223 = fround(v222 * -0.1666666716337204);
  const v224 = fround(v215 + v223);
  const v225 = fround(sinM * v224);
  const cosE = fround(v221 - v225);
  const v226 = fround(e32 * cosE);
  const v227 = fround(1 - v226);
  const v228 = fround(A * v227);
  const v229 = fround(sinM * v220);
  const v230 = fround(cosM * v224);
  const sinE = fround(v229 + v230);
  const v231 = fround(1 / v227);
  const v232 = fround(sinE * v231);
  const v233 = fround(v94 * v232);
  const v234 = fround(cosE - e32);
  const cosnu = fround(v234 * v231);
  const v235 = fround(cosnu * sinomega);
  const sinphi = fround(v233 + v235);
  const v236 = fround(sinphi + sinphi);
  const v237 = fround(cosnu * cosomega);
  const v238 = fround(v96 * v232);
  const cosphi = fround(v237 - v238);
  const sin2phi = fround(v236 * cosphi);
  const v239 = fround(Crs32 * sin2phi);
  const v240 = fround(v236 * sinphi);
  const cos2phi = fround(1 - v240);
  const v241 = fround(Crc32 * cos2phi);
  const v242 = fround(v239 + v241);
  const r = fround(v228 + v242);
  const v243 = fround(Cus32 * sin2phi);
  const v244 = fround(Cuc32 * cos2phi);
  const v245 = fround(v243 + v244);
  const v246 = fround(v245 * v245);
  const v247 = fround(v246 * -0.5);
  const v248 = fround(1 + v247);
  const v249 = fround(cosphi * v248);
  const v250 = fround(v245 * v246);
  const v251 = fround(v250 * -0.1666666716337204);
  const v252 = fround(v245 + v251);
  const v253 = fround(sinphi * v252);
  const cosu = fround(v249 - v253);
  const xOrbit = fround(r * cosu);
  const v254 = fround(v142 * t32);
  const v255 = fround(v254 * v254);
  const v256 = fround(v255 * 0.000024801587642286904);
  const v257 = fround(-0.0013888889225199819 + v256);
  const v258 = fround(v255 * v257);
  const v259 = fround(0.0416666679084301 + v258);
  const v260 = fround(v255 * v259);
  const v261 = fround(-0.5 + v260);
  const v262 = fround(v255 * v261);
  const v263 = fround(1 + v262);
  const v264 = fround(v141 * v263);
  const v265 = fround(v254 * v255);
  const v266 = fround(v255 * 0.0000027557318844628753);
  const v267 = fround(-0.00019841270113829523 + v266);
  const v268 = fround(v255 * v267);
  const v269 = fround(0.008333333767950535 + v268);
  const v270 = fround(v255 * v269);
  const v271 = fround(-0.1666666716337204 + v270);
  const v272 = fround(v265 * v271);
  const v273 = fround(v254 + v272);
  const v274 = fround(v144 * v273);
  const cosOmega = fround(v264 - v274);
  const v275 = fround(xOrbit * cosOmega);
  const v276 = fround(sinphi * v248);
  const v277 = fround(cosphi * v252);
  const sinu = fround(v276 + v277);
  const yOrbit = fround(r * sinu);
  const v278 = fround(IDOT32 * t32);
  const v279 = fround(Cis32 * sin2phi);
  const v280 = fround(v278 + v279);
  const v281 = fround(Cic32 * cos2phi);
  const v282 = fround(v280 + v281);
  const v283 = fround(v282 * v282);
  const v284 = fround(v283 * -0.5);
  const v285 = fround(1 + v284);
  const v286 = fround(v155 * v285);
  const v287 = fround(v282 * v283);
  const v288 = fround(v287 * -0.1666666716337204);
  const v289 = fround(v282 + v288);
  const v290 = fround(v166 * v289);
  const cosi = fround(v286 - v290);
  const v291 = fround(yOrbit * cosi);
  const v292 = fround(v144 * v263);
  const v293 = fround(v141 * v273);
  const sinOmega = fround(v292 + v293);
  const v294 = fround(v291 * sinOmega);
  const v295 = fround(v275 - v294);
  const v296 = fround(xOrbit * sinOmega);
  const v297 = fround(v291 * cosOmega);
  const v298 = fround(v296 + v297);
  const v299 = fround(v166 * v285);
  const v300 = fround(v155 * v289);
  const sini = fround(v299 + v300);
  const v301 = fround(yOrbit * sini);
  out[0] = v295;
  out[1] = v298;
  out[2] = v301;
  return 0;
}
