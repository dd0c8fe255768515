using Credtrack.Core.Scans;

namespace Credtrack.Core.Tests.Scans;

// The limits are wide ones of ours, set from memory; no source.
public sealed class MachineSettingsTests
{
    private readonly Cast cast = new();

    [Fact]
    public void Each_may_be_missing() => Assert.Empty(Faults(MachineSettings.None));

    [Theory]
    [InlineData(4, true)]
    [InlineData(5, false)]
    [InlineData(400, false)]
    [InlineData(401, true)]
    public void Depth_is_from_half_a_centimetre_to_40(int mm, bool refused) => Says(refused, "Give the depth in cm, from 0.5 to 40.", new(null, mm, null, null, null));

    [Theory]
    [InlineData(499, true)]
    [InlineData(500, false)]
    [InlineData(60_000, false)]
    [InlineData(60_001, true)]
    public void Frequency_is_from_half_a_megahertz_to_60(int khz, bool refused) => Says(refused, "Give the frequency in MHz, from 0.5 to 60.", new(null, null, khz, null, null));

    [Theory]
    [InlineData(-1, true)]
    [InlineData(0, false)]
    [InlineData(300, false)]
    [InlineData(301, true)]
    public void The_mechanical_index_is_from_0_to_3(int hundredths, bool refused) =>
        Says(refused, "Give the mechanical index as the machine shows it, from 0 to 3.", new(null, null, null, hundredths, null));

    [Theory]
    [InlineData(-1, true)]
    [InlineData(0, false)]
    [InlineData(1000, false)]
    [InlineData(1001, true)]
    public void The_thermal_index_is_from_0_to_10(int hundredths, bool refused) =>
        Says(refused, "Give the thermal index as the machine shows it, from 0 to 10.", new(null, null, null, null, hundredths));

    [Fact]
    public void Each_fault_is_told_with_its_value() =>
        Assert.Equal(["DepthMm", "FrequencyKhz", "MechanicalIndex", "ThermalIndex"], Faults(new(Transducer.Curved, 0, 0, -1, -1)).Select(f => f.About));

    private void Says(bool refused, string why, MachineSettings settings) => Assert.Equal(refused ? [why] : [], Faults(settings).Select(f => f.Why));

    private IEnumerable<(string About, string Why)> Faults(MachineSettings settings) =>
        (cast.Entry() with { Settings = settings }).Faults(cast.Trainee.Id, cast.Programme.Id, Cast.Noon);
}
