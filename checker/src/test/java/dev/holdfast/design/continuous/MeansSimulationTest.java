package dev.holdfast.design.continuous;

import dev.holdfast.design.Given;
import dev.holdfast.design.Inputs;
import dev.holdfast.design.Level;
import dev.holdfast.design.Sides;
import dev.holdfast.design.Simulation;
import java.util.List;
import org.apache.commons.math3.stat.StatUtils;
import org.apache.commons.math3.stat.inference.OneWayAnova;
import org.apache.commons.math3.stat.inference.TTest;
import org.apache.commons.statistics.distribution.NormalDistribution;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** The tests of means run on drawn data reject as often as their cells say. */
@Tag("simulation")
class MeansSimulationTest {
  private static final Level TWO = Level.of(0.05, Sides.TWO);
  private static final Level ONE = Level.of(0.05, Sides.ONE);
  private static final NormalDistribution NORMAL = NormalDistribution.of(0, 1);

  private final TTest tests = new TTest();

  @Test
  void studentsTestOfOneGroup() {
    Simulation.confirms(
        new OneMeanStudent(),
        new Given().number("mean", 13).number("null-mean", 10).number("sd", 6).inputs(),
        TWO,
        draw -> tests.tTest(10, draw.sample(25, 13, 6)),
        25);
  }

  @Test
  void studentsTestOfOneGroupOnOneSide() {
    Simulation.confirms(
        new OneMeanStudent(),
        new Given().number("d", 0.5).inputs(),
        ONE,
        draw -> {
          double[] drawn = draw.sample(22, 0.5, 1);
          double both = tests.tTest(0, drawn);
          return tests.t(0, drawn) > 0 ? both / 2 : 1 - both / 2;
        },
        22);
  }

  @Test
  void theNormalTestOfOneGroup() {
    Simulation.confirms(
        new OneMeanNormal(),
        new Given().number("difference", 3).number("sd", 6).inputs(),
        ONE,
        draw -> NORMAL.survivalProbability(StatUtils.mean(draw.sample(25, 3, 6)) / 6 * 5),
        25);
  }

  @Test
  void studentsTestOfPairs() {
    double r = 0.6;
    Simulation.confirms(
        new PairedMeansStudent(),
        new Given()
            .number("difference", 4)
            .named("sds", "before", 8, "after", 11)
            .number("correlation", r)
            .inputs(),
        TWO,
        draw -> {
          double[] before = new double[40];
          double[] after = new double[40];
          for (int i = 0; i < before.length; i++) {
            double first = draw.next();
            before[i] = 20 + 8 * first;
            after[i] = 24 + 11 * (r * first + Math.sqrt(1 - r * r) * draw.next());
          }
          return tests.pairedTTest(before, after);
        },
        40);
  }

  @Test
  void theNormalTestOfPairs() {
    Simulation.confirms(
        new PairedMeansNormal(),
        new Given().number("difference", 4).number("sd-of-difference", 9).inputs(),
        ONE,
        draw -> {
          double mean = StatUtils.mean(draw.sample(36, 4, 9));
          return NORMAL.survivalProbability(mean / 9 * 6);
        },
        36);
  }

  @Test
  void studentsTestOfTwoGroups() {
    Simulation.confirms(
        new ParallelMeansStudent(),
        new Given().number("difference", 5).number("sd", 8).inputs(),
        TWO,
        draw -> tests.homoscedasticTTest(draw.sample(24, 0, 8), draw.sample(40, 5, 8)),
        24,
        40);
  }

  @Test
  void studentsTestOfTwoGroupsWhoseSdsDiffer() {
    Simulation.confirms(
        new ParallelMeansStudent(),
        unequal(),
        TWO,
        draw -> tests.homoscedasticTTest(draw.sample(12, 0, 14), draw.sample(36, 9, 6)),
        12,
        36);
  }

  @Test
  void welchsTest() {
    Simulation.confirms(
        new ParallelMeansWelch(),
        unequal(),
        TWO,
        draw -> tests.tTest(draw.sample(12, 0, 14), draw.sample(36, 9, 6)),
        12,
        36);
  }

  @Test
  void welchsTestOfVeryFew() {
    Simulation.confirms(
        new ParallelMeansWelch(),
        new Given().number("difference", 25).named("sds", "a", 14, "b", 6).inputs(),
        TWO,
        draw -> tests.tTest(draw.sample(3, 0, 14), draw.sample(4, 25, 6)),
        3,
        4);
  }

  @Test
  void theNormalTestOfTwoGroups() {
    double error = Math.sqrt(14.0 * 14 / 20 + 6.0 * 6 / 30);
    Simulation.confirms(
        new ParallelMeansNormal(),
        unequal(),
        ONE,
        draw ->
            NORMAL.survivalProbability(
                (StatUtils.mean(draw.sample(30, 9, 6)) - StatUtils.mean(draw.sample(20, 0, 14)))
                    / error),
        20,
        30);
  }

  @Test
  void analysisOfVarianceOfUnequalGroups() {
    OneWayAnova anova = new OneWayAnova();
    Simulation.confirms(
        new GroupMeansAnova(),
        new Given()
            .named("means", "dawn", 10, "noon", 14, "dusk", 11)
            .number("sd", 6)
            .groups("dawn", "noon", "dusk")
            .weights(12.0, 20.0, 30.0)
            .inputs(),
        TWO,
        draw ->
            anova.anovaPValue(
                List.of(draw.sample(12, 10, 6), draw.sample(20, 14, 6), draw.sample(30, 11, 6))),
        12,
        20,
        30);
  }

  @Test
  void analysisOfVarianceOfTheLeastFavourablePattern() {
    OneWayAnova anova = new OneWayAnova();
    double centre = 10.0 * 6 / (10 + 14);
    Simulation.confirms(
        new GroupMeansAnova(),
        new Given()
            .number("largest-difference", 6)
            .number("sd", 5)
            .groups("dawn", "noon", "dusk")
            .weights(14.0, 25.0, 10.0)
            .inputs(),
        TWO,
        draw ->
            anova.anovaPValue(
                List.of(draw.sample(14, 0, 5), draw.sample(25, centre, 5), draw.sample(10, 6, 5))),
        14,
        25,
        10);
  }

  private static Inputs unequal() {
    return new Given()
        .number("difference", 9)
        .named("sds", "a", 14, "b", 6)
        .groups("a", "b")
        .inputs();
  }
}
