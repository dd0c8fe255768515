using Credtrack.Core.Catalogue;
using Credtrack.Core.Readings;
using Credtrack.Core.Scans;

namespace Credtrack.Web.Features.SignIn.Demo;

/// <summary>What was there, what the trainee saw of it, and what the reader makes of the pictures. Skill runs from 0 to 1.</summary>
internal sealed class DemoAnswers(int seed)
{
    private static readonly string[] Praise =
    [
        "Good depth and gain; the far field is clear.", "Turn the depth down a little so that the structure fills the picture.", "Well centred. Fan through once more to the edge.",
        "The near field is too bright; lower the gain there.", "Clear answer to the question. Nothing to add.", "Hold the transducer still for the last picture.",
    ];

    private readonly Random chance = new(seed);

    public Dictionary<string, Answer> Truth(Application application) => application.Questions.ToDictionary(q => q.Code, q =>
        q.Positive is { } positive ? chance.Next(6) == 0 ? positive : Other(positive)
        : chance.Next(12) == 0 ? Answer.No : Answer.Yes);

    public ScanEntry Entry(Application application, Dictionary<string, Answer> truth, DateTime at, Person? supervisor, double skill) => new(
        application,
        application.Subtypes.Count == 0 ? null : application.Subtypes[chance.Next(application.Subtypes.Count)],
        at, chance.Next(20) == 0 ? Role.Interpreted : Role.Performed,
        chance.Next(10) switch { 0 => Setting.Education, 1 => Setting.Simulation, _ => Setting.Clinical },
        Indicated: chance.Next(6) > 0,
        supervisor is null ? Supervision.Later : Supervision.Direct, supervisor,
        Assisted: chance.Next(8) == 0,
        new MachineSettings(null, Between(application.DepthFromMm, application.DepthToMm, 5), Between(application.FrequencyFromKhz, application.FrequencyToKhz, 100), chance.Next(6, 14) * 10, chance.Next(1, 8) * 10),
        Note: null,
        [.. application.Views.Where(_ => chance.Next(12) > 0).Select(v => v.Code)],
        truth.ToDictionary(t => t.Key, t => Errs(0.05 - 0.04 * skill) ? Other(t.Value) : Errs(0.02) ? Answer.Unclear : t.Value));

    public Judgement Judgement(Scan scan, Application application, Dictionary<string, Answer> truth, double skill) => new(
        application, scan.Subtype, scan.Indicated, scan.Assisted, scan.Supervision,
        truth.ToDictionary(t => t.Key, t => Errs(0.03) ? Answer.Unclear : t.Value),
        [.. application.Views.Where(_ => !Errs(0.05 - 0.045 * skill)).Select(v => v.Code)],
        Quality: Math.Clamp((int)Math.Round(2.9 + 1.6 * skill + 1.4 * (chance.NextDouble() - 0.5)), 1, 5),
        Feedback: chance.Next(3) == 0 ? null : Praise[chance.Next(Praise.Length)]);

    private bool Errs(double rate) => chance.NextDouble() < rate;

    private int Between(int from, int to, int step) => from + chance.Next((to - from) / step + 1) * step;

    private static Answer Other(Answer answer) => answer == Answer.Yes ? Answer.No : Answer.Yes;
}
