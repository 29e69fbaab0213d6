package org.kappatrail.demo;

/**
 * What Tarn Hollow has written down about itself: settings, machines, bearings, oils and events.
 */
final class Register {
  static final String SETTINGS =
      """
      site: Tarn Hollow
      timezone: Europe/London
      limits: {kappa-floor: 1.0, water-ppm: 300, iso-4406: 18/16/13, acid-number-rise: 0.5}
      outlook: {horizon-days: 120}
      decision: {horizon-days: 365, failure-cost-ratio: 60}
      temperature: {window-days: 7, gap-minutes: 60, running-speed-percent: 10, uncertainty-c: 1.5}
      """;

  static final String ASSETS =
      """
      asset,name,area,oil,supply,oil_volume_l,contamination_factor,change_cost,cooling_cost,failure_cost,sampling_interval_days
      PM-DRY,Dryer section circulation,paper-machine,circulating-220,inline-filter,3200,,,,140000,30
      PM-PRS,Press section circulation,paper-machine,circulating-150,inline-filter,1800,,9500,1400,160000,30
      PM-WGB,Winder gearbox,paper-machine,gear-320,bath,42,,520,,95000,30
      PM-RGB,Reel drum gearbox,paper-machine,gear-220,bath,38,,480,,85000,30
      PM-VP1,Vacuum pump 1,paper-machine,ashless-100,bath,9,,,,26000,30
      PM-HXF,Hood exhaust fan,paper-machine,ashless-100,bath,7,,,,,30
      PM-SUF,Hall supply fan,paper-machine,ashless-100,bath,6,,,,,30
      SP-CRP,Carrier fluid pump,stock-preparation,hydraulic-46,bath,4.5,,160,,31000,30
      SP-P3,Stock pump 3,stock-preparation,ashless-68,bath,5,,,,,30
      SP-AG4,Chest agitator 4,stock-preparation,circulating-150,bath,55,,,,90000,30
      SP-AG1,Chest agitator 1,stock-preparation,circulating-150,bath,30,,,,,30
      SP-PGB,Pulper gearbox,stock-preparation,gear-220,bath,65,,,,70000,30
      UT-AG2,Broke tower agitator,utilities,circulating-150,bath,28,,390,,60000,30
      UT-SCR,Effluent screen drive,utilities,multigrade-68,bath,12,,210,,,30
      UT-WP1,Well water pump 1,utilities,ashless-68,bath,8,,,,24000,30
      """;

  static final String BEARINGS =
      """
      asset,bearing,type,bore_mm,outside_mm,pitch_mm,speed_rpm,dynamic_rating_kn,static_rating_kn,fatigue_limit_kn,equivalent_load_kn,kappa_floor,temperature_offset_c
      PM-DRY,D03-DS,radial-roller,180,300,,160,830,1270,,97,,
      PM-DRY,D03-TS,radial-roller,180,300,,160,830,1270,,104,,
      PM-DRY,D09-DS,radial-roller,180,300,238,160,830,1270,118,99,,
      PM-PRS,P1-DS,radial-roller,200,340,,210,1180,1700,,206,,
      PM-PRS,P1-TS,radial-roller,200,340,,210,1180,1700,,198,,
      PM-WGB,OUT,radial-roller,100,180,,150,425,490,,72,,
      PM-RGB,OUT,radial-roller,110,200,,300,535,600,,57,,
      PM-VP1,DE,radial-roller,85,180,,980,250,240,29,24,,
      PM-VP1,NDE,radial-ball,85,180,,980,140,97,,11.2,,
      PM-HXF,DE,radial-roller,90,160,,980,285,340,,27,,2
      PM-HXF,NDE,radial-roller,90,160,,980,285,340,,22,,2
      PM-SUF,DE,radial-roller,80,170,,1480,345,375,,26,,
      SP-CRP,DE,radial-ball,65,140,101,1480,97.5,60,,7.7,,
      SP-CRP,NDE,radial-roller,65,140,,1480,152,140,,13.4,,
      SP-P3,DE,radial-ball,75,160,,1480,119,76.5,3,9.9,,
      SP-P3,NDE,radial-roller,75,160,,1480,240,222,,20,,
      SP-AG4,LOW,thrust-roller,160,270,,48,670,2300,,122,,
      SP-AG1,LOW,radial-roller,110,180,,140,,,,,,
      SP-PGB,OUT,radial-roller,120,215,,120,650,765,,98,,
      UT-AG2,LOW,radial-roller,110,200,,180,540,610,,62,,
      UT-SCR,DRIVE,radial-ball,90,160,,740,96,81.5,,9.4,,
      UT-WP1,THRUST,thrust-ball,80,140,,980,112,285,,9.2,,
      UT-WP1,GUIDE,radial-ball,80,140,,980,70,55,,5.8,,
      """;

  static final String OILS =
      """
      oil,grade_vg,viscosity_40c_cst,viscosity_100c_cst,viscosity_index,effective_ep,vi_improved,price_per_l,zinc_ppm,phosphorus_ppm,calcium_ppm,boron_ppm
      hydraulic-46,46,46,6.8,,no,no,3.20,460,370,130,
      ashless-68,68,68,8.7,,no,no,3.90,,95,,
      ashless-100,100,100,,98,no,no,4.00,,100,,
      circulating-150,150,150,14.8,,no,no,4.10,420,340,60,
      circulating-220,220,220,,97,no,no,4.30,415,335,60,
      gear-220,220,220,,96,yes,no,5.20,,270,,48
      gear-320,320,320,24,,yes,no,5.40,,280,,50
      gear-460,460,460,30.4,,yes,no,5.60,,285,,50
      multigrade-68,68,68,,156,no,yes,,610,500,150,
      """;

  static final String EVENTS =
      """
      asset,date,event,oil,litres,bearing,note
      SP-AG1,2024-06-12,oil-change,circulating-150,30,,
      UT-AG2,2024-06-20,oil-change,circulating-150,28,,
      UT-WP1,2024-07-08,oil-change,ashless-68,8,,temperature sensors fitted
      PM-SUF,2024-07-10,oil-change,ashless-100,6,,
      SP-AG4,2024-08-14,oil-change,circulating-150,55,,during the summer stop
      PM-PRS,2024-08-15,oil-change,circulating-150,1800,,during the summer stop
      PM-PRS,2024-08-15,filter-changed,,,,
      UT-SCR,2024-11-12,oil-change,multigrade-68,12,,
      PM-DRY,2025-01-15,filter-changed,,,,differential pressure
      SP-PGB,2025-02-11,oil-change,gear-220,65,,
      PM-WGB,2025-03-12,oil-change,gear-320,42,,
      PM-VP1,2025-04-08,oil-change,ashless-100,9,,
      PM-VP1,2025-04-08,bearing-replaced,,,NDE,noise at the last round
      PM-RGB,2025-05-14,oil-change,gear-220,38,,
      PM-DRY,2025-05-21,top-up,circulating-220,180,,
      SP-CRP,2025-06-17,oil-change,hydraulic-46,4.5,,
      PM-DRY,2025-08-06,filter-changed,,,,
      PM-PRS,2025-08-07,filter-changed,,,,
      SP-AG4,2025-11-04,top-up,circulating-150,4,,
      PM-DRY,2026-02-11,top-up,circulating-220,160,,
      PM-WGB,2026-04-14,top-up,,5.5,,low level at the sight glass
      UT-AG2,2026-05-06,other,,,,sight glass cleaned
      PM-PRS,2026-08-06,filter-changed,,,,
      """;

  private Register() {}
}
