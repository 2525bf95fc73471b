// one server, one browser and two cores: what runs beside the others only slows them
[assembly: CollectionBehavior(DisableTestParallelization = true)]
