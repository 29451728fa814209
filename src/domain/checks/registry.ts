import type { Rule } from './define-rule.ts';
import { rule as absorbableFixation } from './rules/absorbable-fixation/rule.ts';
import { rule as acuityAgainstMacula } from './rules/acuity-against-macula/rule.ts';
import { rule as agentExchangeMismatch } from './rules/agent-exchange-mismatch/rule.ts';
import { rule as allergyAgainstMedicine } from './rules/allergy-against-medicine/rule.ts';
import { rule as aminoglycosideInsideEye } from './rules/aminoglycoside-inside-eye/rule.ts';
import { rule as anaesthetistMissing } from './rules/anaesthetist-missing/rule.ts';
import { rule as arcAgainstRole } from './rules/arc-against-role/rule.ts';
import { rule as assistantWithoutPart } from './rules/assistant-without-part/rule.ts';
import { rule as axialLengthFromBeforeBand } from './rules/axial-length-from-before-band/rule.ts';
import { rule as axialLengthUnusual } from './rules/axial-length-unusual/rule.ts';
import { rule as axialLengthUsedDiffers } from './rules/axial-length-used-differs/rule.ts';
import { rule as bagWithoutCapsule } from './rules/bag-without-capsule/rule.ts';
import { rule as bandDoesNotFitGlobe } from './rules/band-does-not-fit-globe/rule.ts';
import { rule as bandFarFromUsualPlace } from './rules/band-far-from-usual-place/rule.ts';
import { rule as bandFixedInFewQuadrants } from './rules/band-fixed-in-few-quadrants/rule.ts';
import { rule as bandMayBeTwisted } from './rules/band-may-be-twisted/rule.ts';
import { rule as bandSetOnSoftEye } from './rules/band-set-on-soft-eye/rule.ts';
import { rule as bandThroughLimitedOpening } from './rules/band-through-limited-opening/rule.ts';
import { rule as bandWithoutClosure } from './rules/band-without-closure/rule.ts';
import { rule as biteFarWiderThanElement } from './rules/bite-far-wider-than-element/rule.ts';
import { rule as biteNarrowerThanElement } from './rules/bite-narrower-than-element/rule.ts';
import { rule as bleedingRiskExternalDrainage } from './rules/bleeding-risk-external-drainage/rule.ts';
import { rule as blockAgainstAnaesthesia } from './rules/block-against-anaesthesia/rule.ts';
import { rule as blockEyeMissing } from './rules/block-eye-missing/rule.ts';
import { rule as blockVolumeUnusual } from './rules/block-volume-unusual/rule.ts';
import { rule as blockWithoutAgent } from './rules/block-without-agent/rule.ts';
import { rule as bloodLossAgainstFigure } from './rules/blood-loss-against-figure/rule.ts';
import { rule as bloodLossUnusual } from './rules/blood-loss-unusual/rule.ts';
import { rule as bornAfterSurgery } from './rules/born-after-surgery/rule.ts';
import { rule as breakAsLargeAsGiantTear } from './rules/break-as-large-as-giant-tear/rule.ts';
import { rule as breakEdgesCrossed } from './rules/break-edges-crossed/rule.ts';
import { rule as breakEnteredTwice } from './rules/break-entered-twice/rule.ts';
import { rule as breakOffItsZone } from './rules/break-off-its-zone/rule.ts';
import { rule as breakOffTheDetachment } from './rules/break-off-the-detachment/rule.ts';
import { rule as breakOffTheRetina } from './rules/break-off-the-retina/rule.ts';
import { rule as breakUnsupported } from './rules/break-unsupported/rule.ts';
import { rule as breakWithoutRetinopexy } from './rules/break-without-retinopexy/rule.ts';
import { rule as breaksInSerousDetachment } from './rules/breaks-in-serous-detachment/rule.ts';
import { rule as breaksOpenAtEnd } from './rules/breaks-open-at-end/rule.ts';
import { rule as broadElementInOlderPatient } from './rules/broad-element-in-older-patient/rule.ts';
import { rule as bubbleSmallerThanBreak } from './rules/bubble-smaller-than-break/rule.ts';
import { rule as buckleUnderDrops } from './rules/buckle-under-drops/rule.ts';
import { rule as buckleWithoutOpening } from './rules/buckle-without-opening/rule.ts';
import { rule as cephalosporinAfterPenicillinAllergy } from './rules/cephalosporin-after-penicillin-allergy/rule.ts';
import { rule as childAwake } from './rules/child-awake/rule.ts';
import { rule as clockOutsideQuadrant } from './rules/clock-outside-quadrant/rule.ts';
import { rule as closureMaterialAgainstKind } from './rules/closure-material-against-kind/rule.ts';
import { rule as closureMaterialMissing } from './rules/closure-material-missing/rule.ts';
import { rule as closureOnOpenElement } from './rules/closure-on-open-element/rule.ts';
import { rule as complicationWithoutAction } from './rules/complication-without-action/rule.ts';
import { rule as complicationWithoutKind } from './rules/complication-without-kind/rule.ts';
import { rule as complicationsAgainstOutcome } from './rules/complications-against-outcome/rule.ts';
import { rule as concentrationLow } from './rules/concentration-low/rule.ts';
import { rule as conjunctivaOpenedNotClosed } from './rules/conjunctiva-opened-not-closed/rule.ts';
import { rule as countDiscrepancyOpen } from './rules/count-discrepancy-open/rule.ts';
import { rule as countsCorrectWithDiscrepancy } from './rules/counts-correct-with-discrepancy/rule.ts';
import { rule as cryoAllRound } from './rules/cryo-all-round/rule.ts';
import { rule as dateOutOfOrder } from './rules/date-out-of-order/rule.ts';
import { rule as detachmentLeftOpen } from './rules/detachment-left-open/rule.ts';
import { rule as detachmentSurgeryRepeated } from './rules/detachment-surgery-repeated/rule.ts';
import { rule as detachmentWithoutDetachment } from './rules/detachment-without-detachment/rule.ts';
import { rule as diagnosisAgainstBreaks } from './rules/diagnosis-against-breaks/rule.ts';
import { rule as diagnosisChangedUnexplained } from './rules/diagnosis-changed-unexplained/rule.ts';
import { rule as dialysisOffTheOra } from './rules/dialysis-off-the-ora/rule.ts';
import { rule as dilutionWrong } from './rules/dilution-wrong/rule.ts';
import { rule as discNotPerfusedAtEnd } from './rules/disc-not-perfused-at-end/rule.ts';
import { rule as discNotPerfusedUnresolved } from './rules/disc-not-perfused-unresolved/rule.ts';
import { rule as drainageDetailsWithoutDrainage } from './rules/drainage-details-without-drainage/rule.ts';
import { rule as drainageOffTheDetachment } from './rules/drainage-off-the-detachment/rule.ts';
import { rule as drainageOutcomeAgainstRetina } from './rules/drainage-outcome-against-retina/rule.ts';
import { rule as drainageRetinotomyMissing } from './rules/drainage-retinotomy-missing/rule.ts';
import { rule as drainageRetinotomyNotDescribed } from './rules/drainage-retinotomy-not-described/rule.ts';
import { rule as drainageWithoutOutcome } from './rules/drainage-without-outcome/rule.ts';
import { rule as drainedThroughMissingBreak } from './rules/drained-through-missing-break/rule.ts';
import { rule as dropWithoutDose } from './rules/drop-without-dose/rule.ts';
import { rule as dropWithoutEye } from './rules/drop-without-eye/rule.ts';
import { rule as earlierSurgeryOnOtherEyeOnly } from './rules/earlier-surgery-on-other-eye-only/rule.ts';
import { rule as elementAwayFromBreak } from './rules/element-away-from-break/rule.ts';
import { rule as elementFixedByNothing } from './rules/element-fixed-by-nothing/rule.ts';
import { rule as elementOfImpossibleSize } from './rules/element-of-impossible-size/rule.ts';
import { rule as elementRemovalFarOff } from './rules/element-removal-far-off/rule.ts';
import { rule as elementSupportsNothing } from './rules/element-supports-nothing/rule.ts';
import { rule as elementWithoutFixation } from './rules/element-without-fixation/rule.ts';
import { rule as elementWithoutFrontEdge } from './rules/element-without-front-edge/rule.ts';
import { rule as elementWithoutPlace } from './rules/element-without-place/rule.ts';
import { rule as elementWithoutSize } from './rules/element-without-size/rule.ts';
import { rule as endolaserWithoutVitrectomy } from './rules/endolaser-without-vitrectomy/rule.ts';
import { rule as endsBeforeStart } from './rules/ends-before-start/rule.ts';
import { rule as exchangeWithoutVitrectomy } from './rules/exchange-without-vitrectomy/rule.ts';
import { rule as expansileConcentration } from './rules/expansile-concentration/rule.ts';
import { rule as expiredImplant } from './rules/expired-implant/rule.ts';
import { rule as extentAgainstQuadrants } from './rules/extent-against-quadrants/rule.ts';
import { rule as extentHalfRecorded } from './rules/extent-half-recorded/rule.ts';
import { rule as extentOfLargeTearMissing } from './rules/extent-of-large-tear-missing/rule.ts';
import { rule as fellowEyeTextNamesOperatedEye } from './rules/fellow-eye-text-names-operated-eye/rule.ts';
import { rule as fillAgainstVolume } from './rules/fill-against-volume/rule.ts';
import { rule as fixationIncomplete } from './rules/fixation-incomplete/rule.ts';
import { rule as fixationOffTheElement } from './rules/fixation-off-the-element/rule.ts';
import { rule as fixationQuadrantTwice } from './rules/fixation-quadrant-twice/rule.ts';
import { rule as fixedDateForFlying } from './rules/fixed-date-for-flying/rule.ts';
import { rule as flatOnBackWithGas } from './rules/flat-on-back-with-gas/rule.ts';
import { rule as fluidAgainstFlat } from './rules/fluid-against-flat/rule.ts';
import { rule as fluidLeftWhereMissing } from './rules/fluid-left-where-missing/rule.ts';
import { rule as fluidWithoutDetachment } from './rules/fluid-without-detachment/rule.ts';
import { rule as flyingBeforeGasGone } from './rules/flying-before-gas-gone/rule.ts';
import { rule as followUpBeforeSurgery } from './rules/follow-up-before-surgery/rule.ts';
import { rule as formAgainstMaterial } from './rules/form-against-material/rule.ts';
import { rule as freeTextAgainstRecord } from './rules/free-text-against-record/rule.ts';
import { rule as freeTextNamesOtherEye } from './rules/free-text-names-other-eye/rule.ts';
import { rule as frontEdgeInFrontOfInsertions } from './rules/front-edge-in-front-of-insertions/rule.ts';
import { rule as frontEdgeJumps } from './rules/front-edge-jumps/rule.ts';
import { rule as gasAdviceMissing } from './rules/gas-advice-missing/rule.ts';
import { rule as gasAdviceNotGiven } from './rules/gas-advice-not-given/rule.ts';
import { rule as gasAdviceWithoutGas } from './rules/gas-advice-without-gas/rule.ts';
import { rule as gasConcentrationMissing } from './rules/gas-concentration-missing/rule.ts';
import { rule as gasWithoutPosture } from './rules/gas-without-posture/rule.ts';
import { rule as giantTearTooSmall } from './rules/giant-tear-too-small/rule.ts';
import { rule as giantTearWithoutPvd } from './rules/giant-tear-without-pvd/rule.ts';
import { rule as heavyLiquidLeft } from './rules/heavy-liquid-left/rule.ts';
import { rule as heavyLiquidLeftLong } from './rules/heavy-liquid-left-long/rule.ts';
import { rule as heavyLiquidUnderRetinaNotUsed } from './rules/heavy-liquid-under-retina-not-used/rule.ts';
import { rule as heavyLiquidUseNotRecorded } from './rules/heavy-liquid-use-not-recorded/rule.ts';
import { rule as heavyLiquidVolumeUnusual } from './rules/heavy-liquid-volume-unusual/rule.ts';
import { rule as heavyOilBreaksAbove } from './rules/heavy-oil-breaks-above/rule.ts';
import { rule as heavyOilFaceDown } from './rules/heavy-oil-face-down/rule.ts';
import { rule as heightAboveBound } from './rules/height-above-bound/rule.ts';
import { rule as heightUnusual } from './rules/height-unusual/rule.ts';
import { rule as highPressureWithoutPerfusion } from './rules/high-pressure-without-perfusion/rule.ts';
import { rule as horseshoeWithVitreousAttached } from './rules/horseshoe-with-vitreous-attached/rule.ts';
import { rule as hyaloidAgainstBefore } from './rules/hyaloid-against-before/rule.ts';
import { rule as hyaloidLeftAttached } from './rules/hyaloid-left-attached/rule.ts';
import { rule as implantPowerMissing } from './rules/implant-power-missing/rule.ts';
import { rule as implantPowerUnusual } from './rules/implant-power-unusual/rule.ts';
import { rule as implantWithTightenedBand } from './rules/implant-with-tightened-band/rule.ts';
import { rule as implantWithoutLot } from './rules/implant-without-lot/rule.ts';
import { rule as injectionLarge } from './rules/injection-large/rule.ts';
import { rule as injectionWithoutVolume } from './rules/injection-without-volume/rule.ts';
import { rule as internalDrainageWithoutVitrectomy } from './rules/internal-drainage-without-vitrectomy/rule.ts';
import { rule as keratometryUnusual } from './rules/keratometry-unusual/rule.ts';
import { rule as largeFillVolumeMismatch } from './rules/large-fill-volume-mismatch/rule.ts';
import { rule as lastingClosureTemporaryBand } from './rules/lasting-closure-temporary-band/rule.ts';
import { rule as lateReview } from './rules/late-review/rule.ts';
import { rule as latticeTreatedWithoutRetinopexy } from './rules/lattice-treated-without-retinopexy/rule.ts';
import { rule as lensBeforeAgainstHistory } from './rules/lens-before-against-history/rule.ts';
import { rule as lensImplantInPhakicEye } from './rules/lens-implant-in-phakic-eye/rule.ts';
import { rule as lensImplantIncomplete } from './rules/lens-implant-incomplete/rule.ts';
import { rule as lensRemovedImplantNotRecorded } from './rules/lens-removed-implant-not-recorded/rule.ts';
import { rule as lensTouchWithoutLens } from './rules/lens-touch-without-lens/rule.ts';
import { rule as lensWorkAgainstLens } from './rules/lens-work-against-lens/rule.ts';
import { rule as lincoffRule } from './rules/lincoff-rule/rule.ts';
import { rule as localAnaestheticStrength } from './rules/local-anaesthetic-strength/rule.ts';
import { rule as lowerBreaksLightTamponadeUpright } from './rules/lower-breaks-light-tamponade-upright/rule.ts';
import { rule as maculaOffBeforeSymptoms } from './rules/macula-off-before-symptoms/rule.ts';
import { rule as maculaOffDurationMissing } from './rules/macula-off-duration-missing/rule.ts';
import { rule as maculaOnForDaysOff } from './rules/macula-on-for-days-off/rule.ts';
import { rule as macularHoleBurned } from './rules/macular-hole-burned/rule.ts';
import { rule as macularHoleInPeriphery } from './rules/macular-hole-in-periphery/rule.ts';
import { rule as markNotRecorded } from './rules/mark-not-recorded/rule.ts';
import { rule as measuredBloodLossMissing } from './rules/measured-blood-loss-missing/rule.ts';
import { rule as medicineGivenOutsideOperation } from './rules/medicine-given-outside-operation/rule.ts';
import { rule as medicineIncomplete } from './rules/medicine-incomplete/rule.ts';
import { rule as membraneDyeWithoutPeel } from './rules/membrane-dye-without-peel/rule.ts';
import { rule as mixingAgainstConcentration } from './rules/mixing-against-concentration/rule.ts';
import { rule as muscleOffTheSegment } from './rules/muscle-off-the-segment/rule.ts';
import { rule as musclesAgainstBand } from './rules/muscles-against-band/rule.ts';
import { rule as needleBlockAnticoagulated } from './rules/needle-block-anticoagulated/rule.ts';
import { rule as nitrousOxideAndGas } from './rules/nitrous-oxide-and-gas/rule.ts';
import { rule as nitrousOxideNotRecorded } from './rules/nitrous-oxide-not-recorded/rule.ts';
import { rule as nitrousOxideStoppedOutsideOperation } from './rules/nitrous-oxide-stopped-outside-operation/rule.ts';
import { rule as nitrousOxideToTheEnd } from './rules/nitrous-oxide-to-the-end/rule.ts';
import { rule as noAntisepsis } from './rules/no-antisepsis/rule.ts';
import { rule as noFlyingDateWithoutGas } from './rules/no-flying-date-without-gas/rule.ts';
import { rule as noneBesideOthers } from './rules/none-beside-others/rule.ts';
import { rule as oilInAphakicEye } from './rules/oil-in-aphakic-eye/rule.ts';
import { rule as oilRemovalFarOff } from './rules/oil-removal-far-off/rule.ts';
import { rule as oilRemovalWithoutOil } from './rules/oil-removal-without-oil/rule.ts';
import { rule as oilViscosityUnusual } from './rules/oil-viscosity-unusual/rule.ts';
import { rule as oilWithoutRemovalPlan } from './rules/oil-without-removal-plan/rule.ts';
import { rule as oilWithoutViscosity } from './rules/oil-without-viscosity/rule.ts';
import { rule as onePersonInTwoRoles } from './rules/one-person-in-two-roles/rule.ts';
import { rule as openingAndClosureMissing } from './rules/opening-and-closure-missing/rule.ts';
import { rule as operationVeryShort } from './rules/operation-very-short/rule.ts';
import { rule as outcomeNotAmongComplications } from './rules/outcome-not-among-complications/rule.ts';
import { rule as paracentesisNotDoneWithVolume } from './rules/paracentesis-not-done-with-volume/rule.ts';
import { rule as performedAgainstStages } from './rules/performed-against-stages/rule.ts';
import { rule as perfusionNotRecorded } from './rules/perfusion-not-recorded/rule.ts';
import { rule as planChangedWithoutReason } from './rules/plan-changed-without-reason/rule.ts';
import { rule as pneumaticBreaksOutOfReach } from './rules/pneumatic-breaks-out-of-reach/rule.ts';
import { rule as pneumaticVolume } from './rules/pneumatic-volume/rule.ts';
import { rule as pneumaticWithVitrectomy } from './rules/pneumatic-with-vitrectomy/rule.ts';
import { rule as portsUnusual } from './rules/ports-unusual/rule.ts';
import { rule as postureHoursDoNotAddUp } from './rules/posture-hours-do-not-add-up/rule.ts';
import { rule as postureLeavesBreakDry } from './rules/posture-leaves-break-dry/rule.ts';
import { rule as postureOfNoTime } from './rules/posture-of-no-time/rule.ts';
import { rule as postureOnWrongSide } from './rules/posture-on-wrong-side/rule.ts';
import { rule as postureOutlastsGas } from './rules/posture-outlasts-gas/rule.ts';
import { rule as postureWithoutDuration } from './rules/posture-without-duration/rule.ts';
import { rule as postureWithoutPosition } from './rules/posture-without-position/rule.ts';
import { rule as postureWithoutTamponade } from './rules/posture-without-tamponade/rule.ts';
import { rule as preoperativeDiagnosisNotBorneOut } from './rules/preoperative-diagnosis-not-borne-out/rule.ts';
import { rule as prescribedForNoTime } from './rules/prescribed-for-no-time/rule.ts';
import { rule as prescribedTwice } from './rules/prescribed-twice/rule.ts';
import { rule as pressureAtEnd } from './rules/pressure-at-end/rule.ts';
import { rule as pressureBeforeUnusual } from './rules/pressure-before-unusual/rule.ts';
import { rule as previousOperationIncomplete } from './rules/previous-operation-incomplete/rule.ts';
import { rule as pseudophakicWithoutCataractSurgery } from './rules/pseudophakic-without-cataract-surgery/rule.ts';
import { rule as pureGasAtFullFill } from './rules/pure-gas-at-full-fill/rule.ts';
import { rule as pvrDWithoutTotalDetachment } from './rules/pvr-d-without-total-detachment/rule.ts';
import { rule as pvrExtentMissing } from './rules/pvr-extent-missing/rule.ts';
import { rule as pvrGradeOfOtherEdition } from './rules/pvr-grade-of-other-edition/rule.ts';
import { rule as pvrHoursWithoutGradeC } from './rules/pvr-hours-without-grade-c/rule.ts';
import { rule as pvrMembranesWithoutPvr } from './rules/pvr-membranes-without-pvr/rule.ts';
import { rule as recurrenceWithoutHistory } from './rules/recurrence-without-history/rule.ts';
import { rule as referredBeforeSymptoms } from './rules/referred-before-symptoms/rule.ts';
import { rule as referrerMissing } from './rules/referrer-missing/rule.ts';
import { rule as referrerWithoutName } from './rules/referrer-without-name/rule.ts';
import { rule as refractionAgainstAxialLength } from './rules/refraction-against-axial-length/rule.ts';
import { rule as refractionNotTold } from './rules/refraction-not-told/rule.ts';
import { rule as relatedMedicineAfterAllergy } from './rules/related-medicine-after-allergy/rule.ts';
import { rule as removalPlannedOfPermanentElement } from './rules/removal-planned-of-permanent-element/rule.ts';
import { rule as requiredAftercare } from './rules/required-aftercare/rule.ts';
import { rule as requiredAnaesthesia } from './rules/required-anaesthesia/rule.ts';
import { rule as requiredBefore } from './rules/required-before/rule.ts';
import { rule as requiredEnd } from './rules/required-end/rule.ts';
import { rule as requiredFindings } from './rules/required-findings/rule.ts';
import { rule as requiredIdentity } from './rules/required-identity/rule.ts';
import { rule as requiredSteps } from './rules/required-steps/rule.ts';
import { rule as requiredWho } from './rules/required-who/rule.ts';
import { rule as retinaDetachedAtEnd } from './rules/retina-detached-at-end/rule.ts';
import { rule as retinopexyIncomplete } from './rules/retinopexy-incomplete/rule.ts';
import { rule as retinopexyKindsDiffer } from './rules/retinopexy-kinds-differ/rule.ts';
import { rule as retinopexyOfMissingBreak } from './rules/retinopexy-of-missing-break/rule.ts';
import { rule as retinopexySettingsAgainstKind } from './rules/retinopexy-settings-against-kind/rule.ts';
import { rule as retinopexySettingsUnusual } from './rules/retinopexy-settings-unusual/rule.ts';
import { rule as retinotomyTreatedWithoutRetinopexy } from './rules/retinotomy-treated-without-retinopexy/rule.ts';
import { rule as retinotomyUntreated } from './rules/retinotomy-untreated/rule.ts';
import { rule as reviewBeforeEnd } from './rules/review-before-end/rule.ts';
import { rule as reviewDatesDiffer } from './rules/review-dates-differ/rule.ts';
import { rule as sclerotomiesOffParsPlana } from './rules/sclerotomies-off-pars-plana/rule.ts';
import { rule as segmentFarFromUsualPlace } from './rules/segment-far-from-usual-place/rule.ts';
import { rule as segmentLengthAgainstArc } from './rules/segment-length-against-arc/rule.ts';
import { rule as segmentOverHalf } from './rules/segment-over-half/rule.ts';
import { rule as shortenedTooMuch } from './rules/shortened-too-much/rule.ts';
import { rule as shortenedWithoutRing } from './rules/shortened-without-ring/rule.ts';
import { rule as sideDiffers } from './rules/side-differs/rule.ts';
import { rule as siliconeImplantWithOil } from './rules/silicone-implant-with-oil/rule.ts';
import { rule as slitLampLaserAsleep } from './rules/slit-lamp-laser-asleep/rule.ts';
import { rule as smallHyperopicEye } from './rules/small-hyperopic-eye/rule.ts';
import { rule as specimenIncomplete } from './rules/specimen-incomplete/rule.ts';
import { rule as supervisionIncomplete } from './rules/supervision-incomplete/rule.ts';
import { rule as supervisorForTrainee } from './rules/supervisor-for-trainee/rule.ts';
import { rule as supportMissesBreak } from './rules/support-misses-break/rule.ts';
import { rule as supportNotRecorded } from './rules/support-not-recorded/rule.ts';
import { rule as supportedByMissingElement } from './rules/supported-by-missing-element/rule.ts';
import { rule as symptomsForYears } from './rules/symptoms-for-years/rule.ts';
import { rule as tamponadeDetailsWithoutAgent } from './rules/tamponade-details-without-agent/rule.ts';
import { rule as temporaryClosurePermanentBand } from './rules/temporary-closure-permanent-band/rule.ts';
import { rule as temporaryElementWithoutRemovalPlan } from './rules/temporary-element-without-removal-plan/rule.ts';
import { rule as tensionAboveClosingPressure } from './rules/tension-above-closing-pressure/rule.ts';
import { rule as tensionWithoutShortening } from './rules/tension-without-shortening/rule.ts';
import { rule as thickerThanItsForm } from './rules/thicker-than-its-form/rule.ts';
import { rule as thrombosisProphylaxisMissing } from './rules/thrombosis-prophylaxis-missing/rule.ts';
import { rule as tightenedWithoutPressure } from './rules/tightened-without-pressure/rule.ts';
import { rule as timeOutAfterStart } from './rules/time-out-after-start/rule.ts';
import { rule as timeOutNotTimed } from './rules/time-out-not-timed/rule.ts';
import { rule as tissueAgainstSteps } from './rules/tissue-against-steps/rule.ts';
import { rule as totalAgainstArc } from './rules/total-against-arc/rule.ts';
import { rule as totalDetachmentMaculaOn } from './rules/total-detachment-macula-on/rule.ts';
import { rule as traineeWithoutSupervisor } from './rules/trainee-without-supervisor/rule.ts';
import { rule as treatedBreakNotAmongTargets } from './rules/treated-break-not-among-targets/rule.ts';
import { rule as treatmentForOtherEye } from './rules/treatment-for-other-eye/rule.ts';
import { rule as twoBands } from './rules/two-bands/rule.ts';
import { rule as underBandWithoutBand } from './rules/under-band-without-band/rule.ts';
import { rule as untreatedBreakAmongTargets } from './rules/untreated-break-among-targets/rule.ts';
import { rule as vitrectomyDetailsWithoutVitrectomy } from './rules/vitrectomy-details-without-vitrectomy/rule.ts';
import { rule as vitrectomyIncomplete } from './rules/vitrectomy-incomplete/rule.ts';
import { rule as vitrectomyStepsNotApplicable } from './rules/vitrectomy-steps-not-applicable/rule.ts';
import { rule as warningSignsLeftOut } from './rules/warning-signs-left-out/rule.ts';
import { rule as widePortsSutureless } from './rules/wide-ports-sutureless/rule.ts';
import { rule as wristbandNotGiven } from './rules/wristband-not-given/rule.ts';

