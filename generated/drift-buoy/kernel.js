/**
 * Generated file, do not edit: change the budget or the model and generate again.
 *
 * GPS broadcast ephemeris (legacy navigation message), Earth-fixed position and clock.
 * Model gps-lnav: IS-GPS-200, Table 20-IV and 20.3.3.3.3; formula sha256 5f836c5a9091cf697931b1ab8c6fb4ce7d2fbf92e8c01aaf6eb3273e2c4ce794.
 * Domain flown. Choices: arithmetic f64-setup-f32-tick, Kepler starter secondOrder, corrector newton, cap 1.
 * Error position_m: at most 42.0 (certified over the domain), 16.8 observed.
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
  const A = sqrtA * sqrtA;
  const A32 = fround(A);
  const e32 = fround(e);
  const v1 = M0 * 0.6366197723675814;
  const v2 = v1 + 0.5;
  const v3 = Math.floor(v2);
  const v4 = v3 * 0.5;
  const v5 = Math.floor(v4);
  const v6 = v5 + v5;
  const v7 = v3 - v6;
  const v8 = v3 * 1.5707963267948966;
  const v9 = M0 - v8;
  const v10 = v3 * 6.123233995736757e-17;
  const v11 = v9 - v10;
  const v12 = v3 * 8.4784276603689e-32;
  const v13 = v11 - v12;
  const v14 = v13 * v13;
  const v15 = v14 * 4.779477332387385e-14;
  const v16 = -1.1470745597729725e-11 + v15;
  const v17 = v14 * v16;
  const v18 = 2.08767569878681e-9 + v17;
  const v19 = v14 * v18;
  const v20 = -2.755731922398589e-7 + v19;
  const v21 = v14 * v20;
  const v22 = 0.0000248015873015873 + v21;
  const v23 = v14 * v22;
  const v24 = -0.001388888888888889 + v23;
  const v25 = v14 * v24;
  const v26 = 0.041666666666666664 + v25;
  const v27 = v14 * v26;
  const v28 = -0.5 + v27;
  const v29 = v14 * v28;
  const v30 = 1 + v29;
  const v31 = v13 * v14;
  const v32 = v14 * 2.8114572543455206e-15;
  const v33 = -7.647163731819816e-13 + v32;
  const v34 = v14 * v33;
  const v35 = 1.6059043836821613e-10 + v34;
  const v36 = v14 * v35;
  const v37 = -2.505210838544172e-8 + v36;
  const v38 = v14 * v37;
  const v39 = 0.0000027557319223985893 + v38;
  const v40 = v14 * v39;
  const v41 = -0.0001984126984126984 + v40;
  const v42 = v14 * v41;
  const v43 = 0.008333333333333333 + v42;
  const v44 = v14 * v43;
  const v45 = -0.16666666666666666 + v44;
  const v46 = v31 * v45;
  const v47 = v13 + v46;
  const v48 = v7 < 0.5 ? v30 : v47;
  const v49 = v5 * 0.5;
  const v50 = Math.floor(v49);
  const v51 = v50 + v50;
  const v52 = v5 - v51;
  const v53 = v52 + v52;
  const v54 = 1 - v53;
  const v55 = -v54;
  const v56 = v7 < 0.5 ? v54 : v55;
  const v57 = v48 * v56;
  const v58 = fround(v57);
  const v59 = A * A;
  const v60 = v59 * A;
  const v61 = 398600500000000 / v60;
  const n0 = Math.sqrt(v61);
  const n = n0 + deltaN;
  const n32 = fround(n);
  const v62 = v7 < 0.5 ? v47 : v30;
  const v63 = v62 * v54;
  const v64 = fround(v63);
  const Crs32 = fround(Crs);
  const v65 = e * e;
  const v66 = 1 - v65;
  const v67 = Math.sqrt(v66);
  const v68 = fround(v67);
  const v69 = omega * 0.6366197723675814;
  const v70 = v69 + 0.5;
  const v71 = Math.floor(v70);
  const v72 = v71 * 0.5;
  const v73 = Math.floor(v72);
  const v74 = v73 + v73;
  const v75 = v71 - v74;
  const v76 = v71 * 1.5707963267948966;
  const v77 = omega - v76;
  const v78 = v71 * 6.123233995736757e-17;
  const v79 = v77 - v78;
  const v80 = v71 * 8.4784276603689e-32;
  const v81 = v79 - v80;
  const v82 = v81 * v81;
  const v83 = v82 * 4.779477332387385e-14;
  const v84 = -1.1470745597729725e-11 + v83;
  const v85 = v82 * v84;
  const v86 = 2.08767569878681e-9 + v85;
  const v87 = v82 * v86;
  const v88 = -2.755731922398589e-7 + v87;
  const v89 = v82 * v88;
  const v90 = 0.0000248015873015873 + v89;
  const v91 = v82 * v90;
  const v92 = -0.001388888888888889 + v91;
  const v93 = v82 * v92;
  const v94 = 0.041666666666666664 + v93;
  const v95 = v82 * v94;
  const v96 = -0.5 + v95;
  const v97 = v82 * v96;
  const v98 = 1 + v97;
  const v99 = v81 * v82;
  const v100 = v82 * 2.8114572543455206e-15;
  const v101 = -7.647163731819816e-13 + v100;
  const v102 = v82 * v101;
  const v103 = 1.6059043836821613e-10 + v102;
  const v104 = v82 * v103;
  const v105 = -2.505210838544172e-8 + v104;
  const v106 = v82 * v105;
  const v107 = 0.0000027557319223985893 + v106;
  const v108 = v82 * v107;
  const v109 = -0.0001984126984126984 + v108;
  const v110 = v82 * v109;
  const v111 = 0.008333333333333333 + v110;
  const v112 = v82 * v111;
  const v113 = -0.16666666666666666 + v112;
  const v114 = v99 * v113;
  const v115 = v81 + v114;
  const v116 = v75 < 0.5 ? v98 : v115;
  const v117 = v73 * 0.5;
  const v118 = Math.floor(v117);
  const v119 = v118 + v118;
  const v120 = v73 - v119;
  const v121 = v120 + v120;
  const v122 = 1 - v121;
  const v123 = -v122;
  const v124 = v75 < 0.5 ? v122 : v123;
  const cosomega = v116 * v124;
  const cosomega32 = fround(cosomega);
  const v125 = v75 < 0.5 ? v115 : v98;
  const sinomega = v125 * v122;
  const sinomega32 = fround(sinomega);
  const Crc32 = fround(Crc);
  const Cus32 = fround(Cus);
  const Cuc32 = fround(Cuc);
  const v126 = 0.000072921151467 * toe;
  const v127 = Omega0 - v126;
  const v128 = v127 * 0.6366197723675814;
  const v129 = v128 + 0.5;
  const v130 = Math.floor(v129);
  const v131 = v130 * 0.5;
  const v132 = Math.floor(v131);
  const v133 = v132 + v132;
  const v134 = v130 - v133;
  const v135 = v130 * 1.5707963267948912;
  const v136 = v127 - v135;
  const v137 = v130 * 5.390302858158081e-15;
  const v138 = v136 - v137;
  const v139 = v130 * 3.795010772721225e-29;
  const v140 = v138 - v139;
  const v141 = v140 * v140;
  const v142 = v141 * 4.779477332387385e-14;
  const v143 = -1.1470745597729725e-11 + v142;
  const v144 = v141 * v143;
  const v145 = 2.08767569878681e-9 + v144;
  const v146 = v141 * v145;
  const v147 = -2.755731922398589e-7 + v146;
  const v148 = v141 * v147;
  const v149 = 0.0000248015873015873 + v148;
  const v150 = v141 * v149;
  const v151 = -0.001388888888888889 + v150;
  const v152 = v141 * v151;
  const v153 = 0.041666666666666664 + v152;
  const v154 = v141 * v153;
  const v155 = -0.5 + v154;
  const v156 = v141 * v155;
  const v157 = 1 + v156;
  const v158 = v140 * v141;
  const v159 = v141 * 2.8114572543455206e-15;
  const v160 = -7.647163731819816e-13 + v159;
  const v161 = v141 * v160;
  const v162 = 1.6059043836821613e-10 + v161;
  const v163 = v141 * v162;
  const v164 = -2.505210838544172e-8 + v163;
  const v165 = v141 * v164;
  const v166 = 0.0000027557319223985893 + v165;
  const v167 = v141 * v166;
  const v168 = -0.0001984126984126984 + v167;
  const v169 = v141 * v168;
  const v170 = 0.008333333333333333 + v169;
  const v171 = v141 * v170;
  const v172 = -0.16666666666666666 + v171;
  const v173 = v158 * v172;
  const v174 = v140 + v173;
  const v175 = v134 < 0.5 ? v157 : v174;
  const v176 = v132 * 0.5;
  const v177 = Math.floor(v176);
  const v178 = v177 + v177;
  const v179 = v132 - v178;
  const v180 = v179 + v179;
  const v181 = 1 - v180;
  const v182 = -v181;
  const v183 = v134 < 0.5 ? v181 : v182;
  const v184 = v175 * v183;
  const v185 = fround(v184);
  const v186 = OmegaDot - 0.000072921151467;
  const v187 = fround(v186);
  const v188 = v134 < 0.5 ? v174 : v157;
  const v189 = v188 * v181;
  const v190 = fround(v189);
  const v191 = i0 * i0;
  const v192 = v191 * -1.5619206968586225e-16;
  const v193 = 4.779477332387385e-14 + v192;
  const v194 = v191 * v193;
  const v195 = -1.1470745597729725e-11 + v194;
  const v196 = v191 * v195;
  const v197 = 2.08767569878681e-9 + v196;
  const v198 = v191 * v197;
  const v199 = -2.755731922398589e-7 + v198;
  const v200 = v191 * v199;
  const v201 = 0.0000248015873015873 + v200;
  const v202 = v191 * v201;
  const v203 = -0.001388888888888889 + v202;
  const v204 = v191 * v203;
  const v205 = 0.041666666666666664 + v204;
  const v206 = v191 * v205;
  const v207 = -0.5 + v206;
  const v208 = v191 * v207;
  const v209 = 1 + v208;
  const v210 = fround(v209);
  const IDOT32 = fround(IDOT);
  const Cis32 = fround(Cis);
  const Cic32 = fround(Cic);
  const v211 = i0 * v191;
  const v212 = v191 * -8.22063524662433e-18;
  const v213 = 2.8114572543455206e-15 + v212;
  const v214 = v191 * v213;
  const v215 = -7.647163731819816e-13 + v214;
  const v216 = v191 * v215;
  const v217 = 1.6059043836821613e-10 + v216;
  const v218 = v191 * v217;
  const v219 = -2.505210838544172e-8 + v218;
  const v220 = v191 * v219;
  const v221 = 0.0000027557319223985893 + v220;
  const v222 = v191 * v221;
  const v223 = -0.0001984126984126984 + v222;
  const v224 = v191 * v223;
  const v225 = 0.008333333333333333 + v224;
  const v226 = v191 * v225;
  const v227 = -0.16666666666666666 + v226;
  const v228 = v211 * v227;
  const v229 = i0 + v228;
  const v230 = fround(v229);
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
  const v231 = fround(n32 * t32);
  const v232 = fround(v231 * v231);
  const v233 = fround(v232 * -2.755731998149713e-7);
  const v234 = fround(0.000024801587642286904 + v233);
  const v235 = fround(v232 * v234);
  const v236 = fround(-0.0013888889225199819 + v235);
  const v237 = fround(v232 * v236);
  const v238 = fround(0.0416666679084301 + v237);
  const v239 = fround(v232 * v238);
  const v240 = fround(-0.5 + v239);
  const v241 = fround(v232 * v240);
  const v242 = fround(1 + v241);
  const v243 = fround(v58 * v242);
  const v244 = fround(v231 * v232);
  const v245 = fround(v232 * -2.5052107943679403e-8);
  const v246 = fround(0.0000027557318844628753 + v245);
  const v247 = fround(v232 * v246);
  const v248 = fround(-0.00019841270113829523 + v247);
  const v249 = fround(v232 * v248);
  const v250 = fround(0.008333333767950535 + v249);
  const v251 = fround(v232 * v250);
  const v252 = fround(-0.1666666716337204 + v251);
  const v253 = fround(v244 * v252);
  const v254 = fround(v231 + v253);
  const v255 = fround(v64 * v254);
  const cosM = fround(v243 - v255);
  const v256 = fround(v64 * v242);
  const v257 = fround(v58 * v254);
  const sinM = fround(v256 + v257);
  const v258 = fround(e32 * sinM);
  const v259 = fround(e32 * cosM);
  const v260 = fround(v258 * v259);
  const v261 = fround(v258 + v260);
  const v262 = fround(v261 * v261);
  const v263 = fround(v262 * 0.0416666679084301);
  const v264 = fround(-0.5 + v263);
  const v265 = fround(v262 * v264);
  const v266 = fround(1 + v265);
  const v267 = fround(v258 * v266);
  const v268 = fround(v261 * v262);
  const v269 = fround(v268 * -0.1666666716337204);
  const v270 = fround(v261 + v269);
  const v271 = fround(v259 * v270);
  const v272 = fround(v267 + v271);
  const v273 = fround(v261 - v272);
  const v274 = fround(v259 * v266);
  const v275 = fround(v258 * v270);
  const v276 = fround(v274 - v275);
  const v277 = fround(1 - v276);
  const v278 = fround(v273 / v277);
  const v279 = fround(v261 - v278);
  const v280 = fround(v279 * v279);
  const v281 = fround(v280 * 0.0416666679084301);
  const v282 = fround(-0.5 + v281);
  const v283 = fround(v280 * v282);
  const v284 = fround(1 + v283);
  const v285 = fround(cosM * v284);
  const v286 = fround(v279 * v280);
  const v287 = fround(v286 * -0.1666666716337204);
  const v288 = fround(v279 + v287);
  const v289 = fround(sinM * v288);
  const cosE = fround(v285 - v289);
  const v290 = fround(e32 * cosE);
  const v291 = fround(1 - v290);
  const v292 = fround(A32 * v291);
  const v293 = fround(sinM * v284);
  const v294 = fround(cosM * v288);
  const sinE = fround(v293 + v294);
  const v295 = fround(v68 * sinE);
  const v296 = fround(1 / v291);
  const sinnu = fround(v295 * v296);
  const v297 = fround(sinnu * cosomega32);
  const v298 = fround(cosE - e32);
  const cosnu = fround(v298 * v296);
  const v299 = fround(cosnu * sinomega32);
  const sinphi = fround(v297 + v299);
  const v300 = fround(sinphi + sinphi);
  const v301 = fround(cosnu * cosomega32);
  const v302 = fround(sinnu * sinomega32);
  const cosphi = fround(v301 - v302);
  const sin2phi = fround(v300 * cosphi);
  const v303 = fround(Crs32 * sin2phi);
  const v304 = fround(v300 * sinphi);
  const cos2phi = fround(1 - v304);
  const v305 = fround(Crc32 * cos2phi);
  const v306 = fround(v303 + v305);
  const r = fround(v292 + v306);
  const v307 = fround(Cus32 * sin2phi);
  const v308 = fround(Cuc32 * cos2phi);
  const v309 = fround(v307 + v308);
  const v310 = fround(v309 * v309);
  const v311 = fround(v310 * -0.5);
  const v312 = fround(1 + v311);
  const v313 = fround(cosphi * v312);
  const v314 = fround(v309 * v310);
  const v315 = fround(v314 * -0.1666666716337204);
  const v316 = fround(v309 + v315);
  const v317 = fround(sinphi * v316);
  const cosu = fround(v313 - v317);
  const xOrbit = fround(r * cosu);
  const v318 = fround(v187 * t32);
  const v319 = fround(v318 * v318);
  const v320 = fround(v319 * 0.000024801587642286904);
  const v321 = fround(-0.0013888889225199819 + v320);
  const v322 = fround(v319 * v321);
  const v323 = fround(0.0416666679084301 + v322);
  const v324 = fround(v319 * v323);
  const v325 = fround(-0.5 + v324);
  const v326 = fround(v319 * v325);
  const v327 = fround(1 + v326);
  const v328 = fround(v185 * v327);
  const v329 = fround(v318 * v319);
  const v330 = fround(v319 * 0.0000027557318844628753);
  const v331 = fround(-0.00019841270113829523 + v330);
  const v332 = fround(v319 * v331);
  const v333 = fround(0.008333333767950535 + v332);
  const v334 = fround(v319 * v333);
  const v335 = fround(-0.1666666716337204 + v334);
  const v336 = fround(v329 * v335);
  const v337 = fround(v318 + v336);
  const v338 = fround(v190 * v337);
  const cosOmega = fround(v328 - v338);
  const v339 = fround(xOrbit * cosOmega);
  const v340 = fround(sinphi * v312);
  const v341 = fround(cosphi * v316);
  const sinu = fround(v340 + v341);
  const yOrbit = fround(r * sinu);
  const v342 = fround(IDOT32 * t32);
  const v343 = fround(Cis32 * sin2phi);
  const v344 = fround(v342 + v343);
  const v345 = fround(Cic32 * cos2phi);
  const v346 = fround(v344 + v345);
  const v347 = fround(v346 * v346);
  const v348 = fround(v347 * -0.5);
  const v349 = fround(1 + v348);
  const v350 = fround(v210 * v349);
  const v351 = fround(v346 * v347);
  const v352 = fround(v351 * -0.1666666716337204);
  const v353 = fround(v346 + v352);
  const v354 = fround(v230 * v353);
  const cosi = fround(v350 - v354);
  const v355 = fround(yOrbit * cosi);
  const v356 = fround(v190 * v327);
  const v357 = fround(v185 * v337);
  const sinOmega = fround(v356 + v357);
  const v358 = fround(v355 * sinOmega);
  const v359 = fround(v339 - v358);
  const v360 = fround(xOrbit * sinOmega);
  const v361 = fround(v355 * cosOmega);
  const v362 = fround(v360 + v361);
  const v363 = fround(v230 * v349);
  const v364 = fround(v210 * v353);
  const sini = fround(v363 + v364);
  const v365 = fround(yOrbit * sini);
  out[0] = v359;
  out[1] = v362;
  out[2] = v365;
  return 0;
}
