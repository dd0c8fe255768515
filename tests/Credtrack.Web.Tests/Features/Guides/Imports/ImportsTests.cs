using Credtrack.Web.Tests.Features.Imports;

namespace Credtrack.Web.Tests.Features.Guides.Imports;

public sealed class ImportsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task The_guide_names_every_column_and_its_example_comes_in_as_it_is()
    {
        var world = await site.NewWorld();
        using var cora = await (await world.As(await world.Coordinator())).Opens("/guides/imports");
        Assert.Equal(Credtrack.Web.Features.Imports.Fields.All.Select(f => f.Name), cora.Page.QuerySelectorAll("tbody th span").Select(c => c.TextContent));
        using var http = new HttpClient { BaseAddress = site.ClientOptions.BaseAddress };
        await cora.Maps(await http.GetStringAsync(new Uri(cora.Page.QuerySelector("a[download]")!.GetAttribute("href")!, UriKind.Relative)));
        Assert.Empty(cora.Told());
        await cora.Ticks("3 missing cells may take the usual values").Presses("Import 4 scans now");
        Assert.Equal(4, await world.Evidence());
    }
}