/** Changes whenever a rule comes, goes or asks something else; kept with every signature. */
export const RULES_VERSION = '2026-12-01.2';

/** Every rule, by id. A test holds this list against the folders. */
export const rules: readonly Rule[] = [
  absorbableFixation,
  acuityAgainstMacula,
  agentExchangeMismatch,
  allergyAgainstMedicine,
  aminoglycosideInsideEye,
  anaesthetistMissing,
  arcAgainstRole,
  assistantWithoutPart,
  axialLengthFromBeforeBand,
  axialLengthUnusual,
  axialLengthUsedDiffers,
  bagWithoutCapsule,
  bandDoesNotFitGlobe,
  bandFarFromUsualPlace,
  bandFixedInFewQuadrants,
  bandMayBeTwisted,
  bandSetOnSoftEye,
  bandThroughLimitedOpening,
  bandWithoutClosure,
  biteFarWiderThanElement,
  biteNarrowerThanElement,
  bleedingRiskExternalDrainage,
  blockAgainstAnaesthesia,
  blockEyeMissing,
  blockVolumeUnusual,
  blockWithoutAgent,
  bloodLossAgainstFigure,
  bloodLossUnusual,
  bornAfterSurgery,
  breakAsLargeAsGiantTear,
  breakEdgesCrossed,
  breakEnteredTwice,
  breakOffItsZone,
  breakOffTheDetachment,
  breakOffTheRetina,
  breakUnsupported,
  breakWithoutRetinopexy,
  breaksInSerousDetachment,
  breaksOpenAtEnd,
  broadElementInOlderPatient,
  bubbleSmallerThanBreak,
  buckleUnderDrops,
  buckleWithoutOpening,
  cephalosporinAfterPenicillinAllergy,
  childAwake,
  clockOutsideQuadrant,
  closureMaterialAgainstKind,
  closureMaterialMissing,
  closureOnOpenElement,
  complicationWithoutAction,
  complicationWithoutKind,
  complicationsAgainstOutcome,
  concentrationLow,
  conjunctivaOpenedNotClosed,
  countDiscrepancyOpen,
  countsCorrectWithDiscrepancy,
  cryoAllRound,
  dateOutOfOrder,
  detachmentLeftOpen,
  detachmentSurgeryRepeated,
  detachmentWithoutDetachment,
  diagnosisAgainstBreaks,
  diagnosisChangedUnexplained,
  dialysisOffTheOra,
  dilutionWrong,
  discNotPerfusedAtEnd,
  discNotPerfusedUnresolved,
  drainageDetailsWithoutDrainage,
  drainageOffTheDetachment,
  drainageOutcomeAgainstRetina,
  drainageRetinotomyMissing,
  drainageRetinotomyNotDescribed,
  drainageWithoutOutcome,
  drainedThroughMissingBreak,
  dropWithoutDose,
  dropWithoutEye,
  earlierSurgeryOnOtherEyeOnly,
  elementAwayFromBreak,
  elementFixedByNothing,
  elementOfImpossibleSize,
  elementRemovalFarOff,
  elementSupportsNothing,
  elementWithoutFixation,
  elementWithoutFrontEdge,
  elementWithoutPlace,
  elementWithoutSize,
  endolaserWithoutVitrectomy,
  endsBeforeStart,
  exchangeWithoutVitrectomy,
  expansileConcentration,
  expiredImplant,
  extentAgainstQuadrants,
  extentHalfRecorded,
  extentOfLargeTearMissing,
  fellowEyeTextNamesOperatedEye,
  fillAgainstVolume,
  fixationIncomplete,
  fixationOffTheElement,
  fixationQuadrantTwice,
  fixedDateForFlying,
  flatOnBackWithGas,
  fluidAgainstFlat,
  fluidLeftWhereMissing,
  fluidWithoutDetachment,
  flyingBeforeGasGone,
  followUpBeforeSurgery,
  formAgainstMaterial,
  freeTextAgainstRecord,
  freeTextNamesOtherEye,
  frontEdgeInFrontOfInsertions,
  frontEdgeJumps,
  gasAdviceMissing,
  gasAdviceNotGiven,
  gasAdviceWithoutGas,
  gasConcentrationMissing,
  gasWithoutPosture,
  giantTearTooSmall,
  giantTearWithoutPvd,
  heavyLiquidLeft,
  heavyLiquidLeftLong,
  heavyLiquidUnderRetinaNotUsed,
  heavyLiquidUseNotRecorded,
  heavyLiquidVolumeUnusual,
  heavyOilBreaksAbove,
  heavyOilFaceDown,
  heightAboveBound,
  heightUnusual,
  highPressureWithoutPerfusion,
  horseshoeWithVitreousAttached,
  hyaloidAgainstBefore,
  hyaloidLeftAttached,
  implantPowerMissing,
  implantPowerUnusual,
  implantWithTightenedBand,
  implantWithoutLot,
  injectionLarge,
  injectionWithoutVolume,
  internalDrainageWithoutVitrectomy,
  keratometryUnusual,
  largeFillVolumeMismatch,
  lastingClosureTemporaryBand,
  lateReview,
  latticeTreatedWithoutRetinopexy,
  lensBeforeAgainstHistory,
  lensImplantInPhakicEye,
  lensImplantIncomplete,
  lensRemovedImplantNotRecorded,
  lensTouchWithoutLens,
  lensWorkAgainstLens,
  lincoffRule,
  localAnaestheticStrength,
  lowerBreaksLightTamponadeUpright,
  maculaOffBeforeSymptoms,
  maculaOffDurationMissing,
  maculaOnForDaysOff,
  macularHoleBurned,
  macularHoleInPeriphery,
  markNotRecorded,
  measuredBloodLossMissing,
  medicineGivenOutsideOperation,
  medicineIncomplete,
  membraneDyeWithoutPeel,
  mixingAgainstConcentration,
  muscleOffTheSegment,
  musclesAgainstBand,
  needleBlockAnticoagulated,
  nitrousOxideAndGas,
  nitrousOxideNotRecorded,
  nitrousOxideStoppedOutsideOperation,
  nitrousOxideToTheEnd,
  noAntisepsis,
  noFlyingDateWithoutGas,
  noneBesideOthers,
  oilInAphakicEye,
  oilRemovalFarOff,
  oilRemovalWithoutOil,
  oilViscosityUnusual,
  oilWithoutRemovalPlan,
  oilWithoutViscosity,
  onePersonInTwoRoles,
  openingAndClosureMissing,
  operationVeryShort,
  outcomeNotAmongComplications,
  paracentesisNotDoneWithVolume,
  performedAgainstStages,
  perfusionNotRecorded,
  planChangedWithoutReason,
  pneumaticBreaksOutOfReach,
  pneumaticVolume,
  pneumaticWithVitrectomy,
  portsUnusual,
  postureHoursDoNotAddUp,
  postureLeavesBreakDry,
  postureOfNoTime,
  postureOnWrongSide,
  postureOutlastsGas,
  postureWithoutDuration,
  postureWithoutPosition,
  postureWithoutTamponade,
  preoperativeDiagnosisNotBorneOut,
  prescribedForNoTime,
  prescribedTwice,
  pressureAtEnd,
  pressureBeforeUnusual,
  previousOperationIncomplete,
  pseudophakicWithoutCataractSurgery,
  pureGasAtFullFill,
  pvrDWithoutTotalDetachment,
  pvrExtentMissing,
  pvrGradeOfOtherEdition,
  pvrHoursWithoutGradeC,
  pvrMembranesWithoutPvr,
  recurrenceWithoutHistory,
  referredBeforeSymptoms,
  referrerMissing,
  referrerWithoutName,
  refractionAgainstAxialLength,
  refractionNotTold,
  relatedMedicineAfterAllergy,
  removalPlannedOfPermanentElement,
  requiredAftercare,
  requiredAnaesthesia,
  requiredBefore,
  requiredEnd,
  requiredFindings,
  requiredIdentity,
  requiredSteps,
  requiredWho,
  retinaDetachedAtEnd,
  retinopexyIncomplete,
  retinopexyKindsDiffer,
  retinopexyOfMissingBreak,
  retinopexySettingsAgainstKind,
  retinopexySettingsUnusual,
  retinotomyTreatedWithoutRetinopexy,
  retinotomyUntreated,
  reviewBeforeEnd,
  reviewDatesDiffer,
  sclerotomiesOffParsPlana,
  segmentFarFromUsualPlace,
  segmentLengthAgainstArc,
  segmentOverHalf,
  shortenedTooMuch,
  shortenedWithoutRing,
  sideDiffers,
  siliconeImplantWithOil,
  slitLampLaserAsleep,
  smallHyperopicEye,
  specimenIncomplete,
  supervisionIncomplete,
  supervisorForTrainee,
  supportMissesBreak,
  supportNotRecorded,
  supportedByMissingElement,
  symptomsForYears,
  tamponadeDetailsWithoutAgent,
  temporaryClosurePermanentBand,
  temporaryElementWithoutRemovalPlan,
  tensionAboveClosingPressure,
  tensionWithoutShortening,
  thickerThanItsForm,
  thrombosisProphylaxisMissing,
  tightenedWithoutPressure,
  timeOutAfterStart,
  timeOutNotTimed,
  tissueAgainstSteps,
  totalAgainstArc,
  totalDetachmentMaculaOn,
  traineeWithoutSupervisor,
  treatedBreakNotAmongTargets,
  treatmentForOtherEye,
  twoBands,
  underBandWithoutBand,
  untreatedBreakAmongTargets,
  vitrectomyDetailsWithoutVitrectomy,
  vitrectomyIncomplete,
  vitrectomyStepsNotApplicable,
  warningSignsLeftOut,
  widePortsSutureless,
  wristbandNotGiven,
];
